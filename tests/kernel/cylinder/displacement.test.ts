import { expect, it } from 'vitest';
import { displacementCm3 } from '$lib/kernel/cylinder/displacement';
import { expectWithin, referenceOf } from '../../support/reference';

type Entry = { bore: number; stroke: number; cylinders: number; lengthUnit: string };

it.each(referenceOf<Entry>('displacement.json'))('%s', (_, entry) => {
	const mm = entry.lengthUnit === 'in' ? 25.4 : 1;
	const cm3 = displacementCm3(entry.bore * mm, entry.stroke * mm, entry.cylinders);
	const wanted: Record<string, number> = { in3: 16.387064, cm3: 1, L: 1000 };
	expectWithin(cm3 / (wanted[entry.unit] ?? Number.NaN), entry);
});

it('gives the AV3-1150 its name', () => {
	expect(Math.round(displacementCm3(74, 89.1, 3))).toBe(1150);
	expect(() => displacementCm3(74, 89.1, 2.5)).toThrow(RangeError);
	expect(() => displacementCm3(1e200, 89.1)).toThrow(RangeError);
});
