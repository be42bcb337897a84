import { wantNumber, wantPositive, wantProbability } from './arguments';
import { regularBeta, regularBetaQuantile } from './beta';

/**
 * Probability that a value of the F distribution lies at or below x.
 *
 * Formula: I_w(m/2, n/2) with w = m x / (m x + n).
 * @param x any number (0 below zero) @param m, n degrees of freedom above and below, above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.6.2.
 * @example fCdf(1.794678, 5, 18) // 0.83523
 */
export function fCdf(x: number, m: number, n: number): number {
	const [w, rest] = shares(x, m, n);
	return regularBeta(w, rest, m / 2, n / 2);
}

/**
 * Probability that a value of the F distribution lies above x: the p-value of an analysis of
 * variance.
 *
 * Formula: I_w(n/2, m/2) with w = n / (n + m x).
 * @param x any number (1 below zero) @param m, n degrees of freedom above and below, above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.6.2.
 * @example fUpperTail(245.614, 9, 78) // 2.02e-53
 */
export function fUpperTail(x: number, m: number, n: number): number {
	const [w, rest] = shares(x, m, n);
	return regularBeta(rest, w, n / 2, m / 2);
}

/**
 * The value that one of the F distribution stays below with probability p.
 *
 * Formula: x = n w / (m (1 − w)) with I_w(m/2, n/2) = p.
 * @param p between 0 and 1, both left out @param m, n degrees of freedom above and below
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.6.2.
 * @example fQuantile(0.95, 5, 15) // 2.90129
 */
export function fQuantile(p: number, m: number, n: number): number {
	wantProbability(p);
	wantPositive(m, n);
	const [w, rest] = regularBetaQuantile(p, 1 - p, m / 2, n / 2);
	return (n * w) / (m * rest);
}

/** w = m x / (m x + n) and 1 − w, neither by subtraction. */
function shares(x: number, m: number, n: number): [number, number] {
	wantNumber(x);
	wantPositive(m, n);
	if (x <= 0) return [0, 1];
	const ratio = (m / n) * x;
	return ratio === Infinity ? [1, 0] : [ratio / (1 + ratio), 1 / (1 + ratio)];
}
