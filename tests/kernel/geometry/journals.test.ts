import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { leastMm, mostMm, outOfRoundMm, taperMm } from '$lib/kernel/geometry/diameter-grid';
import { oilClearance } from '$lib/kernel/geometry/oil-clearance';

const value = (outcome: { ok: true; value: number } | { ok: false; because: string }) => {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
};

describe('a grid of diameters', () => {
	const reading = fc.integer({ min: 39_900, max: 40_100 }).map((one) => one / 1000);
	const grid = fc.array(fc.array(reading, { minLength: 2, maxLength: 2 }), {
		minLength: 2,
		maxLength: 4
	});
	it('does not care which plane was read first, nor from which end', () => {
		fc.assert(
			fc.property(grid, (rows) => {
				expect(outOfRoundMm(rows)).toEqual(outOfRoundMm(rows.map((row) => row.toReversed())));
				expect(taperMm(rows)).toEqual(taperMm(rows.toReversed()));
			})
		);
	});
	it('stays as round and as straight when every reading is larger by the same', () => {
		fc.assert(
			fc.property(grid, fc.integer({ min: -5000, max: 5000 }), (rows, more) => {
				const moved = rows.map((row) => row.map((one) => one + more / 1000));
				expect(value(outOfRoundMm(moved))).toBeCloseTo(value(outOfRoundMm(rows)), 5);
				expect(value(taperMm(moved))).toBeCloseTo(value(taperMm(rows)), 5);
			})
		);
	});
	it('is the same in inches', () => {
		fc.assert(
			fc.property(grid, (rows) => {
				const inches = rows.map((row) => row.map((one) => one / 25.4));
				expect(value(outOfRoundMm(inches)) * 25.4).toBeCloseTo(value(outOfRoundMm(rows)), 4);
				expect(value(taperMm(inches)) * 25.4).toBeCloseTo(value(taperMm(rows)), 4);
			})
		);
	});
	it('never finds more than the whole spread', () => {
		fc.assert(
			fc.property(grid, (rows) => {
				const spread = value(mostMm(rows)) - value(leastMm(rows));
				expect(value(outOfRoundMm(rows))).toBeLessThanOrEqual(spread + 1e-6);
				expect(value(taperMm(rows))).toBeLessThanOrEqual(spread + 1e-6);
			})
		);
	});
	it('says what is missing instead of giving a number', () => {
		expect(outOfRoundMm([[40, null]])).toEqual({
			ok: false,
			because: '1 of 2 readings are missing'
		});
		expect(outOfRoundMm([[40]]).ok).toBe(false);
		expect(taperMm([[40, 40]]).ok).toBe(false);
		expect(outOfRoundMm([[Number.NaN, 40]]).ok).toBe(false);
		expect(oilClearance([[40]], [[40.01]]).ok).toBe(false);
	});
	it('gives a number or a reason, never NaN, whatever is typed', () => {
		const cell = fc.option(fc.double());
		const anything = fc.array(fc.array(cell, { maxLength: 3 }), { maxLength: 3 });
		fc.assert(
			fc.property(anything, anything, (a, b) => {
				for (const found of [outOfRoundMm(a), taperMm(a), leastMm(a), mostMm(a)])
					expect(found.ok ? Number.isFinite(found.value) : found.because !== '').toBe(true);
				const clearance = oilClearance(a, b);
				if (clearance.ok) expect(Object.values(clearance.value).every(Number.isFinite)).toBe(true);
			}),
			{ numRuns: 500 }
		);
		expect(taperMm([[40, 40], [40]])).toEqual({
			ok: false,
			because: 'each depth is measured in the same planes'
		});
	});
	it('orders least, mean and most', () => {
		fc.assert(
			fc.property(grid, (pins) => {
				const found = oilClearance([[40.2, 40.21]], pins);
				if (!found.ok) throw new Error(found.because);
				expect(found.value.leastMm).toBeLessThanOrEqual(found.value.meanMm + 1e-6);
				expect(found.value.meanMm).toBeLessThanOrEqual(found.value.mostMm + 1e-6);
			})
		);
	});
});
