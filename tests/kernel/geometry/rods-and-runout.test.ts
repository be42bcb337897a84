import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { outOfLinePer100Mm, outOfLineWeights, rodLengthMm } from '$lib/kernel/geometry/rod';
import { aroundTheTurn, eccentricityMm, runoutMm, type AtAngle } from '$lib/kernel/geometry/runout';
import type { Outcome } from '$lib/kernel/outcome';
import { expectWithin, referenceOf } from '../../support/reference';

function value<T>(outcome: Outcome<T>): T {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
}
const dial = fc.integer({ min: -200, max: 200 }).map((one) => one / 1000);
const length = fc.integer({ min: 20, max: 300 });
const odd = [Number.NaN, Infinity, -Infinity, 1e9];

describe('a rod on its mandrels', () => {
	const over = fc.record({ nearMm: dial, farMm: dial, apartMm: length });
	it('is out of line by what its small end has more than its big end', () => {
		fc.assert(
			fc.property(over, over, (small, big) => {
				const found = value(outOfLinePer100Mm(small, big));
				expect(found).toBeCloseTo(
					value(outOfLinePer100Mm(small)) - value(outOfLinePer100Mm(big)),
					5
				);
				expect(value(outOfLinePer100Mm(big, small))).toBeCloseTo(-found, 5);
			})
		);
	});
	it('is the sum of its readings, each with its weight', () => {
		fc.assert(
			fc.property(over, over, (small, big) => {
				const [far = 0, near = 0, bigFar = 0, bigNear = 0] = outOfLineWeights(small, big);
				const sum = far * small.farMm + near * small.nearMm;
				expect(value(outOfLinePer100Mm(small))).toBeCloseTo(sum, 5);
				expect(value(outOfLinePer100Mm(small, big))).toBeCloseTo(
					sum - bigFar * big.farMm - bigNear * big.nearMm,
					5
				);
			})
		);
	});
	it('changes its sign when it is looked at from the other side, and not with where the dial was set', () => {
		fc.assert(
			fc.property(over, dial, (one, set) => {
				const found = value(outOfLinePer100Mm(one));
				const turned = { ...one, nearMm: one.farMm, farMm: one.nearMm };
				expect(value(outOfLinePer100Mm(turned))).toBeCloseTo(-found, 5);
				const moved = { ...one, nearMm: one.nearMm + set, farMm: one.farMm + set };
				expect(value(outOfLinePer100Mm(moved))).toBeCloseTo(found, 5);
			})
		);
	});
	it('L37 0.001 in per in is 0.1 mm in 100 mm (US Army TM 9-2815-220-24, WP 0143)', () => {
		const inch = 25.4;
		const found = outOfLinePer100Mm({ nearMm: 0, farMm: 0.0052 * inch, apartMm: 5.2 * inch });
		expect(value(found)).toBeCloseTo(0.1, 5);
	});
	it('is as long as the distance over its mandrels less half of both', () => {
		fc.assert(
			fc.property(length, length, length, (between, big, small) => {
				const long = value(rodLengthMm(between + big + small, big, small));
				expect(long).toBeCloseTo(between + (big + small) / 2, 5);
				expect(value(rodLengthMm(between + big + small, small, big))).toBe(long);
			})
		);
	});
	it('refuses nonsense', () => {
		const good = { nearMm: 0, farMm: 0.03, apartMm: 120 };
		for (const one of [...odd, -1, 0]) {
			expect(outOfLinePer100Mm({ ...good, apartMm: one }).ok).toBe(false);
			expect(outOfLinePer100Mm(good, { ...good, apartMm: one }).ok).toBe(false);
		}
		for (const one of odd) expect(outOfLinePer100Mm({ ...good, farMm: one }).ok).toBe(false);
		expect(rodLengthMm(50, 40, 18).ok).toBe(false);
		expect(rodLengthMm(Number.NaN, 40, 18).ok).toBe(false);
		expect(rodLengthMm(Infinity, 40, 18).ok).toBe(false);
	});
});

describe('runout, published', () => {
	type Entry = { asks: string; readings: number[] };
	const entries = referenceOf<Entry>('faces-and-runout.json').filter(([, one]) => one.readings);
	it.each(entries)('%s', (_, entry) => {
		const per = entry.unit === 'in' ? 25.4 : 1;
		const readings = entry.readings.map((one) => one * per);
		const found = entry.asks === 'runout' ? runoutMm(readings) : eccentricityMm(readings[0] ?? NaN);
		expectWithin(value(found) / per, entry);
	});
	it('L12 a reading of 0.10 mm is a bend of 0.05 mm, at the limit (US Army TM 10-3930-653-14&P, fig 4-62)', () => {
		expect(value(eccentricityMm(value(runoutMm([0.05, 0, -0.05, 0]))))).toBeCloseTo(0.05, 9);
	});
});

describe('around the turn', () => {
	/** A section as a dial reads it: off its axis by e towards an angle, with a shape of so many lobes. */
	function turned(e: number, towards: number, lobes: number, depth: number, count = 12): AtAngle[] {
		return Array.from({ length: count }, (_, at) => {
			const angleDeg = (at * 360) / count;
			const radians = (angleDeg * Math.PI) / 180;
			const shape = depth * Math.cos(lobes * radians);
			return { angleDeg, readMm: e * Math.cos(radians - (towards * Math.PI) / 180) + shape };
		});
	}
	const angle = fc.integer({ min: 0, max: 359 });
	const small = fc.integer({ min: 1, max: 80 }).map((one) => one / 1000);

	it('tells how far and where the middle lies from what shape the section has', () => {
		fc.assert(
			fc.property(small, angle, fc.constantFrom(2, 3, 4), small, (e, towards, lobes, depth) => {
				const found = value(aroundTheTurn(turned(e, towards, lobes, depth)));
				expect(found.eccentricityMm).toBeCloseTo(e, 5);
				const off = Math.abs(found.highAtDeg - towards) % 360;
				expect(Math.min(off, 360 - off)).toBeLessThan(0.01);
				// Twelve readings meet the lobes of two, three and four at their tops and bottoms.
				const travel = lobes === 4 ? 1.5 * depth : 2 * depth;
				expect(found.outOfRoundMm).toBeCloseTo(travel, 5);
			})
		);
	});
	it('of a round section has twice the eccentricity as runout, and nothing left over', () => {
		const found = value(aroundTheTurn(turned(0.03, 90, 2, 0)));
		expect(found.runoutMm).toBeCloseTo(0.06, 5);
		expect(found.outOfRoundMm).toBeCloseTo(0, 5);
	});
	it('does not depend on where the turn begins nor on where the dial was set', () => {
		const readings = fc.array(dial, { minLength: 8, maxLength: 8 });
		fc.assert(
			fc.property(readings, angle, dial, (read, by, set) => {
				const at = (shift: number, up: number) =>
					aroundTheTurn(
						read.map((readMm, one) => ({ angleDeg: one * 45 + shift, readMm: readMm + up }))
					);
				const [first, second] = [value(at(0, 0)), value(at(by, set))];
				expect(second.runoutMm).toBeCloseTo(first.runoutMm, 5);
				expect(second.eccentricityMm).toBeCloseTo(first.eccentricityMm, 5);
				expect(second.outOfRoundMm).toBeCloseTo(first.outOfRoundMm, 5);
				fc.pre(first.eccentricityMm > 0.001);
				const moved = (((second.highAtDeg - first.highAtDeg - by) % 360) + 540) % 360;
				expect(Math.abs(moved - 180)).toBeLessThan(0.01);
			})
		);
	});
	it('leaves at least as small a sum of squares as any other middle', () => {
		const readings = fc.array(dial, { minLength: 6, maxLength: 12 });
		fc.assert(
			fc.property(readings, dial, dial, dial, (read, m, a, b) => {
				const given = read.map((readMm, at) => ({ angleDeg: (at * 360) / read.length, readMm }));
				const { restMm } = value(aroundTheTurn(given));
				const squares = (these: number[]) => these.reduce((sum, one) => sum + one * one, 0);
				const other = given.map(({ angleDeg, readMm }) => {
					const radians = (angleDeg * Math.PI) / 180;
					return readMm - m - a * Math.cos(radians) - b * Math.sin(radians);
				});
				expect(squares(restMm)).toBeLessThanOrEqual(squares(other) + 1e-5);
			})
		);
	});
	it('refuses readings that leave much of the turn open, and nonsense', () => {
		const at = (...angles: number[]) => angles.map((angleDeg) => ({ angleDeg, readMm: 0.01 }));
		expect(aroundTheTurn(at(0, 30, 60, 90))).toEqual({
			ok: false,
			because: 'the readings leave a large part of the turn open: read all the way around'
		});
		expect(aroundTheTurn(at(0, 0, 180, 180)).ok).toBe(false);
		expect(aroundTheTurn(at(0, 120, 240)).ok).toBe(false);
		expect(aroundTheTurn(at(0, 90, 180, Number.NaN)).ok).toBe(false);
		expect(aroundTheTurn(at(0, 90, 180, 270)).ok).toBe(true);
		expect(runoutMm([0, 1, Number.NaN, 2]).ok).toBe(false);
		expect(eccentricityMm(-0.01).ok).toBe(false);
		expect(eccentricityMm(Infinity).ok).toBe(false);
		fc.assert(
			fc.property(
				fc.array(fc.record({ angleDeg: fc.double(), readMm: fc.double() }), { maxLength: 9 }),
				(these) => {
					const found = aroundTheTurn(these);
					if (found.ok) expect(Object.values(found.value).flat().every(Number.isFinite)).toBe(true);
				}
			)
		);
	});
});
