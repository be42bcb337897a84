import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { at20Mm, growthApartMm, type Growth } from '$lib/kernel/geometry/temperature';
import { wearMm } from '$lib/kernel/geometry/wear';
import { expectWithin, referenceOf } from '../../support/reference';

const value = (outcome: { ok: true; value: number } | { ok: false; because: string }) => {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
};
const size = fc.integer({ min: 39_900, max: 40_100 }).map((one) => one / 1000);

describe('wear', () => {
	it.each(
		referenceOf<{ part: 'bore' | 'journal'; worstIn: number; printedIn: number }>('wear.json')
	)('%s', (_, entry) => {
		expectWithin(
			value(wearMm(entry.part, entry.worstIn * 25.4, entry.printedIn * 25.4)) / 25.4,
			entry
		);
	});
	it('of a bore is that of a journal looked at from the other side', () => {
		fc.assert(
			fc.property(size, size, (a, b) => {
				expect(wearMm('bore', a, b)).toEqual(wearMm('journal', b, a));
			})
		);
	});
	it('is nothing while the size lies within what is printed', () => {
		expect(wearMm('journal', 40, 39.98)).toEqual({ ok: true, value: 0 });
		expect(wearMm('journal', Number.NaN, 39.98).ok).toBe(false);
		expect(wearMm('bore', Infinity, 39.98).ok).toBe(false);
	});
});

describe('temperature', () => {
	type Entry = { coldMm: number; sizeMm: number; outer: Growth; inner: Growth };
	it.each(referenceOf<Entry>('thermal-growth.json'))('%s', (_, entry) => {
		expectWithin(
			entry.coldMm + value(growthApartMm(entry.sizeMm, entry.outer, entry.inner)),
			entry
		);
	});
	const body = (expansionPerK: number, temperatureC: number) => ({ expansionPerK, temperatureC });
	it('at 20 °C changes no reading', () => {
		fc.assert(
			fc.property(size, (read) => {
				expect(at20Mm(read, body(23e-6, 20), body(11.5e-6, 20))).toEqual({ ok: true, value: read });
			})
		);
	});
	it('of a warm part makes it read large, of a warm instrument makes it read small', () => {
		fc.assert(
			fc.property(size, fc.integer({ min: 21, max: 60 }), (read, warm) => {
				expect(value(at20Mm(read, body(1e-5, warm), body(1e-5, 20)))).toBeLessThan(read);
				expect(value(at20Mm(read, body(1e-5, 20), body(1e-5, warm)))).toBeGreaterThan(read);
				// A steel part measured by a steel instrument of the same warmth needs no correction.
				expect(value(at20Mm(read, body(1e-5, warm), body(1e-5, warm)))).toBeCloseTo(read, 12);
			})
		);
	});
	it('that is no number gives a reason', () => {
		expect(at20Mm(40, body(1e-5, Number.NaN), body(1e-5, 20)).ok).toBe(false);
		expect(at20Mm(-1, body(1e-5, 20), body(1e-5, 20)).ok).toBe(false);
	});
});
