import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatQuantity } from '$lib/kernel/quantity/format-quantity';
import { parseQuantity } from '$lib/kernel/quantity/parse-quantity';
import { readingIn, stepAfter } from '$lib/kernel/quantity/reading-in';
import { convert, dimensions, type DimensionName } from '$lib/kernel/quantity/units';

const steps = [1, 0.5, 0.1, 0.05, 0.02, 0.01, 0.002, 0.001];

describe('the step after a conversion', () => {
	it.each([
		[0.01, 'mm', 0.0005, 'in'],
		[0.02, 'mm', 0.001, 'in'],
		[0.002, 'mm', 0.0001, 'in'],
		[0.001, 'in', 0.02, 'mm'],
		[0.0001, 'in', 0.002, 'mm'],
		[1, 'thou', 0.02, 'mm']
	] as const)('%s %s is a step of %s %s', (step, from, wanted, to) => {
		expect(readingIn('length', { value: 1, step }, from, to).step).toBe(wanted);
	});
	it('is one of 1, 2, 5, and none of them lies nearer', () => {
		fc.assert(
			fc.property(
				fc.constantFrom(...steps),
				fc.double({ min: 1e-3, max: 1e3, noNaN: true }),
				(step, factor) => {
					const after = stepAfter(step, factor);
					const apart = Math.max(after / (step * factor), (step * factor) / after);
					expect(apart).toBeLessThanOrEqual(Math.sqrt(2.5) * 1.000001);
					expect([1, 2, 5]).toContain(Number(after.toExponential().split('e')[0]));
				}
			)
		);
	});
	it.each([
		[0, 1],
		[1, 0],
		[-1, -1],
		[NaN, 1],
		[Infinity, 1],
		[1e-300, 1e-300]
	])('%s times %s is refused', (step, factor) => {
		expect(() => stepAfter(step, factor)).toThrow(RangeError);
	});
});

describe('a reading in another unit', () => {
	const pairs = (Object.keys(dimensions) as DimensionName[]).flatMap((dimension) =>
		Object.keys(dimensions[dimension]).flatMap((from) =>
			Object.keys(dimensions[dimension]).map((to) => [dimension, from, to] as const)
		)
	);
	it('is printed within one step of what it is, and read back as the same', () => {
		fc.assert(
			fc.property(
				fc.constantFrom(...pairs),
				fc.integer({ min: -9999, max: 9999 }),
				fc.constantFrom(...steps),
				([dimension, from, to], count, step) => {
					const given = { value: count * step, step };
					const there = readingIn(dimension, given, from as never, to as never);
					// Twenty places are all that a number prints: m³ of a mm³ has no more to say.
					fc.pre(there.step > 1e-12);
					const printed = parseQuantity(formatQuantity(there.value, to, there.step), dimension);
					if (!printed.ok) throw new Error(printed.because);
					expect(Math.abs(printed.value.value - there.value)).toBeLessThanOrEqual(
						there.step * 0.5000001
					);
					const back = convert(dimension, there.value, to as never, from as never);
					expect(Math.abs(back - given.value)).toBeLessThanOrEqual(step * 0.001 + 1e-6);
				}
			)
		);
	});
	it('a step of a thermometer is a difference, whatever the reading', () => {
		const there = readingIn('temperature', { value: 100, step: 1 }, '°C', '°F');
		expect(there.value).toBeCloseTo(212, 9);
		expect(there.step).toBe(2);
	});
});
