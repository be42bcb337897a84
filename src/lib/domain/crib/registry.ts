import { drawers, type AnyCalculator } from './calculator';
import { oilClearance } from './calculators/oil-clearance';

/** One line a calculator. */
export const calculators: readonly AnyCalculator[] = [oilClearance];

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
