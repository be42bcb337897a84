import { cannot, computed, type Outcome } from '../outcome';
import { parseQuantity, type Quantity } from './parse-quantity';
import { dimensions, type DimensionName } from './units';

export type Measured = Quantity & { dimension: DimensionName };

/** A difference is written with the units of a reading: nobody can tell it by its unit alone. */
const told = (Object.keys(dimensions) as DimensionName[]).filter(
	(one) => one !== 'temperatureDifference'
);

/**
 * A quantity of any dimension, told by its unit: "18 ft-lb", "2.2 L", "3/8 in", "212 °F".
 *
 * @param typed figure and unit; a degree of temperature is a reading, never a difference
 * @returns value, unit as the kernel writes it and the dimension; "cannot" with the reason
 * @example parseAny('18 ft-lb') // { value: 18, unit: 'lbf·ft', dimension: 'torque' }
 */
export function parseAny(typed: string): Outcome<Measured> {
	let because: string | undefined;
	for (const dimension of told) {
		const found = parseQuantity(typed, dimension);
		if (found.ok) return computed({ ...found.value, dimension });
		// That one dimension lacks the unit says nothing; what is wrong with the figure does.
		if (!found.because.includes('is no unit of')) because = found.because;
	}
	return cannot(because ?? 'that unit is not known here: write it as N·m, lbf·ft, mm, psi or °C');
}

/**
 * The step that a figure is written in: its last decimal place, one where it has none.
 *
 * @param typed a figure with or without its unit
 * @returns the step; a thousandth for a common fraction, which is a nominal size
 * @example writtenStep('0,045 mm') // 0.001
 */
export function writtenStep(typed: string): number {
	if (/\d\s*[/\u2044]\s*\d/.test(typed)) return 0.001;
	const decimals = /[.,](\d+)/.exec(typed)?.[1]?.length ?? 0;
	return Number(`1e-${Math.min(12, decimals)}`);
}
