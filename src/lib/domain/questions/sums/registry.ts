import { displacementParameters } from './displacement';
import { fitClearanceParameters } from './fit-clearance';
import { oilClearanceParameters } from './oil-clearance';
import { outOfRoundParameters } from './out-of-round';
import { ringGapParameters } from './ring-gap';
import { sheetValueParameters } from './sheet-value';
import { stageTurnParameters } from './stage-turn';
import { taperParameters } from './taper';
import { torqueWithExtensionParameters } from './torque-with-extension';
import { valveShimParameters } from './valve-shim';
import { wearParameters } from './wear';

export const sumNames = [
	'displacement',
	'fit-clearance',
	'oil-clearance',
	'out-of-round',
	'ring-gap',
	'sheet-value',
	'stage-turn',
	'taper',
	'torque-with-extension',
	'valve-shim',
	'wear'
] as const;
export type SumName = (typeof sumNames)[number];

export const sums = {
	displacement: { parameters: displacementParameters },
	'fit-clearance': { parameters: fitClearanceParameters },
	'oil-clearance': { parameters: oilClearanceParameters },
	'out-of-round': { parameters: outOfRoundParameters },
	'ring-gap': { parameters: ringGapParameters },
	'sheet-value': { parameters: sheetValueParameters },
	'stage-turn': { parameters: stageTurnParameters },
	taper: { parameters: taperParameters },
	'torque-with-extension': { parameters: torqueWithExtensionParameters },
	'valve-shim': { parameters: valveShimParameters },
	wear: { parameters: wearParameters }
} satisfies Record<SumName, unknown>;
