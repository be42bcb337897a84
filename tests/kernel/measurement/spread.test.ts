import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { expectedSpread, trueSpread } from '$lib/kernel/measurement/expected-spread';
import { integral } from '$lib/kernel/measurement/integrate';
import { rangeConstants } from '$lib/kernel/measurement/range-constants';
import { normalCdf, normalDensity } from '$lib/kernel/statistics/distributions/normal';
import type { Outcome } from '$lib/kernel/outcome';

const value = <T>(outcome: Outcome<T>): T => {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
};
const u = fc.double({ min: 1e-4, max: 0.1, noNaN: true });
const size = fc.integer({ min: 39_900, max: 40_100 }).map((one) => one / 1000);

describe('largest minus smallest', () => {
	it.each([2, 3, 4, 5, 10])('of %i readings of one size shows d2 · u', (n) => {
		const shown = value(expectedSpread(Array<number>(n).fill(40), 0.003));
		expect(shown / 0.003).toBeCloseTo(rangeConstants(n).d2, 9);
	});
	it('of two readings is the mean of a folded normal', () => {
		fc.assert(
			fc.property(size, size, u, (a, b, standard) => {
				const [d, s] = [Math.abs(a - b), Math.SQRT2 * standard];
				const folded = 2 * s * normalDensity(d / s) + d * (1 - 2 * normalCdf(-d / s));
				expect(value(expectedSpread([a, b], standard)) / standard).toBeCloseTo(
					folded / standard,
					8
				);
			})
		);
	});
	const sizes = fc.array(size, { minLength: 2, maxLength: 8 });
	it('shows more than there is, by no more than d2 · u', () => {
		fc.assert(
			fc.property(sizes, u, (some, standard) => {
				const there = Math.max(...some) - Math.min(...some);
				const shown = value(expectedSpread(some, standard));
				expect(shown).toBeGreaterThanOrEqual(there - 1e-12);
				const most = there + rangeConstants(some.length).d2 * standard;
				expect(shown).toBeLessThanOrEqual(most + 1e-12);
			}),
			{ numRuns: 40 }
		);
	});
	it('shows what is there to an exact tool, and to one far finer', () => {
		expect(value(expectedSpread([40, 40.01], 0))).toBeCloseTo(0.01, 12);
		expect(value(expectedSpread([1, 1], 0))).toBe(0);
		expect(value(expectedSpread([0, 1], 1e-9))).toBeCloseTo(1, 9);
	});
	it('is the same in micrometres and grows with u', () => {
		fc.assert(
			fc.property(sizes, u, (some, standard) => {
				const shown = value(expectedSpread(some, standard));
				const large = value(
					expectedSpread(
						some.map((one) => 1000 * one),
						1000 * standard
					)
				);
				expect(large / 1000).toBeCloseTo(shown, 9);
				expect(value(expectedSpread(some, 2 * standard))).toBeGreaterThanOrEqual(shown - 1e-12);
			}),
			{ numRuns: 40 }
		);
	});
	it('is taken back: the estimate would show, on average, as what was read', () => {
		const places = fc.integer({ min: 2, max: 8 });
		fc.assert(
			fc.property(fc.double({ min: 0, max: 0.1, noNaN: true }), places, u, (shown, n, standard) => {
				const { estimate, added } = value(trueSpread(shown, n, standard));
				expect(estimate + added).toBeCloseTo(shown, 12);
				expect(estimate).toBeGreaterThanOrEqual(0);
				const sizes = [-estimate / 2, estimate / 2, ...Array<number>(n - 2).fill(0)];
				const again = value(expectedSpread(sizes, standard));
				if (estimate > 0) expect(again).toBeCloseTo(shown, 8);
				else expect(again).toBeGreaterThanOrEqual(shown - 1e-12);
			}),
			{ numRuns: 40 }
		);
	});
	it('refuses nonsense', () => {
		expect(expectedSpread([40], 0.1).ok).toBe(false);
		expect(expectedSpread([40, Number.NaN], 0.1).ok).toBe(false);
		for (const bad of [-1, Number.NaN, Infinity]) {
			expect(expectedSpread([40, 41], bad).ok).toBe(false);
			expect(trueSpread(0.01, 4, bad).ok).toBe(false);
			expect(trueSpread(bad, 4, 0.01).ok).toBe(false);
			expect(trueSpread(0.01, bad, 0.01).ok).toBe(false);
		}
		expect(trueSpread(0.01, 1, 0.01).ok).toBe(false);
	});
});

describe('the integral', () => {
	it('is exact for polynomials up to degree 31', () => {
		fc.assert(
			fc.property(fc.nat(31), (power) => {
				expect(integral((x) => x ** power, 0, 1)).toBeCloseTo(1 / (power + 1), 13);
			})
		);
	});
	it('takes marks in any order, leaves out those outside, and gives nothing for no width', () => {
		const kink = (x: number) => Math.abs(x - 1);
		expect(integral(kink, 0, 3, [5, 2, 1, -1])).toBeCloseTo(2.5, 12);
		expect(integral(kink, 3, 0)).toBe(0);
		expect(integral(kink, 1, 1)).toBe(0);
	});
});
