import { regularBeta } from './beta';

/**
 * Probability of at most k successes in n tries.
 *
 * Formula: P(X ≤ k) = I_(1−p)(n − k, k + 1).
 * @param k whole, 0 to n @param n whole, 1 or more @param p of one success, 0 to 1
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.5.24.
 * @example binomialCdf(6, 10, 0.8) // 0.12087
 */
export function binomialCdf(k: number, n: number, p: number): number {
	wantTries(k, n, p);
	return k === n ? 1 : regularBeta(1 - p, p, n - k, k + 1);
}

/**
 * Probability of more than k successes in n tries.
 *
 * Formula: P(X > k) = I_p(k + 1, n − k).
 * @param k whole, 0 to n @param n whole, 1 or more @param p of one success, 0 to 1
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.5.24.
 * @example binomialUpperTail(6, 10, 0.8) // 0.87913
 */
export function binomialUpperTail(k: number, n: number, p: number): number {
	wantTries(k, n, p);
	return k === n ? 0 : regularBeta(p, 1 - p, k + 1, n - k);
}

function wantTries(k: number, n: number, p: number): void {
	if (!Number.isSafeInteger(k) || !Number.isSafeInteger(n) || k < 0 || n < 1 || k > n)
		throw new RangeError('successes and tries are whole numbers, k of n');
	if (!(p >= 0 && p <= 1)) throw new RangeError('a probability lies between 0 and 1');
}
