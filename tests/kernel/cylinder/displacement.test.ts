import { expect, it } from 'vitest';
import { displacementCm3 } from '$lib/kernel/cylinder/displacement';

it('gives the AV3-1150 its name', () => {
	expect(Math.round(displacementCm3(74, 89.1, 3))).toBe(1150);
	expect(() => displacementCm3(74, 89.1, 2.5)).toThrow(RangeError);
	expect(() => displacementCm3(1e200, 89.1)).toThrow(RangeError);
});
