import { convert, type DimensionName, type UnitOf } from './units';

/** A value with the step of the instrument that showed it, both in one unit. */
export type StepReading = { value: number; step: number };

/**
 * A reading in another unit, with the step to print it in there.
 *
 * @param reading value and step, the step above zero
 * @param from its unit @param to the unit wanted, of the same dimension
 * @returns value and step in the unit wanted; `formatQuantity` prints them
 * @throws RangeError where the value is no number or the step not above zero
 * @example readingIn('length', { value: 40.03, step: 0.01 }, 'mm', 'in') // 1.575984… in steps of 0.0005
 */
export function readingIn<D extends DimensionName>(
	dimension: D,
	reading: StepReading,
	from: UnitOf<D>,
	to: UnitOf<D>
): StepReading {
	// A step is a difference: on a thermometer the offset of the scale drops out of it.
	const factor = convert(dimension, 1, from, to) - convert(dimension, 0, from, to);
	return {
		value: convert(dimension, reading.value, from, to),
		step: stepAfter(reading.step, factor)
	};
}

/**
 * The step to print in after a conversion: the one of the 1, 2, 5 series that lies nearest to the
 * instrument's own in proportion, as on instruments with two scales (0.02 mm beside 0.001 in).
 *
 * @param step the instrument's step in its own unit, above zero
 * @param factor units of the new kind in one of the old, above zero
 * @returns the step in the new unit, at most √2.5 times finer or coarser than what was read
 * @throws RangeError where either is no number above zero
 * Source: the series of ISO 3 rounded to 1, 2, 5; nearest in proportion is common practice, no source.
 * @example stepAfter(0.01, 1 / 25.4) // 0.0005: a hundredth of a millimetre is 0.0004 in
 */
export function stepAfter(step: number, factor: number): number {
	const converted = step * factor;
	if (!(step > 0) || !(factor > 0) || !(converted > 0) || !Number.isFinite(converted))
		throw new RangeError('a step and a factor above zero');
	const power = Math.floor(Math.log10(converted));
	const distance = (one: number) => Math.abs(Math.log(one / converted));
	return [1, 2, 5, 10]
		.map((head) => Number(`${head}e${power}`))
		.reduce((a, b) => (distance(b) < distance(a) ? b : a));
}
