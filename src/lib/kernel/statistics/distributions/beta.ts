import betainc from '@stdlib/math-base-special-betainc';
import betaincinv from '@stdlib/math-base-special-kernel-betaincinv';
import { wantNumber, wantPositive, wantProbability } from './arguments';
import { lnBeta } from './special';

/**
 * Probability that a beta value lies at or below x.
 *
 * Formula: I_x(a, b) = ∫₀ˣ t^(a−1) (1−t)^(b−1) dt / B(a, b).
 * @param x 0 to 1 (0 below, 1 above) @param a, b above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.5.1.
 * @example betaCdf(0.3, 2, 5) // 0.579825
 */
export function betaCdf(x: number, a: number, b: number): number {
	wantNumber(x);
	return regularBeta(inUnit(x), 1 - inUnit(x), a, b);
}

/**
 * Probability that a beta value lies above x.
 *
 * Formula: 1 − I_x(a, b) = I_(1−x)(b, a).
 * @param x 0 to 1 (1 below, 0 above) @param a, b above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.5.2.
 * @example betaUpperTail(0.3, 2, 5) // 0.420175
 */
export function betaUpperTail(x: number, a: number, b: number): number {
	wantNumber(x);
	return regularBeta(1 - inUnit(x), inUnit(x), b, a);
}

/**
 * The value that a beta one stays below with probability p.
 *
 * Formula: x with I_x(a, b) = p.
 * @param p between 0 and 1, both left out @param a, b above zero
 * @throws RangeError on misuse
 * Source: Abramowitz and Stegun, 26.5.1.
 * @example betaQuantile(0.5, 2, 3) // 0.38573
 */
export function betaQuantile(p: number, a: number, b: number): number {
	wantProbability(p);
	return regularBetaQuantile(p, 1 - p, a, b)[0];
}

/** I_x(a, b) from x and y = 1 − x, each as exact as the caller has it. */
export function regularBeta(x: number, y: number, a: number, b: number): number {
	wantPositive(a, b);
	return x <= y ? betainc(x, a, b, true, false) : betainc(y, b, a, true, true);
}

/**
 * x and 1 − x for lower and upper probability p and q = 1 − p.
 * @throws RangeError where the result does not give the probability back, rather than pass it on
 */
export function regularBetaQuantile(p: number, q: number, a: number, b: number): [number, number] {
	wantPositive(a, b);
	let [x, y] = startOf(p, q, a, b);
	const least = Math.min(p, q);
	const off = () => (p < q ? regularBeta(x, y, a, b) - p : q - regularBeta(y, x, b, a));
	// Near a = b = 1 the library's root is good to nine figures only; Newton's step mends that.
	for (let step = 0; step < 3 && Math.abs(off()) > 1e-9 * least; step++) {
		const d = off() / density(x, y, a, b);
		if (!(x - d > 0 && y + d > 0)) break;
		[x, y] = [x - d, y + d];
	}
	if (!(Math.abs(off()) <= 1e-8 * least))
		throw new RangeError('these parameters have no quantile that can be relied on');
	return [x, y];
}

/** Asked for the smaller of x and 1 − x, the library keeps all its figures. */
function startOf(p: number, q: number, a: number, b: number): [number, number] {
	const [x = 0, y = 0] = betaincinv(a, b, p, q);
	if (x <= y) return [x, y];
	const [v = 0, w = 0] = betaincinv(b, a, q, p);
	return [w, v];
}

function density(x: number, y: number, a: number, b: number): number {
	return Math.exp((a - 1) * Math.log(x) + (b - 1) * Math.log(y) - lnBeta(a, b));
}

function inUnit(x: number): number {
	return Math.min(1, Math.max(0, x));
}
