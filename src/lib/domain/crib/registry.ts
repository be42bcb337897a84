import { drawers, type AnyCalculator } from './calculator';
import { flatness } from './calculators/flatness';
import { oilClearance } from './calculators/oil-clearance';
import { rod } from './calculators/rod';
import { runout } from './calculators/runout';
import { temperature } from './calculators/temperature';
import { valveShims } from './calculators/valve-shims';

/** One line a calculator. */
export const calculators: readonly AnyCalculator[] = [
	oilClearance,
	flatness,
	rod,
	valveShims,
	runout,
	temperature
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
