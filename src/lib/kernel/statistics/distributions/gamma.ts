import gammainc from '@stdlib/math-base-special-gammainc';
import gammaincinv from '@stdlib/math-base-special-gammaincinv';
import { wantNumber, wantPositive, wantProbability } from './arguments';

/**
 * Probability that a gamma value lies at or below x.
 *
 * Formula: P(a, x/s) = ∫₀^(x/s) t^(a−1) e^(−t) dt / Γ(a).
 * @param x any number (0 below zero) @param shape a, above zero @param scale s, above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 6.5.1.
 * @example gammaCdf(2, 1) // 0.86466
 */
export function gammaCdf(x: number, shape: number, scale = 1): number {
	return regularGamma(x, shape, scale, false);
}

/**
 * Probability that a gamma value lies above x.
 *
 * Formula: Q(a, x/s) = 1 − P(a, x/s), not by subtraction.
 * @param x any number (1 below zero) @param shape a, above zero @param scale s, above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 6.5.3.
 * @example gammaUpperTail(2, 1) // 0.13534
 */
export function gammaUpperTail(x: number, shape: number, scale = 1): number {
	return regularGamma(x, shape, scale, true);
}

/**
 * The value that a gamma one stays below with probability p.
 *
 * Formula: x with P(a, x/s) = p.
 * @param p between 0 and 1, both left out @param shape a, above zero @param scale s, above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 6.5.1.
 * @example gammaQuantile(0.5, 1) // 0.69315
 */
export function gammaQuantile(p: number, shape: number, scale = 1): number {
	wantProbability(p);
	wantPositive(shape, scale);
	return scale * gammaincinv(p, shape);
}

function regularGamma(x: number, shape: number, scale: number, upper: boolean): number {
	wantNumber(x);
	wantPositive(shape, scale);
	if (x <= 0) return upper ? 1 : 0;
	if (x === Infinity) return upper ? 0 : 1;
	return gammainc(x / scale, shape, true, upper);
}
