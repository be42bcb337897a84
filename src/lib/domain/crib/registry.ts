import { drawers, type AnyCalculator } from './calculator';
import { flatness } from './calculators/flatness';
import { groupStudy } from './calculators/group-study';
import { oilClearance } from './calculators/oil-clearance';
import { reading } from './calculators/reading';
import { rod } from './calculators/rod';
import { ruling } from './calculators/ruling';
import { runout } from './calculators/runout';
import { temperature } from './calculators/temperature';
import { friction } from './calculators/friction';
import { preload } from './calculators/preload';
import { stages } from './calculators/stages';
import { thread } from './calculators/thread';
import { torqueAngle } from './calculators/torque-angle';
import { bore } from './calculators/bore';
import { journal } from './calculators/journal';
import { gaugingThread } from './calculators/gauging-thread';
import { shellChoice } from './calculators/shell-choice';
import { shellCrush } from './calculators/shell-crush';
import { endFloat } from './calculators/end-float';
import { pistonToBore } from './calculators/piston-to-bore';
import { ringGap } from './calculators/ring-gap';
import { ringSideClearance } from './calculators/ring-side-clearance';
import { deckHeight } from './calculators/deck-height';
import { stemToGuide } from './calculators/stem-to-guide';
import { tighteningOrder } from './calculators/tightening-order';
import { extension } from './calculators/extension';
import { displacement } from './calculators/displacement';
import { firing } from './calculators/firing';
import { units } from './calculators/units';
import { compressionRatio } from './calculators/compression-ratio';
import { liquidLock } from './calculators/liquid-lock';
import { compressionTest } from './calculators/compression-test';
import { leakDown } from './calculators/leak-down';
import { valveShims } from './calculators/valve-shims';
import { whichTool } from './calculators/which-tool';

/** One line a calculator. */
export const calculators: readonly AnyCalculator[] = [
	preload,
	friction,
	torqueAngle,
	thread,
	extension,
	tighteningOrder,
	stages,
	bore,
	journal,
	oilClearance,
	gaugingThread,
	shellChoice,
	shellCrush,
	endFloat,
	pistonToBore,
	ringGap,
	ringSideClearance,
	deckHeight,
	stemToGuide,
	flatness,
	rod,
	valveShims,
	runout,
	temperature,
	leakDown,
	firing,
	compressionTest,
	liquidLock,
	displacement,
	compressionRatio,
	reading,
	ruling,
	whichTool,
	groupStudy,
	units
];

export function calculatorNamed(key: string): AnyCalculator | undefined {
	return calculators.find((one) => one.key === key);
}

/** The crib's index: each drawer with what lies in it. */
export function cribIndex() {
	return drawers
		.map((drawer) => ({
			...drawer,
			calculators: calculators
				.filter((one) => one.drawer === drawer.key)
				.map(({ key, title, says }) => ({ key, title, says }))
		}))
		.filter((drawer) => drawer.calculators.length > 0);
}
