import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { expansionPerK, perFahrenheit, type MaterialKey } from '$lib/kernel/geometry/expansion';
import { at20Mm, growthApartMm, readingOfMm, type Growth } from '$lib/kernel/geometry/temperature';
import { gapClosedMm, riseToGrowK, warmClearanceMm } from '$lib/kernel/geometry/thermal-growth';
import { wearMm } from '$lib/kernel/geometry/wear';
import { expectWithin, referenceOf } from '../../support/reference';

const value = (outcome: { ok: true; value: number } | { ok: false; because: string }) => {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
};
const size = fc.integer({ min: 39_900, max: 40_100 }).map((one) => one / 1000);

describe('wear', () => {
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
	it.each(referenceOf<Entry>('thermal-growth.json'))('%s', (_, { coldMm, ...entry }) => {
		expectWithin(value(warmClearanceMm(coldMm, entry.sizeMm, entry.outer, entry.inner)), entry);
	});
	type Part = { asks: string; sizeMm: number; outer: Growth; inner: Growth };
	type Rise = { growthMm: number; expansionPerK: number };
	it.each(referenceOf<Part & Rise>('thermal-growth-parts.json'))('%s', (_, entry) => {
		const { asks, sizeMm, outer, inner } = entry;
		const found =
			asks === 'growth apart'
				? growthApartMm(sizeMm, outer, inner)
				: asks === 'gap closed'
					? gapClosedMm(sizeMm, outer, inner)
					: riseToGrowK(entry.growthMm, sizeMm, entry.expansionPerK);
		expectWithin(value(found), entry);
	});
	type Coefficient = { material: MaterialKey; perC?: number };
	it.each(referenceOf<Coefficient>('expansion.json'))('%s', (_, entry) => {
		const perK = entry.perC === undefined ? expansionPerK(entry.material) : entry.perC * 1e-6;
		const found = entry.unit === '1e-6/degF' ? value(perFahrenheit(perK)) : perK;
		expectWithin(found * 1e6, entry);
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
	const warmth = fc.integer({ min: -10, max: 90 });
	const expansion = fc.integer({ min: 0, max: 30 }).map((one) => one * 1e-6);
	it('brought to 20 °C and back again is the reading', () => {
		fc.assert(
			fc.property(size, expansion, warmth, expansion, warmth, (read, ap, tp, as, ts) => {
				const [part, instrument] = [body(ap, tp), body(as, ts)];
				const back = value(readingOfMm(value(at20Mm(read, part, instrument)), part, instrument));
				// First order one way, a quotient the other: what is left is the square of the growth.
				expect(Math.abs(back - read)).toBeLessThan(read * 3e-5);
				const there = value(at20Mm(value(readingOfMm(read, part, instrument)), part, instrument));
				expect(there).toBeCloseTo(read, 9);
			})
		);
	});
	it('hardly matters for steel under a steel micrometer, and does for an aluminium piston', () => {
		const micrometer = expansionPerK('gauge-steel');
		const off = (material: MaterialKey, mm: number) =>
			value(at20Mm(mm, body(expansionPerK(material), 30), body(micrometer, 30))) - mm;
		// A pin of 40 mm and a piston of 74 mm, all of it at 30 °C.
		expect(Math.abs(off('steel', 40))).toBeLessThan(0.0005);
		expect(Math.abs(off('cast-iron', 74))).toBeLessThan(0.001);
		expect(off('aluminium', 74)).toBeCloseTo(-0.0085, 4);
		expect(off('piston-alloy', 74)).toBeCloseTo(-0.0063, 4);
		// Steel matters too as soon as it is warmer than what measures it.
		const warmPin = value(at20Mm(40, body(expansionPerK('steel'), 40), body(micrometer, 20)));
		expect(warmPin - 40).toBeCloseTo(-0.0096, 4);
	});
	it('closes a ring gap by π times what it takes from the diameter', () => {
		fc.assert(
			fc.property(size, expansion, warmth, expansion, warmth, (bore, a, ta, b, tb) => {
				const [ring, around] = [
					{ expansionPerK: a, riseK: ta },
					{ expansionPerK: b, riseK: tb }
				];
				expect(value(gapClosedMm(bore, ring, around))).toBeCloseTo(
					Math.PI * value(growthApartMm(bore, ring, around)),
					9
				);
				expect(value(warmClearanceMm(0.05, bore, around, ring))).toBeCloseTo(
					0.05 - value(growthApartMm(bore, ring, around)),
					9
				);
			})
		);
	});
	it('that is reckoned for a growth brings that growth', () => {
		fc.assert(
			fc.property(size, fc.integer({ min: 1, max: 30 }), (mm, step) => {
				const riseK = value(riseToGrowK(0.05, mm, step * 1e-6));
				fc.pre(riseK <= 1000);
				const still = { expansionPerK: 0, riseK: 0 };
				const grown = value(growthApartMm(mm, { expansionPerK: step * 1e-6, riseK }, still));
				expect(grown).toBeCloseTo(0.05, 9);
			})
		);
	});
	it('that is no number gives a reason', () => {
		expect(at20Mm(40, body(1e-5, Number.NaN), body(1e-5, 20)).ok).toBe(false);
		expect(at20Mm(-1, body(1e-5, 20), body(1e-5, 20)).ok).toBe(false);
		const still = { expansionPerK: 1e-5, riseK: 0 };
		for (const odd of [Number.NaN, Infinity, -Infinity, 1e9]) {
			expect(at20Mm(40, body(odd, 30), body(1e-5, 20)).ok).toBe(false);
			expect(at20Mm(40, body(1e-5, 30), body(1e-5, odd)).ok).toBe(false);
			expect(readingOfMm(40, body(odd, 30), body(1e-5, 20)).ok).toBe(false);
			expect(growthApartMm(40, { ...still, riseK: odd }, still).ok).toBe(false);
			expect(gapClosedMm(40, still, { ...still, expansionPerK: odd }).ok).toBe(false);
			expect(riseToGrowK(0.05, 40, odd).ok).toBe(false);
			expect(perFahrenheit(odd).ok).toBe(false);
		}
		expect(warmClearanceMm(Number.NaN, 40, still, still).ok).toBe(false);
		expect(riseToGrowK(-0.05, 40, 1e-5).ok).toBe(false);
		expect(riseToGrowK(0.05, 40, 0).ok).toBe(false);
		expect(readingOfMm(-40, body(1e-5, 30), body(1e-5, 20)).ok).toBe(false);
	});
});
