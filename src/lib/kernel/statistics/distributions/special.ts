import digammaOf from '@stdlib/math-base-special-digamma';
import gammaln from '@stdlib/math-base-special-gammaln';
import { wantPositive } from './arguments';

// These functions stand on a library: it meets all 425 published rows to 1e-10, mostly to 1e-15,
// where two smaller ones were out by 1e-7 and more. Between the rows its incomplete beta was seen
// to be out by 7e-10 at worst, so quantiles are checked against it before they leave.

/**
 * Natural logarithm of the gamma function.
 *
 * Formula: ln Γ(x), Γ(x) = ∫ t^(x−1) e^(−t) dt over t > 0.
 * @param x above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, Handbook of Mathematical Functions, 6.1.1.
 * @example lnGamma(10) // 12.8018
 */
export function lnGamma(x: number): number {
	wantPositive(x);
	return gammaln(x);
}

/**
 * Natural logarithm of the beta function.
 *
 * Formula: ln B(a, b) = ln Γ(a) + ln Γ(b) − ln Γ(a + b).
 * @param a, b above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 6.2.2.
 * @example lnBeta(2, 3) // -2.4849
 */
export function lnBeta(a: number, b: number): number {
	return lnGamma(a) + lnGamma(b) - lnGamma(a + b);
}

/**
 * Digamma, the slope of ln Γ.
 *
 * Formula: ψ(x) = d ln Γ(x) / dx.
 * @param x above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 6.3.1.
 * @example digamma(10) // 2.25175
 */
export function digamma(x: number): number {
	wantPositive(x);
	return digammaOf(x);
}
