import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { coverage, gaps, mergeIntervals, watchedS } from '$lib/kernel/captions/watched';

const stretch = fc
	.tuple(fc.integer({ min: 0, max: 100 }), fc.integer({ min: 0, max: 20 }))
	.map(([from, length]): [number, number] => [from, from + length]);

describe('watched stretches', () => {
	it('are the same whatever order and however often they arrive', () => {
		fc.assert(
			fc.property(fc.array(stretch), (all) => {
				const merged = mergeIntervals(all);
				expect(mergeIntervals([...all].reverse())).toEqual(merged);
				expect(mergeIntervals([...all, ...all, ...merged])).toEqual(merged);
			})
		);
	});
	it('never shrink by another report, and never pass the whole film', () => {
		fc.assert(
			fc.property(fc.array(stretch), stretch, (all, more) => {
				const before = coverage(mergeIntervals(all), 130);
				const after = coverage(mergeIntervals([...all, more]), 130);
				expect(after).toBeGreaterThanOrEqual(before);
				expect(after).toBeLessThanOrEqual(1);
			})
		);
	});
	it('and gaps make up the film together', () => {
		const merged = mergeIntervals([
			[10, 20],
			[0, 5],
			[18, 30]
		]);
		expect(merged).toEqual([
			[0, 5],
			[10, 30]
		]);
		expect(gaps(merged, 40)).toEqual([
			[5, 10],
			[30, 40]
		]);
		expect(watchedS(merged) + watchedS(gaps(merged, 40))).toBe(40);
	});
	it('count nothing past the end of the film', () => {
		expect(
			coverage(
				[
					[0, 50],
					[100, 160]
				],
				100
			)
		).toBe(0.5);
		expect(
			gaps(
				[
					[0, 50],
					[100, 160]
				],
				100
			)
		).toEqual([[50, 100]]);
		expect(coverage([], 0)).toBe(1);
		expect(() => coverage([], Number.NaN)).toThrow(RangeError);
	});
	it('reported bit by bit come to the same as all at once', () => {
		fc.assert(
			fc.property(fc.array(stretch), (all) => {
				const bitByBit = all.reduce<[number, number][]>(
					(held, one) => mergeIntervals([...held, one]),
					[]
				);
				expect(bitByBit).toEqual(mergeIntervals(all));
			})
		);
	});
	it('that end before they begin are refused', () => {
		expect(() => mergeIntervals([[5, 4]])).toThrow(RangeError);
	});
});
