import { normalCdf, normalDensity } from '../statistics/distributions/normal';
import { integral } from './integrate';

/** No deviation beyond this many σ counts in seventeen figures. */
const farOut = 9;

/**
 * How large the spread of n readings of one and the same size is: its mean and its own scatter, in
 * units of the scatter σ of one reading.
 *
 * Formula: P(W > w) = 1 − n ∫ φ(x) (Φ(x + w) − Φ(x))^(n−1) dx; d2 = ∫ P dw;
 * d3² = ∫ 2 w P dw − d2².
 * @param n readings, whole, 2 to 100
 * @throws RangeError on misuse
 * Source: L. H. C. Tippett, Biometrika 17 (1925), 364; AIAG, Measurement Systems Analysis (2010),
 * appendix C.
 * @example rangeConstants(3) // d2 1.69257, d3 0.88837
 */
export function rangeConstants(n: number): { d2: number; d3: number } {
	if (!Number.isSafeInteger(n) || n < 2 || n > 100)
		throw new RangeError('a spread is that of 2 to 100 readings');
	const beyond = (w: number) => {
		// An even sum over a whole bell is exact far beyond what is needed.
		const step = 0.25;
		let within = 0;
		for (let x = -farOut; x <= farOut; x += step)
			within += normalDensity(x) * (normalCdf(x + w) - normalCdf(x)) ** (n - 1);
		return 1 - n * step * within;
	};
	const marks = [2, 4, 6, 8];
	const d2 = integral(beyond, 0, 2 * farOut, marks);
	const square = integral((w) => 2 * w * beyond(w), 0, 2 * farOut, marks);
	return { d2, d3: Math.sqrt(square - d2 * d2) };
}

/**
 * The divisor that makes σ out of the mean of g spreads of n readings each.
 *
 * Formula: d2* = √(d2² + d3² / g).
 * @param n readings in each, 2 to 100 @param g spreads averaged, whole, 1 or more
 * @throws RangeError on misuse
 * Source: A. J. Duncan (1955); AIAG, Measurement Systems Analysis (2010), appendix C.
 * @example meanRangeDivisor(3, 1) // 1.91154
 */
export function meanRangeDivisor(n: number, g: number): number {
	if (!Number.isSafeInteger(g) || g < 1) throw new RangeError('spreads are counted from 1');
	const { d2, d3 } = rangeConstants(n);
	return Math.sqrt(d2 * d2 + (d3 * d3) / g);
}
