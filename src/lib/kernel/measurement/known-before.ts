import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';

export type Known = { mean: number; standard: number };

/**
 * What is known of a part after a reading, when its kind was known before: how such parts come
 * from the maker, or how others of this age were found.
 *
 * Formula: 1/s² = 1/s0² + 1/u²; m = s² (m0 / s0² + y / u²).
 * @param before mean m0 and standard deviation s0 of such parts, s0 above zero
 * @param reading value y and standard uncertainty u, above zero
 * @returns mean and standard deviation after it; "cannot" where a figure is none
 * Source: JCGM 106:2012, 6.2 and annex A (normal before, normal reading).
 * @example knownAfter({ mean: 10, standard: 0.03 }, { mean: 10.05, standard: 0.02 })
 *   // 10.0346 with 0.0166
 */
export function knownAfter(before: Known, reading: Known): Outcome<Known> {
	for (const { mean, standard } of [before, reading])
		if (!Number.isFinite(mean) || !(standard > 0) || !Number.isFinite(standard))
			return cannot('a mean is a number, and a deviation is one above zero');
	const weight = 1 / (1 + (reading.standard / before.standard) ** 2);
	const mean = computedNumber(before.mean + weight * (reading.mean - before.mean));
	return mean.ok
		? computed({ mean: mean.value, standard: reading.standard * Math.sqrt(weight) })
		: mean;
}
