import { computedNumber } from '../../computed-number';
import { cannot, computed, type Outcome } from '../../outcome';
import { tUpperTail } from '../../statistics/distributions/student-t';
import { mean } from './study';

export type Linearity = {
	/** Mean of reading less reference at each size. */
	biasMeans: number[];
	slope: number;
	intercept: number;
	rSquared: number;
	/** Scatter about the line. */
	deviation: number;
	df: number;
	/** Each over its own standard uncertainty; p is the chance of a slope as steep by scatter alone. */
	tSlope: number;
	tIntercept: number;
	pSlope: number;
};

/**
 * Whether an instrument's error changes along its range: the line through reading less reference.
 *
 * Formula: b = Σ (x − x̄)(y − ȳ) / Σ (x − x̄)²; a = ȳ − b x̄; s² = Σ (y − a − b x)² / (n − 2);
 * t_b = b √Sxx / s; t_a = a / (s √(1/n + x̄² / Sxx)); y = reading − reference.
 * @param references sizes of the standards, two different ones or more
 * @param readings those taken of each, in the same order and unit
 * @returns "cannot" where there are too few, one is no number, or none of them scatters
 * Source: AIAG, Measurement Systems Analysis (2010), chapter III section B (linearity); least
 * squares.
 * @example linearity([2, 4], [[2.7, 2.5], [5.1, 3.9]]) // slope -0.05
 */
export function linearity(
	references: readonly number[],
	readings: readonly (readonly number[])[]
): Outcome<Linearity> {
	if (references.length !== readings.length || readings.some((one) => one.length === 0))
		return cannot('each reference has its readings');
	if (![...references, ...readings.flat()].every(Number.isFinite))
		return cannot('a reading or a reference is no number');
	const points = references.flatMap((x, at) =>
		(readings[at] ?? []).map((one) => ({ x, y: one - x }))
	);
	const n = points.length;
	if (n < 3) return cannot('a line and its scatter need three readings or more');
	const [meanX, meanY] = [mean(points.map(({ x }) => x)), mean(points.map(({ y }) => y))];
	const sum = (of: (point: { x: number; y: number }) => number) =>
		points.reduce((all, point) => all + of(point), 0);
	const sxx = sum(({ x }) => (x - meanX) ** 2);
	if (!(sxx > 0)) return cannot('two references of different size or more are wanted');
	const slope = sum(({ x, y }) => (x - meanX) * (y - meanY)) / sxx;
	const intercept = meanY - slope * meanX;
	const left = sum(({ x, y }) => (y - intercept - slope * x) ** 2);
	const deviation = Math.sqrt(left / (n - 2));
	if (!(deviation > 0)) return cannot('the readings do not scatter: read to a finer step');
	const tSlope = (slope * Math.sqrt(sxx)) / deviation;
	const tIntercept = intercept / (deviation * Math.sqrt(1 / n + meanX ** 2 / sxx));
	for (const one of [slope, intercept, deviation, tSlope, tIntercept]) {
		const number = computedNumber(one);
		if (!number.ok) return number;
	}
	return computed({
		biasMeans: references.map((x, at) => mean((readings[at] ?? []).map((one) => one - x))),
		slope,
		intercept,
		rSquared: 1 - left / sum(({ y }) => (y - meanY) ** 2),
		deviation,
		df: n - 2,
		tSlope,
		tIntercept,
		pSlope: 2 * tUpperTail(Math.abs(tSlope), n - 2)
	});
}
