import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseQuantity } from '$lib/kernel/quantity/parse-quantity';
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
	});
});

describe('a typed quantity', () => {
	it.each([
		['0,045 mm', 'length', 0.045, 'mm'],
		['1.5 thou', 'length', 1.5, 'thou'],
		['18 ft-lb', 'torque', 18, 'lbf·ft'],
		['35 Nm', 'torque', 35, 'N·m'],
		['2.5 bar', 'pressure', 2.5, 'bar']
	] as const)('%s is read', (typed, dimension, value, unit) => {
		expect(parseQuantity(typed, dimension)).toEqual({ ok: true, value: { value, unit } });
	});
	it.each([
		['12', 'length', 'say the unit'],
		['1,234.5 mm', 'length', 'two ways'],
		['18 Nm', 'length', 'no unit of length'],
		['tight', 'torque', 'no number']
	] as const)('%s is refused with the reason', (typed, dimension, because) => {
		const found = parseQuantity(typed, dimension);
		expect(found.ok ? '' : found.because).toContain(because);
	});
});
