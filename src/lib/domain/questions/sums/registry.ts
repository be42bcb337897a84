import { calledWithin } from './called-within';
import { displacement } from './displacement';
import { fitClearance } from './fit-clearance';
import { oilClearance } from './oil-clearance';
import { outOfRound } from './out-of-round';
import { readingUncertainty } from './reading-uncertainty';
import { ringGap } from './ring-gap';
import { sheetValue } from './sheet-value';
import { stageTurn } from './stage-turn';
import type { AnySum } from './sum';
import { taper } from './taper';
import { toolForLimits } from './tool-for-limits';
import { torqueWithExtension } from './torque-with-extension';
import { valveShim } from './valve-shim';
import { wear } from './wear';

export const sumNames = [
	'called-within',
	'displacement',
	'fit-clearance',
	'oil-clearance',
	'out-of-round',
	'reading-uncertainty',
	'ring-gap',
	'sheet-value',
	'stage-turn',
	'taper',
	'tool-for-limits',
	'torque-with-extension',
	'valve-shim',
	'wear'
] as const;
export type SumName = (typeof sumNames)[number];

/** One line a sum. Each draws what could be read at a bench and has the kernel work it. */
export const sums: Record<SumName, AnySum> = {
	'called-within': calledWithin as AnySum,
	displacement: displacement as AnySum,
	'fit-clearance': fitClearance as AnySum,
	'oil-clearance': oilClearance as AnySum,
	'out-of-round': outOfRound as AnySum,
	'reading-uncertainty': readingUncertainty as AnySum,
	'ring-gap': ringGap as AnySum,
	'sheet-value': sheetValue as AnySum,
	'stage-turn': stageTurn as AnySum,
	taper: taper as AnySum,
	'tool-for-limits': toolForLimits as AnySum,
	'torque-with-extension': torqueWithExtension as AnySum,
	'valve-shim': valveShim as AnySum,
	wear: wear as AnySum
};
