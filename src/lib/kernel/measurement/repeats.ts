import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';

export type Repeats = {
	mean: number;
	/** Scatter of one reading. */
	deviation: number;
	/** Standard uncertainty of the mean. */
	standard: number;
	degreesOfFreedom: number;
};

/**
 * What repeating tells: the mean, the scatter of one reading and the standard uncertainty of the
 * mean (type A).
 *
 * Formula: s² = Σ (xᵢ − x̄)² / (n − 1); u = s / √n; ν = n − 1.
 * @param readings of one place, part and instrument, in one unit, two or more
 * @returns "cannot" for fewer, or where one is no number
 * Source: JCGM 100:2008 (GUM), 4.2.
 * @example repeatsOf([74.012, 74.014, 74.013]) // mean 74.013, s 0.001, u 0.00058
 */
export function repeatsOf(readings: readonly number[]): Outcome<Repeats> {
	if (readings.length < 2) return cannot('scatter needs at least two readings');
	if (!readings.every(Number.isFinite)) return cannot('a reading is no number');
	const n = readings.length;
	// From the first reading on: differences of micrometres keep their figures.
	const first = readings[0] as number;
	const offsets = readings.map((one) => one - first);
	const offset = offsets.reduce((a, b) => a + b, 0) / n;
	const deviation = Math.hypot(...offsets.map((one) => one - offset)) / Math.sqrt(n - 1);
	const [mean, spread] = [computedNumber(first + offset), computedNumber(deviation)];
	if (!mean.ok) return mean;
	if (!spread.ok) return spread;
	return computed({
		mean: mean.value,
		deviation: spread.value,
		standard: spread.value / Math.sqrt(n),
		degreesOfFreedom: n - 1
	});
}

/**
 * Standard uncertainty of a mean of n readings: scatter shrinks, what all of them share does not.
 *
 * Formula: u² = s² / n + b².
 * @param deviation s, scatter of one reading @param shared b: calibration, least count,
 * temperature @param n readings, whole, 1 or more
 * @throws RangeError on misuse
 * Source: JCGM 100:2008 (GUM), 4.2.3 and F.2.4.
 * @example ofMean(0.004, 0.003, 4) // 0.0036
 */
export function ofMean(deviation: number, shared: number, n: number): number {
	if (!Number.isSafeInteger(n) || n < 1) throw new RangeError('readings are counted from 1');
	const u = Math.hypot(deviation / Math.sqrt(n), shared);
	if (!(deviation >= 0) || !(shared >= 0) || !Number.isFinite(u))
		throw new RangeError('an uncertainty is a number, zero or more');
	return u;
}

/**
 * How many readings bring the standard uncertainty of their mean down to what is wanted.
 *
 * Formula: n = ⌈s² / (u² − b²)⌉.
 * @param deviation s, scatter of one reading @param shared b, what all readings share
 * @param wanted u, above zero
 * @returns whole, 1 or more; "cannot" where what they share is already too much
 * Source: JCGM 100:2008 (GUM), 4.2.3 and F.2.4, solved for n.
 * @example repeatsNeeded(0.004, 0.003, 0.0036) // 5
 */
export function repeatsNeeded(deviation: number, shared: number, wanted: number): Outcome<number> {
	if (![deviation, shared, wanted].every((one) => one >= 0 && Number.isFinite(one)))
		return cannot('an uncertainty is a number, zero or more');
	if (shared >= wanted)
		return cannot('repeats do not help: what all readings share is already too much');
	const n = (deviation / wanted) ** 2 / (1 - (shared / wanted) ** 2);
	// A whole number that came out a rounding too high is still that number.
	return computedNumber(Math.max(1, Math.ceil(n - 1e-9)));
}
