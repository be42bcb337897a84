import { at20 } from './at-20';
import { boltLoad } from './bolt-load';
import { boltTurn } from './bolt-turn';
import { calledWithin } from './called-within';
import { cornerTwist } from './corner-twist';
import { displacement } from './displacement';
import { endFloat } from './end-float';
import { fitClearance } from './fit-clearance';
import { boreGrid, journalGrid } from './grid';
import { oilClearance } from './oil-clearance';
import { outOfRound } from './out-of-round';
import { protrusion } from './protrusion';
import { preload } from './preload';
import { readingUncertainty } from './reading-uncertainty';
import { ringGap } from './ring-gap';
import { rodLine } from './rod-line';
import { runout } from './runout';
import { sheetValue } from './sheet-value';
import { shellClearance } from './shell-clearance';
import { shimsToBuy } from './shims-to-buy';
import { stageTurn } from './stage-turn';
import type { AnySum } from './sum';
import { taper } from './taper';
import { thread } from './thread';
import { toolForLimits } from './tool-for-limits';
import { torqueShare } from './torque-share';
import { torqueWithExtension } from './torque-with-extension';
import { valveShim } from './valve-shim';
import { wear } from './wear';

export const sumNames = [
	'at-20',
	'bore-grid',
	'bolt-load',
	'bolt-turn',
	'called-within',
	'corner-twist',
	'displacement',
	'end-float',
	'fit-clearance',
	'gauging-thread',
	'journal-grid',
	'oil-clearance',
	'out-of-round',
	'protrusion',
	'preload',
	'reading-uncertainty',
	'ring-gap',
	'rod-line',
	'runout',
	'sheet-value',
	'shell-clearance',
	'shims-to-buy',
	'stage-turn',
	'taper',
	'tool-for-limits',
	'torque-share',
	'torque-with-extension',
	'valve-shim',
	'wear'
] as const;
export type SumName = (typeof sumNames)[number];

/** One line a sum. Each draws what could be read at a bench and has the kernel work it. */
export const sums: Record<SumName, AnySum> = {
	'at-20': at20 as AnySum,
	'bore-grid': boreGrid as AnySum,
	'bolt-load': boltLoad as AnySum,
	'bolt-turn': boltTurn as AnySum,
	'called-within': calledWithin as AnySum,
	'corner-twist': cornerTwist as AnySum,
	displacement: displacement as AnySum,
	'end-float': endFloat as AnySum,
	'fit-clearance': fitClearance as AnySum,
	'gauging-thread': thread as AnySum,
	'journal-grid': journalGrid as AnySum,
	'oil-clearance': oilClearance as AnySum,
	'out-of-round': outOfRound as AnySum,
	protrusion: protrusion as AnySum,
	preload: preload as AnySum,
	'reading-uncertainty': readingUncertainty as AnySum,
	'ring-gap': ringGap as AnySum,
	'rod-line': rodLine as AnySum,
	runout: runout as AnySum,
	'sheet-value': sheetValue as AnySum,
	'shell-clearance': shellClearance as AnySum,
	'shims-to-buy': shimsToBuy as AnySum,
	'stage-turn': stageTurn as AnySum,
	taper: taper as AnySum,
	'tool-for-limits': toolForLimits as AnySum,
	'torque-share': torqueShare as AnySum,
	'torque-with-extension': torqueWithExtension as AnySum,
	'valve-shim': valveShim as AnySum,
	wear: wear as AnySum
};
