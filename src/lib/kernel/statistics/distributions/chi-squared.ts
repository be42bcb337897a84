import { gammaCdf, gammaQuantile, gammaUpperTail } from './gamma';

/**
 * Probability that a chi-squared value lies at or below x.
 *
 * Formula: P(ν/2, x/2), the regularised incomplete gamma function.
 * @param x any number @param df degrees of freedom ν, above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.4.19.
 * @example chiSquaredCdf(3.84, 1) // 0.94996
 */
export function chiSquaredCdf(x: number, df: number): number {
	return gammaCdf(x, df / 2, 2);
}

/**
 * Probability that a chi-squared value lies above x.
 *
 * Formula: Q(ν/2, x/2).
 * @param x any number @param df degrees of freedom ν, above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.4.19.
 * @example chiSquaredUpperTail(100, 10) // 5.45e-17
 */
export function chiSquaredUpperTail(x: number, df: number): number {
	return gammaUpperTail(x, df / 2, 2);
}

/**
 * The value that a chi-squared one stays below with probability p.
 *
 * Formula: x with P(ν/2, x/2) = p.
 * @param p between 0 and 1, both left out @param df degrees of freedom ν, above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.4.19.
 * @example chiSquaredQuantile(0.95, 1) // 3.84146
 */
export function chiSquaredQuantile(p: number, df: number): number {
	return gammaQuantile(p, df / 2, 2);
}
