import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/**
 * Uncertainty of a sum of readings, each taken with a weight, by one instrument: of a flatness from
 * the readings that hold it, of a tilt from two readings over a length.
 *
 * Formula: U = U1 · √(Σ weight²).
 * @param weights of the readings @param expandedMm expanded uncertainty U1 of one reading, mm
 * @returns mm, expanded as the reading's is
 * Source: JCGM 100:2008, 5.1.2, readings of one uncertainty that do not depend on each other. Where
 * the readings were chosen for being the largest, the result is biased upwards as well.
 * @example ofWeightedReadingsMm([0.5, 0.5, -0.5, -0.5], 0.004) // 0.004
 */
export function ofWeightedReadingsMm(
	weights: readonly number[],
	expandedMm: number
): Outcome<number> {
	if (!(expandedMm >= 0)) return cannot('an uncertainty is a number, zero or more');
	return computedNumber(expandedMm * Math.hypot(...weights));
}
