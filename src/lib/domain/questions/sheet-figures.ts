import type { NutFactorRange } from '$lib/kernel/fasteners/nut-factor';
import type { PropertyClass } from '$lib/kernel/fasteners/strength';
import { cannot, type Outcome } from '$lib/kernel/outcome';

/**
 * What a question may ask of one revision of a data sheet. `domain/data-sheets` gives it;
 * questions know no more of a sheet than this, so that a sheet may grow without touching them.
 */
export type SheetFigure = {
	key: string;
	/** "Crankpin, diameter" */
	words: string;
	unit: string;
	decimals: number;
	/** The size it is meant to have, when the sheet states one. */
	nominal?: number;
	/** Limits for building new. */
	least?: number;
	most?: number;
	/** Beyond this it does not run again; which way follows from `wearsBy`. */
	wearLimit?: number;
	wearsBy?: 'shrinking' | 'growing';
};

export type SheetBolt = { id: string; label?: string; xMm: number; yMm: number };

export type SheetPattern = {
	key: string;
	words: string;
	bolts: SheetBolt[];
	/** The maker's printed order of bolt ids; where there is one, it wins. */
	printedOrder?: string[];
};

export type SheetStage = { kind: 'torque'; torqueNm: number } | { kind: 'angle'; angleDeg: number };

export type SheetTightening = {
	key: string;
	words: string;
	stages: SheetStage[];
	threadDiameterMm: number;
	threadPitchMm: number;
	propertyClass: PropertyClass;
	/** Between what the lubrication lets the nut factor lie. */
	nutFactor: NutFactorRange;
	/** What is stretched, where the sheet says it. */
	gripMm?: number;
	singleUse: boolean;
};

/** Sizes that a worn part can be machined to, as steps above zero. */
export type SheetSteps = { key: string; words: string; stepsMm: number[] };

export type SheetFigures = {
	/** "AV3-1150, revision 1" */
	title: string;
	figure(key: string): Outcome<SheetFigure>;
	pattern(key: string): Outcome<SheetPattern>;
	tightening(key: string): Outcome<SheetTightening>;
	steps(key: string): Outcome<SheetSteps>;
};

/** For a question that names no data sheet: asking for a figure is then the author's slip. */
export const noSheet: SheetFigures = {
	title: 'no data sheet',
	figure: (key) => cannot(`the question names no data sheet to find ${key} in`),
	pattern: (key) => cannot(`the question names no data sheet to find ${key} in`),
	tightening: (key) => cannot(`the question names no data sheet to find ${key} in`),
	steps: (key) => cannot(`the question names no data sheet to find ${key} in`)
};
