import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { betaCdf, betaQuantile, betaUpperTail } from '$lib/kernel/statistics/distributions/beta';
import { binomialCdf, binomialUpperTail } from '$lib/kernel/statistics/distributions/binomial';
import {
	chiSquaredCdf,
	chiSquaredQuantile,
	chiSquaredUpperTail
} from '$lib/kernel/statistics/distributions/chi-squared';
import { fCdf, fQuantile, fUpperTail } from '$lib/kernel/statistics/distributions/f';
import {
	gammaCdf,
	gammaQuantile,
	gammaUpperTail
} from '$lib/kernel/statistics/distributions/gamma';
import {
	normalCdf,
	normalDensity,
	normalQuantile,
	normalUpperTail
} from '$lib/kernel/statistics/distributions/normal';
import { digamma, lnBeta, lnGamma } from '$lib/kernel/statistics/distributions/special';
import { tCdf, tQuantile, tUpperTail } from '$lib/kernel/statistics/distributions/student-t';
import { expectNear, publishedIn } from './published';

type Row = { id: string; function: string; at: number; parameters: number[]; value: number };
const published = publishedIn<{ entries: Row[] }>('distributions.json');
const functions: Record<string, (at: number, ...parameters: number[]) => number> = {
	qnorm: normalQuantile,
	qt: tQuantile,
	qchisq: chiSquaredQuantile,
	qf: fQuantile,
	qbeta: betaQuantile,
	qgamma: gammaQuantile,
	pnorm: normalCdf,
	pt: tCdf,
	pchisq: chiSquaredCdf,
	pf: fCdf,
	pbeta: betaCdf,
	pnorm_upper: normalUpperTail,
	pt_upper: tUpperTail,
	pchisq_upper: chiSquaredUpperTail,
	pf_upper: fUpperTail,
	lgamma: lnGamma,
	lbeta: lnBeta,
	digamma,
	binom_cdf: binomialCdf
};

describe.each(['quantiles', 'cumulative', 'upper_tails', 'special_functions'])(
	'%s, published to twenty figures',
	(id) => {
		const { entries, tolerance, source } = published(id);
		it.each(entries.map((row) => [`${row.id} (${source})`, row] as const))('%s', (_, row) => {
			const found = functions[row.function]?.(row.at, ...row.parameters);
			expectNear(found ?? Number.NaN, row.value, tolerance);
		});
	}
);

/** Each family as its three functions over a spread of parameters. */
const shape = fc.double({ min: 1, max: 200, noNaN: true });
const families: Record<
	string,
	(a: number, b: number) => Record<'cdf' | 'upper' | 'quantile', (x: number) => number>
> = {
	normal: () => ({ cdf: normalCdf, upper: normalUpperTail, quantile: normalQuantile }),
	"Student's t": (a) => ({
		cdf: (x) => tCdf(x, a),
		upper: (x) => tUpperTail(x, a),
		quantile: (p) => tQuantile(p, a)
	}),
	'chi-squared': (a) => ({
		cdf: (x) => chiSquaredCdf(x, a),
		upper: (x) => chiSquaredUpperTail(x, a),
		quantile: (p) => chiSquaredQuantile(p, a)
	}),
	F: (a, b) => ({
		cdf: (x) => fCdf(x, a, b),
		upper: (x) => fUpperTail(x, a, b),
		quantile: (p) => fQuantile(p, a, b)
	}),
	beta: (a, b) => ({
		cdf: (x) => betaCdf(x, a, b),
		upper: (x) => betaUpperTail(x, a, b),
		quantile: (p) => betaQuantile(p, a, b)
	}),
	gamma: (a, b) => ({
		cdf: (x) => gammaCdf(x, a, b),
		upper: (x) => gammaUpperTail(x, a, b),
		quantile: (p) => gammaQuantile(p, a, b)
	})
};
const probability = fc.double({ min: 0.001, max: 0.999, noNaN: true });

describe.each(Object.entries(families))('%s', (_, of) => {
	it('has a quantile that undoes its cdf', () => {
		fc.assert(
			fc.property(probability, shape, shape, (p, a, b) => {
				const { cdf, quantile } = of(a, b);
				expect(cdf(quantile(p))).toBeCloseTo(p, 9);
			})
		);
	});
	it('has tails that make one', () => {
		fc.assert(
			fc.property(fc.double({ min: -30, max: 300, noNaN: true }), shape, shape, (x, a, b) => {
				const { cdf, upper } = of(a, b);
				expect(cdf(x) + upper(x)).toBeCloseTo(1, 9);
				expect(Math.min(cdf(x), upper(x))).toBeGreaterThanOrEqual(0);
			})
		);
	});
	it('never falls', () => {
		fc.assert(
			fc.property(probability, probability, shape, shape, (p, q, a, b) => {
				const { cdf, quantile } = of(a, b);
				const [low, high] = [Math.min(p, q), Math.max(p, q)];
				const [x, y] = [quantile(low), quantile(high)];
				if (high - low > 1e-9) expect(y).toBeGreaterThan(x);
				if (y > x) expect(cdf(y)).toBeGreaterThanOrEqual(cdf(x) - 1e-14);
			})
		);
	});
	it('refuses what is no probability and no number', () => {
		const { cdf, upper, quantile } = of(2, 3);
		for (const bad of [0, 1, -0.1, 1.1, Number.NaN, Infinity])
			expect(() => quantile(bad)).toThrow(RangeError);
		expect(() => cdf(Number.NaN)).toThrow(RangeError);
		expect(() => upper(Number.NaN)).toThrow(RangeError);
		expect([cdf(Infinity), upper(Infinity), cdf(-Infinity), upper(-Infinity)]).toEqual([
			1, 0, 0, 1
		]);
	});
});

describe('what is known between the families', () => {
	it('normal and t are symmetric', () => {
		fc.assert(
			fc.property(probability, shape, (p, df) => {
				expect(normalQuantile(p)).toBeCloseTo(-normalQuantile(1 - p), 9);
				expect(tQuantile(p, df)).toBeCloseTo(-tQuantile(1 - p, df), 8);
			})
		);
	});
	it('the square of t is F with 1, of normal chi-squared with 1', () => {
		fc.assert(
			fc.property(probability, shape, (p, df) => {
				const t = tQuantile((1 + p) / 2, df);
				expect(t * t).toBeCloseTo(fQuantile(p, 1, df), 6);
				const z = normalQuantile((1 + p) / 2);
				expect(z * z).toBeCloseTo(chiSquaredQuantile(p, 1), 8);
			})
		);
	});
	it('t goes over into normal, also for endless degrees of freedom', () => {
		for (const df of [1e9, 9e10, 2e11, 1e300, Infinity]) {
			expect(tQuantile(0.975, df)).toBeCloseTo(normalQuantile(0.975), 8);
			expect(tCdf(1.5, df)).toBeCloseTo(normalCdf(1.5), 9);
		}
	});
	it('beta mirrors, binomial sums', () => {
		fc.assert(
			fc.property(probability, shape, shape, (x, a, b) => {
				expect(betaCdf(x, a, b)).toBeCloseTo(betaUpperTail(1 - x, b, a), 9);
			})
		);
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 60 }), fc.nat(60), probability, (n, at, p) => {
				const k = Math.min(at, n);
				const one = (i: number) =>
					Math.exp(-lnBeta(i + 1, n - i + 1) - Math.log(n + 1)) * p ** i * (1 - p) ** (n - i);
				const summed = Array.from({ length: k + 1 }, (_, i) => one(i)).reduce((a, b) => a + b);
				expect(binomialCdf(k, n, p)).toBeCloseTo(summed, 10);
				expect(binomialUpperTail(k, n, p)).toBeCloseTo(1 - summed, 10);
			})
		);
		expect([binomialCdf(3, 3, 0.5), binomialUpperTail(3, 3, 0.5)]).toEqual([1, 0]);
		expect([binomialCdf(0, 3, 1), binomialCdf(0, 3, 0)]).toEqual([0, 1]);
	});
	it('the slope of the normal cdf is its density', () => {
		fc.assert(
			fc.property(fc.double({ min: -6, max: 6, noNaN: true }), (z) => {
				const slope = (normalCdf(z + 1e-4) - normalCdf(z - 1e-4)) / 2e-4;
				expect(normalDensity(z)).toBeCloseTo(slope, 7);
			})
		);
	});
});

it('parameters that make no distribution are refused', () => {
	for (const bad of [0, -1, Number.NaN, Infinity])
		for (const asks of [
			() => chiSquaredCdf(1, bad),
			() => gammaQuantile(0.5, 1, bad),
			() => fCdf(1, bad, 2),
			() => fQuantile(0.5, 2, bad),
			() => betaCdf(0.5, bad, 1),
			() => betaQuantile(0.5, 1, bad),
			() => lnGamma(bad),
			() => digamma(bad)
		])
			expect(asks).toThrow(RangeError);
	expect(() => tCdf(1, 0)).toThrow(RangeError);
	expect(() => tQuantile(0.5, Number.NaN)).toThrow(RangeError);
	for (const [k, n, p] of [
		[-1, 3, 0.5],
		[4, 3, 0.5],
		[1.5, 3, 0.5],
		[1, 0, 0.5],
		[1, 3, 1.5],
		[1, 3, Number.NaN]
	] as const)
		expect(() => binomialCdf(k, n, p)).toThrow(RangeError);
});
