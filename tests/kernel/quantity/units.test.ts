import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { convert, dimensions, type DimensionName } from '$lib/kernel/quantity/units';
import { expectWithin, referenceOf } from '../../support/reference';

type Entry = { dimension: DimensionName; value: number; from: never };

describe('published unit factors', () => {
	it.each(referenceOf<Entry>('unit-conversion.json'))('%s', (_, entry) => {
		expectWithin(convert(entry.dimension, entry.value, entry.from, entry.unit as never), entry);
	});
});

describe('conversion', () => {
	const pairs = (Object.keys(dimensions) as DimensionName[]).flatMap((dimension) =>
		Object.keys(dimensions[dimension]).flatMap((from) =>
			Object.keys(dimensions[dimension]).map((to) => [dimension, from, to] as const)
		)
	);
	it.each(pairs)('%s from %s to %s and back gives the same', (dimension, from, to) => {
		fc.assert(
			fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), (value) => {
				const back = convert(
					dimension,
					convert(dimension, value, from as never, to as never),
					to as never,
					from as never
				);
				expect(back).toBeCloseTo(value, 6);
			})
		);
	});
	it('refuses what is no number', () => {
		expect(() => convert('length', Number.NaN, 'mm', 'in')).toThrow(RangeError);
		expect(() => convert('force', 1e308, 'kN', 'N')).toThrow(RangeError);
		expect(() => convert('length', 1, 'N·m' as never, 'in')).toThrow(RangeError);
	});
});
