import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { seeded } from '$lib/kernel/random/random';

describe('chance that can be had again', () => {
	it('is the same for the same seed and another for another', () => {
		const draw = (seed: string) => Array.from({ length: 5 }, seeded(seed).unit);
		expect(draw('a')).toEqual(draw('a'));
		expect(draw('a')).not.toEqual(draw('b'));
	});
	it('stays in its bounds and shuffles without loss', () => {
		fc.assert(
			fc.property(fc.string(), fc.array(fc.integer()), (seed, list) => {
				const random = seeded(seed);
				expect(random.integer(3, 7)).toBeGreaterThanOrEqual(3);
				expect(random.integer(3, 7)).toBeLessThanOrEqual(7);
				expect(random.shuffle(list).toSorted()).toEqual(list.toSorted());
			})
		);
	});
	it('spreads evenly: chi-square of ten bins under 27.88, the 99.9 % point for 9 degrees of freedom', () => {
		const bins = Array<number>(10).fill(0);
		const random = seeded('even');
		for (let i = 0; i < 10_000; i++) {
			const bin = random.integer(0, 9);
			bins[bin] = (bins[bin] ?? 0) + 1;
		}
		expect(bins.reduce((sum, one) => sum + (one - 1000) ** 2 / 1000, 0)).toBeLessThan(27.88);
	});
});
