import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { guardBandOf, guardBandRules } from '$lib/kernel/measurement/guard-band';
import { ruleReading } from '$lib/kernel/measurement/ruling';
import { judgeTool, type Asked, type ToolVerdict } from '$lib/kernel/measurement/tool';
import { chooseTool } from '$lib/kernel/measurement/tool-choice';
import { normalQuantile } from '$lib/kernel/statistics/distributions/normal';
import type { Outcome } from '$lib/kernel/outcome';

const value = <T>(outcome: Outcome<T>): T => {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
};
const crankpin = { least: 39.984, most: 40 };

describe('can this tool judge', () => {
	// Worked by hand: half the width is 0.008 mm.
	it.each<[number, number, ToolVerdict]>([
		[0.0008, 10, 'easily'],
		[0.00081, 9.876, 'yes'],
		[0.002, 4, 'yes'],
		[0.0021, 3.81, 'in-part'],
		[0.0079, 1.013, 'in-part'],
		[0.008, 1, 'no'],
		[0.03, 0.267, 'no']
	])('U = %s mm against a width of 0.016: ratio %s, %s', (expanded, ratio, verdict) => {
		const found = value(judgeTool(expanded, crankpin));
		expect(found.ratio).toBeCloseTo(ratio, 2);
		expect(found.verdict).toBe(verdict);
	});
	it('shows the zone about each limit in which it cannot decide', () => {
		const { undecided, share } = value(judgeTool(0.002, crankpin));
		expect(undecided.map(({ from, to }) => [from.toFixed(3), to.toFixed(3)])).toEqual([
			['39.982', '39.986'],
			['39.998', '40.002']
		]);
		expect(share).toBeCloseTo(0.25, 9);
	});
	it('a single limit needs the room that a sound part has', () => {
		expect(judgeTool(0.002, { most: 0.07 }).ok).toBe(false);
		const found = value(judgeTool(0.002, { most: 0.07, room: 0.02 }));
		expect([found.ratio, found.verdict]).toEqual([10, 'easily']);
		expect(found.undecided.length).toBe(1);
	});
	it('the narrower rule leaves a narrower zone', () => {
		const full = value(judgeTool(0.005, crankpin));
		const sure = value(judgeTool(0.005, { ...crankpin, rule: 'one-sided-95' }));
		expect(sure.guardBand).toBeLessThan(full.guardBand);
		expect(sure.ratio).toBe(full.ratio);
	});
	const asked = fc.record({
		least: fc.integer({ min: 0, max: 400 }).map((one) => one / 1000),
		width: fc.integer({ min: 1, max: 400 }).map((one) => one / 1000),
		expanded: fc.integer({ min: 1, max: 400 }).map((one) => one / 1000)
	});
	const limits = ({ least, width }: { least: number; width: number }): Asked => ({
		least,
		most: least + width
	});
	it('agrees with the ruling: in the zone too close, in the middle within where it can be', () => {
		fc.assert(
			fc.property(asked, fc.double({ min: 0.01, max: 0.99, noNaN: true }), (given, at) => {
				const { undecided, verdict } = value(judgeTool(given.expanded, limits(given)));
				const rule = (reading: number) =>
					value(
						ruleReading({
							question: 'build',
							value: reading,
							expandedUncertainty: given.expanded,
							...limits(given)
						})
					).ruling;
				const zone = undecided[1] as { from: number; to: number };
				const inside = zone.from + at * (zone.to - zone.from);
				// Dust on the zone's edge is forgiven by the ruling.
				if (Math.abs(inside - zone.from) > 1e-8) expect(rule(inside)).toBe('too-close');
				const middle = rule(given.least + given.width / 2);
				if (verdict === 'yes' || verdict === 'easily') expect(middle).toBe('within');
			})
		);
	});
	it('is the same in micrometres, and a coarser tool never judges better', () => {
		const order: ToolVerdict[] = ['no', 'in-part', 'yes', 'easily'];
		fc.assert(
			fc.property(asked, (given) => {
				const found = value(judgeTool(given.expanded, limits(given)));
				const large = { least: 1000 * given.least, width: 1000 * given.width };
				expect(value(judgeTool(1000 * given.expanded, limits(large))).ratio).toBeCloseTo(
					found.ratio,
					8
				);
				const coarse = value(judgeTool(2 * given.expanded, limits(given)));
				expect(order.indexOf(coarse.verdict)).toBeLessThanOrEqual(order.indexOf(found.verdict));
			})
		);
	});
	it('refuses nonsense', () => {
		for (const bad of [0, -1, Number.NaN, Infinity])
			expect(judgeTool(bad, crankpin).ok).toBe(false);
		for (const bad of [
			{},
			{ least: 1, most: 1 },
			{ least: 2, most: 1 },
			{ least: Number.NaN, most: 1 },
			{ most: 1, room: 0 },
			{ most: 1, room: Number.NaN },
			{ most: 1, room: Infinity },
			{ most: Infinity, room: 1 }
		])
			expect(judgeTool(0.01, bad).ok).toBe(false);
	});
});

describe('which tool to fetch', () => {
	const tools = [
		{ name: 'caliper', expanded: 0.03 },
		{ name: 'comparator', expanded: 0.0005 },
		{ name: 'micrometer', expanded: 0.002 }
	];
	it('the least fine that can judge', () => {
		expect(value(chooseTool(tools, crankpin)).fetch).toBe('micrometer');
		expect(value(chooseTool(tools, { least: 39, most: 40 })).fetch).toBe('caliper');
		expect(value(chooseTool(tools, { least: 39.996, most: 40 })).fetch).toBe('comparator');
	});
	it('none, where none can; each is judged in the order given', () => {
		const found = value(chooseTool(tools, { least: 39.9999, most: 40 }));
		expect(found.fetch).toBeUndefined();
		expect(found.judged.map(({ name }) => name)).toEqual(tools.map(({ name }) => name));
		expect(chooseTool([], crankpin).ok).toBe(false);
		expect(chooseTool([{ name: 'none', expanded: 0 }], crankpin).ok).toBe(false);
	});
});

describe('the guard band', () => {
	it('is U, or 95 % of a normal on one side', () => {
		expect(guardBandOf('full-U', 0.005)).toBe(0.005);
		expect(guardBandOf('one-sided-95', 2)).toBeCloseTo(normalQuantile(0.95), 12);
		for (const bad of [-1, Number.NaN, Infinity])
			expect(() => guardBandOf('full-U', bad)).toThrow(RangeError);
	});
	it('is named in a ruling, with the rule that it goes by', () => {
		for (const rule of ['full-U', 'one-sided-95'] as const) {
			const found = value(
				ruleReading({
					question: 'build',
					value: 0.067,
					expandedUncertainty: 0.01,
					most: 0.07,
					rule
				})
			);
			expect(found).toMatchObject({ rule, ruling: 'too-close' });
			expect(found.guardBand).toBe(guardBandOf(rule, 0.01));
			expect(found.because).toContain(guardBandRules[rule].words);
		}
		// Between the two bands the rules part.
		const at = (rule: 'full-U' | 'one-sided-95') =>
			value(
				ruleReading({
					question: 'build',
					value: 0.061,
					expandedUncertainty: 0.01,
					most: 0.07,
					rule
				})
			).ruling;
		expect([at('full-U'), at('one-sided-95')]).toEqual(['too-close', 'within']);
	});
	it('a ruling is the same in micrometres', () => {
		const thousandth = fc.integer({ min: -200, max: 200 }).map((one) => one / 1000);
		fc.assert(
			fc.property(thousandth, fc.integer({ min: 1, max: 50 }), thousandth, (reading, u, most) => {
				const rule = (factor: number) =>
					value(
						ruleReading({
							question: 'build',
							value: factor * reading,
							expandedUncertainty: (factor * u) / 1000,
							most: factor * most
						})
					).ruling;
				expect(rule(1000)).toBe(rule(1));
			})
		);
	});
});
