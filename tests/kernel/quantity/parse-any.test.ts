import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseAny, writtenStep } from '$lib/kernel/quantity/parse-any';
import { dimensions, scaleOf, type DimensionName } from '$lib/kernel/quantity/units';

describe('a quantity told by its unit', () => {
	const units = (Object.keys(dimensions) as DimensionName[])
		.filter((dimension) => dimension !== 'temperatureDifference')
		.flatMap((dimension) =>
			Object.keys(dimensions[dimension]).map((unit) => [unit, dimension] as const)
		);
	it.each(units)('%s is one of %s', (unit, dimension) => {
		expect(parseAny(`12.5 ${unit}`)).toEqual({ ok: true, value: { value: 12.5, unit, dimension } });
	});
	it.each([
		['18 ft-lb', 18, 'lbf·ft', 'torque'],
		['3/8"', 0.375, 'in', 'length'],
		['-40 F', -40, '°F', 'temperature'],
		['2,2 litres', 2.2, 'L', 'volume'],
		['1/4 turn', 0.25, 'turn', 'angle']
	])('%s is read', (typed, value, unit, dimension) => {
		expect(parseAny(typed)).toEqual({ ok: true, value: { value, unit, dimension } });
	});
	it.each([
		['', 'no number'],
		['12', 'say the unit'],
		['3/8', 'say the unit'],
		['12 furlongs', 'not known here'],
		['1,250 psi', 'two ways'],
		['1.234,5 mm', 'two ways'],
		['40.01 40.02 mm', 'more than one number'],
		['3/8 mm', 'write a decimal'],
		[`${'9'.repeat(400)} N`, 'too large']
	])('%s is refused with the reason', (typed, because) => {
		const found = parseAny(typed);
		expect(found.ok ? '' : found.because).toContain(because);
	});
	it('is a finite number or a reason, whatever is typed', () => {
		const typed = fc.oneof(
			fc.string(),
			fc.string({ unit: fc.constantFrom(...'0123456789.,+- /mNlbfcKW°"'.split('')) })
		);
		fc.assert(
			fc.property(typed, (text) => {
				const found = parseAny(text);
				expect(found.ok ? Number.isFinite(found.value.value) : found.because.length > 5).toBe(true);
				expect(writtenStep(text)).toBeGreaterThan(0);
			})
		);
	});
});

describe('the step that a figure is written in', () => {
	it.each([
		['18 ft-lb', 1],
		['0,045 mm', 0.001],
		['1.50 in', 0.01],
		['1 250,5 N', 0.1],
		['3/8 in', 0.001]
	])('%s is written in steps of %s', (typed, step) => {
		expect(writtenStep(typed)).toBe(step);
	});
});

it('a unit of another dimension is a slip of the caller', () => {
	expect(() => scaleOf('length', 'psi')).toThrow(RangeError);
});
