import { wantNumber, wantProbability } from './arguments';
import { regularBetaQuantile } from './beta';
import { fUpperTail } from './f';
import { normalCdf, normalQuantile } from './normal';

/** From here on t and normal agree to eleven figures, and the sum for t has no better to give. */
const asGoodAsNormal = 1e11;

/**
 * Probability that a value of Student's t lies at or below x.
 *
 * Formula: for x < 0, ½ I_w(ν/2, ½) with w = ν / (ν + x²); 1 less that of −x above.
 * @param x any number @param df degrees of freedom ν, above zero; may be infinite (normal)
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.7.1 and 26.5.27.
 * @example tCdf(2, 3) // 0.93034
 */
export function tCdf(x: number, df: number): number {
	wantNumber(x);
	wantDegrees(df);
	if (df > asGoodAsNormal) return normalCdf(x);
	// The square of t follows F with 1 and ν degrees of freedom, which keeps its small tails.
	const tail = fUpperTail(x * x, 1, df) / 2;
	return x < 0 ? tail : 1 - tail;
}

/**
 * Probability that a value of Student's t lies above x.
 *
 * Formula: Q(x) = P(−x).
 * @param x any number @param df degrees of freedom, above zero; may be infinite (normal)
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.7.1 (symmetry).
 * @example tUpperTail(12, 20) // 6.798e-11
 */
export function tUpperTail(x: number, df: number): number {
	return tCdf(-x, df);
}

/**
 * The value that one of Student's t stays below with probability p.
 *
 * Formula: t with P(t) = p; below the middle −√(ν y / x), where I_x(ν/2, ½) = 2p and y = 1 − x.
 * @param p between 0 and 1, both left out @param df degrees of freedom, above zero; may be infinite
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.7.1 and 26.5.27.
 * @example tQuantile(0.975, 10) // 2.22814
 */
export function tQuantile(p: number, df: number): number {
	wantProbability(p);
	wantDegrees(df);
	if (df > asGoodAsNormal) return normalQuantile(p);
	if (p === 0.5) return 0;
	const tail = Math.min(p, 1 - p);
	const [x, y] = regularBetaQuantile(2 * tail, 1 - 2 * tail, df / 2, 0.5);
	const t = Math.sqrt((df * y) / x);
	return p < 0.5 ? -t : t;
}

function wantDegrees(df: number): void {
	if (!(df > 0)) throw new RangeError('degrees of freedom are above zero');
}
