import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { uncertaintyBudget } from '$lib/kernel/measurement/budget';
import { combinedStandard } from '$lib/kernel/measurement/combined';
import type { Component } from '$lib/kernel/measurement/component';
import { coverageFactor95, effectiveDegrees } from '$lib/kernel/measurement/effective-degrees';
import { ofPowerProduct } from '$lib/kernel/measurement/power-product';
import { ofMean, repeatsNeeded, repeatsOf } from '$lib/kernel/measurement/repeats';
import {
	ofHalfWidth,
	ofLeastCount,
	temperatureComponents
} from '$lib/kernel/measurement/sources-of-uncertainty';
import { ofDifferenceMm, standardUncertaintyMm } from '$lib/kernel/measurement/uncertainty';
import { at20Mm } from '$lib/kernel/geometry/temperature';
import type { Outcome } from '$lib/kernel/outcome';
import { expectNear, publishedIn } from '../statistics/published';

const value = <T>(outcome: Outcome<T>): T => {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
};
const part = (standard: number, sensitivity = 1, degreesOfFreedom = Infinity): Component => ({
	name: 'part',
	type: Number.isFinite(degreesOfFreedom) ? 'A' : 'B',
	standard,
	sensitivity,
	degreesOfFreedom
});

describe('combined_and_expanded_uncertainty', () => {
	const { inputs, expected, tolerance, source } = publishedIn<{
		inputs: {
			u_components: number[];
			sensitivity: number[];
			dof: (number | null)[];
			correlation_12: number;
		};
		expected: Record<string, number>;
	}>('decision-risk.json')('combined_and_expanded_uncertainty');
	const components = inputs.u_components.map((u, at) =>
		part(u, inputs.sensitivity[at], inputs.dof[at] ?? Infinity)
	);
	it.each<[string, () => number]>([
		['u_c_uncorrelated', () => value(combinedStandard(components))],
		[
			'u_c_with_correlation',
			() =>
				value(
					combinedStandard(components, [
						{ first: 0, second: 1, coefficient: inputs.correlation_12 }
					])
				)
		],
		['welch_satterthwaite_dof', () => value(effectiveDegrees(components))],
		['k95_t_real_dof', () => coverageFactor95(value(effectiveDegrees(components)))],
		['k95_t_truncated_dof', () => value(uncertaintyBudget(components)).coverageFactor],
		['U95_truncated', () => value(uncertaintyBudget(components)).expanded],
		['U_k2', () => 2 * value(uncertaintyBudget(components)).standard]
	])(`%s (${source})`, (name, found) => {
		expectNear(found(), expected[name] ?? Number.NaN, tolerance);
	});
});

const u = fc.double({ min: 1e-6, max: 1, noNaN: true });
const sensitivity = fc.double({ min: -10, max: 10, noNaN: true }).filter((c) => Math.abs(c) > 1e-3);
const degrees = fc.oneof(fc.integer({ min: 1, max: 100 }), fc.constant(Infinity));
const components = fc.array(
	fc.tuple(u, sensitivity, degrees).map(([one, c, df]) => part(one, c, df)),
	{ minLength: 1, maxLength: 8 }
);

describe('a budget', () => {
	it('has shares that make one, in the order given', () => {
		fc.assert(
			fc.property(components, (some) => {
				const found = uncertaintyBudget(some);
				if (!found.ok) return expect(found.because).toMatch(/too few readings/);
				const { lines, standard } = found.value;
				expect(lines.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 9);
				expect(lines.map((one) => one.standard)).toEqual(some.map((one) => one.standard));
				for (const { contribution } of lines)
					expect(contribution).toBeLessThanOrEqual(standard * (1 + 1e-12));
			})
		);
	});
	it('knows its own scatter no worse than its worst part, no better than all together', () => {
		fc.assert(
			fc.property(components, (some) => {
				const found = value(effectiveDegrees(some));
				const all = some.map((one) => one.degreesOfFreedom);
				expect(found).toBeGreaterThanOrEqual(Math.min(...all) * (1 - 1e-9));
				expect(found).toBeLessThanOrEqual(all.reduce((a, b) => a + b) * (1 + 1e-9));
			})
		);
	});
	it('is the same in micrometres', () => {
		fc.assert(
			fc.property(components, (some) => {
				const large = some.map((one) => ({ ...one, standard: 1000 * one.standard }));
				const [a, b] = [uncertaintyBudget(some), uncertaintyBudget(large)];
				expect(b.ok).toBe(a.ok);
				if (a.ok && b.ok) expect(b.value.expanded / 1000 / a.value.expanded).toBeCloseTo(1, 9);
			})
		);
	});
	it('only grows with another part', () => {
		fc.assert(
			fc.property(components, u, (some, more) => {
				expect(value(combinedStandard([...some, part(more)]))).toBeGreaterThanOrEqual(
					value(combinedStandard(some))
				);
			})
		);
	});
	it('widens its factor where few repeats carry it, and never goes below 2', () => {
		const at = (df: number) => value(uncertaintyBudget([part(0.003, 1, df)])).coverageFactor;
		// JCGM 100:2008, table G.2, 95 %.
		expect(at(1)).toBeCloseTo(12.71, 2);
		expect(at(2)).toBeCloseTo(4.3, 2);
		expect(at(4.9)).toBeCloseTo(2.78, 2);
		expect(at(20)).toBeCloseTo(2.09, 2);
		expect([at(100), at(Infinity)]).toEqual([2, 2]);
	});
	it('a correlation of one adds, of minus one takes away', () => {
		const pair = [part(0.003), part(0.004)];
		const with_ = (coefficient: number) =>
			combinedStandard(pair, [{ first: 0, second: 1, coefficient }]);
		expect(value(with_(1))).toBeCloseTo(0.007, 12);
		expect(value(with_(-1))).toBeCloseTo(0.001, 12);
		expect(with_(1.01).ok).toBe(false);
		expect(with_(Number.NaN).ok).toBe(false);
		expect(() => combinedStandard(pair, [{ first: 0, second: 2, coefficient: 0 }])).toThrow(
			RangeError
		);
		const three = [part(1), part(1), part(1)];
		const against = [
			[0, 1],
			[0, 2],
			[1, 2]
		].map(([first = 0, second = 0]) => ({ first, second, coefficient: -1 }));
		expect(combinedStandard(three, against).ok).toBe(false);
	});
	it('refuses what is no component', () => {
		for (const bad of [
			[],
			[part(-1)],
			[part(Number.NaN)],
			[part(Infinity)],
			[part(1, Number.NaN)],
			[part(1, 1, 0)],
			[part(1, 1, Number.NaN)],
			[part(0)],
			[part(1, 0)],
			[part(1, 1, 0.5)],
			[part(1e308), part(1e308, 1e10)]
		])
			expect(uncertaintyBudget(bad).ok).toBe(false);
		expect(() => coverageFactor95(0)).toThrow(RangeError);
	});
});

describe('repeats', () => {
	it('of JCGM 100:2008, 4.4.3: twenty temperatures', () => {
		// Table 1 of the guide: mean 100.145, s 1.489, s of the mean 0.333.
		const degreesC = [
			96.9, 98.18, 98.25, 98.61, 99.03, 99.49, 99.56, 99.74, 99.89, 100.07, 100.33, 100.42, 100.68,
			100.95, 101.11, 101.2, 101.57, 101.84, 102.36, 102.72
		];
		const found = value(repeatsOf(degreesC));
		expect(found.mean).toBeCloseTo(100.145, 3);
		expect(found.deviation).toBeCloseTo(1.489, 3);
		expect(found.standard).toBeCloseTo(0.333, 3);
		expect(found.degreesOfFreedom).toBe(19);
	});
	it('scatter the same wherever the size lies', () => {
		const offsets = fc.array(fc.integer({ min: -50, max: 50 }), { minLength: 2, maxLength: 12 });
		fc.assert(
			fc.property(offsets, fc.integer({ min: 0, max: 200 }), (some, size) => {
				const at = (base: number) => value(repeatsOf(some.map((one) => base + one / 1000)));
				expect(at(size).deviation).toBeCloseTo(at(0).deviation, 9);
				expect(at(size).mean - size).toBeCloseTo(at(0).mean, 9);
			})
		);
	});
	it('help against scatter alone', () => {
		fc.assert(
			fc.property(u, u, fc.integer({ min: 1, max: 50 }), (s, shared, n) => {
				expect(ofMean(s, shared, n + 1)).toBeLessThanOrEqual(ofMean(s, shared, n));
				expect(ofMean(s, shared, n)).toBeGreaterThanOrEqual(shared);
			})
		);
	});
	it('are counted so that one fewer would not do', () => {
		fc.assert(
			fc.property(u, u, fc.double({ min: 1.01, max: 3, noNaN: true }), (s, shared, factor) => {
				const wanted = shared * factor;
				const n = value(repeatsNeeded(s, shared, wanted));
				if (n > 1e9) return;
				expect(ofMean(s, shared, n)).toBeLessThanOrEqual(wanted * (1 + 1e-8));
				if (n > 1) expect(ofMean(s, shared, n - 1)).toBeGreaterThan(wanted * (1 - 1e-8));
			})
		);
		expect(repeatsNeeded(0.004, 0.003, 0.003)).toMatchObject({ ok: false });
		expect(value(repeatsNeeded(0, 0.001, 0.002))).toBe(1);
	});
	it('refuse nonsense', () => {
		expect(repeatsOf([]).ok).toBe(false);
		expect(repeatsOf([1]).ok).toBe(false);
		expect(repeatsOf([1, Number.NaN]).ok).toBe(false);
		expect(repeatsOf([1e308, -1e308]).ok).toBe(false);
		for (const bad of [-1, Number.NaN, Infinity]) {
			expect(repeatsNeeded(bad, 0.1, 0.2).ok).toBe(false);
			expect(repeatsNeeded(0.1, bad, 0.2).ok).toBe(false);
			expect(repeatsNeeded(0.1, 0.1, bad).ok).toBe(false);
			expect(() => ofMean(bad, 0, 1)).toThrow(RangeError);
			expect(() => ofMean(0, 0, bad)).toThrow(RangeError);
		}
	});
});

describe('what is known beforehand', () => {
	it('a least count and a half width are rectangular', () => {
		expect(ofLeastCount(0.01)).toBeCloseTo(standardUncertaintyMm(0.01, 0), 15);
		expect(ofHalfWidth(0.005)).toBeCloseTo(ofLeastCount(0.01), 15);
		for (const bad of [-1, Number.NaN, Infinity]) {
			expect(() => ofLeastCount(bad)).toThrow(RangeError);
			expect(() => ofHalfWidth(bad)).toThrow(RangeError);
		}
		expect(() => ofLeastCount(0)).toThrow(RangeError);
	});
	const body = fc.record({
		expansionPerK: fc.double({ min: 5e-6, max: 25e-6, noNaN: true }),
		temperatureC: fc.double({ min: -10, max: 120, noNaN: true }),
		temperatureWithinC: fc.double({ min: 0.1, max: 5, noNaN: true }),
		expansionWithinPerK: fc.double({ min: 1e-7, max: 2e-6, noNaN: true })
	});
	it('temperature moves a size as its correction does', () => {
		fc.assert(
			fc.property(fc.double({ min: 1, max: 500, noNaN: true }), body, body, (L, one, other) => {
				const found = value(temperatureComponents(L, one, other));
				const size = (a: object, b: object) =>
					value(at20Mm(L, { ...one, ...a }, { ...other, ...b }));
				const rise = (T: number) => ({ temperatureC: T + 1 });
				const moved: Record<string, number> = {
					'Temperature of the part': size(rise(one.temperatureC), {}) - size({}, {}),
					'Temperature of the instrument': size({}, rise(other.temperatureC)) - size({}, {})
				};
				for (const { name, sensitivity: c, standard } of found) {
					if (name in moved) expect(c).toBeCloseTo(moved[name] as number, 9);
					expect(standard).toBeGreaterThan(0);
				}
			})
		);
	});
	it('leaves out what is known exactly, and refuses nonsense', () => {
		const exact = {
			expansionPerK: 11.5e-6,
			temperatureC: 25,
			temperatureWithinC: 0,
			expansionWithinPerK: 0
		};
		expect(value(temperatureComponents(80, exact, exact))).toEqual([]);
		for (const bad of [
			{ temperatureC: Number.NaN },
			{ temperatureWithinC: -1 },
			{ expansionPerK: Infinity },
			{ expansionWithinPerK: Number.NaN }
		]) {
			expect(temperatureComponents(80, { ...exact, ...bad }, exact).ok).toBe(false);
			expect(temperatureComponents(80, exact, { ...exact, ...bad }).ok).toBe(false);
		}
		for (const bad of [0, -1, Number.NaN, Infinity])
			expect(temperatureComponents(bad, exact, exact).ok).toBe(false);
	});
});

describe('what is computed from several readings', () => {
	it('a difference by sensitivities is the difference by hand', () => {
		fc.assert(
			fc.property(u, u, (a, b) => {
				expect(value(combinedStandard([part(a, 1), part(b, -1)]))).toBeCloseTo(
					ofDifferenceMm(a, b),
					12
				);
			})
		);
	});
	it('a volume counts its bore twice', () => {
		const found = value(
			ofPowerProduct([
				{ value: 74, standard: 0.0074, power: 2 },
				{ value: 89.1, standard: 0, power: 1 }
			])
		);
		expect(found.value).toBeCloseTo(74 ** 2 * 89.1, 6);
		expect(found.standard / found.value).toBeCloseTo(2e-4, 12);
	});
	it('a power and its inverse share their relative uncertainty', () => {
		fc.assert(
			fc.property(fc.double({ min: 0.1, max: 100, noNaN: true }), u, (x, standard) => {
				const relative = (power: number) => {
					const found = value(ofPowerProduct([{ value: x, standard, power }]));
					return found.standard / found.value;
				};
				expect(relative(-1)).toBeCloseTo(relative(1), 9);
				expect(relative(3)).toBeCloseTo(3 * relative(1), 9);
			})
		);
	});
	it('refuses what has no relative uncertainty', () => {
		for (const bad of [
			[],
			[{ value: 0, standard: 1, power: 1 }],
			[{ value: 1, standard: -1, power: 1 }],
			[{ value: 1, standard: Number.NaN, power: 1 }],
			[{ value: Number.NaN, standard: 1, power: 1 }],
			[{ value: -2, standard: 1, power: 0.5 }],
			[{ value: 1e200, standard: 1, power: 9 }]
		])
			expect(ofPowerProduct(bad).ok).toBe(false);
	});
});
