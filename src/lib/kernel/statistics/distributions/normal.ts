import erfc from '@stdlib/math-base-special-erfc';
import erfcinv from '@stdlib/math-base-special-erfcinv';
import { wantNumber, wantProbability } from './arguments';

/**
 * Standard normal density.
 *
 * Formula: φ(z) = e^(−z²/2) / √(2π).
 * @param z any number
 * @throws RangeError where z is no number
 * Source: Abramowitz and Stegun, 26.2.1.
 * @example normalDensity(0) // 0.39894
 */
export function normalDensity(z: number): number {
	wantNumber(z);
	return Math.exp(-(z * z) / 2) / Math.sqrt(2 * Math.PI);
}

/**
 * Probability that a standard normal value lies at or below z.
 *
 * Formula: Φ(z) = ½ erfc(−z / √2).
 * @param z any number
 * @returns 0 to 1, exact to rounding also far below
 * @throws RangeError where z is no number
 * Source: Abramowitz and Stegun, 26.2.2 and 7.1.22.
 * @example normalCdf(1.96) // 0.975
 */
export function normalCdf(z: number): number {
	wantNumber(z);
	return erfc(-z / Math.SQRT2) / 2;
}

/**
 * Probability that a standard normal value lies above z, exact also where 1 − Φ(z) would be zero.
 *
 * Formula: Q(z) = Φ(−z).
 * @param z any number
 * @returns 0 to 1
 * @throws RangeError where z is no number
 * Source: Abramowitz and Stegun, 26.2.3.
 * @example normalUpperTail(8) // 6.22e-16
 */
export function normalUpperTail(z: number): number {
	return normalCdf(-z);
}

/**
 * The value that a standard normal one stays below with probability p.
 *
 * Formula: z with Φ(z) = p.
 * @param p between 0 and 1, both left out
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.2.22.
 * @example normalQuantile(0.975) // 1.95996
 */
export function normalQuantile(p: number): number {
	wantProbability(p);
	// Adding zero makes the median a plain 0 rather than −0.
	return -Math.SQRT2 * erfcinv(2 * p) + 0;
}
