import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compressionBalance, type BalanceRule } from '$lib/kernel/cylinder/compression-test';
import { compressionVerdicts } from '$lib/kernel/cylinder/compression-verdict';
import { bankedThrowDeg, evenThrowsDeg } from '$lib/kernel/cylinder/crank-throws';
import { firingsOf, intervalsOf, type Cycle } from '$lib/kernel/cylinder/firing';
import { airWay, leakVerdict, whereAirComesOut, type AirWay } from '$lib/kernel/cylinder/leak-ways';
import { skimmedChamberCm3 } from '$lib/kernel/cylinder/skimming';
import type { Outcome } from '$lib/kernel/outcome';

function value<T>(found: Outcome<T>): T {
	if (!found.ok) throw new Error(found.because);
	return found.value;
}
const because = (found: Outcome<unknown>) => (found.ok ? '' : found.because);
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const rules: BalanceRule[] = [
	'75-of-highest',
	'70-of-highest',
	'80-of-mean',
	'10-psi-apart',
	'100-psi-apart'
];

describe('the verdict of a compression test', () => {
	const set = (...dryBar: number[]) => dryBar.map((one) => ({ dryBar: one }));
	it('C02 150, 145, 148, 108 psi: the fourth is low, and is read again, then with oil', () => {
		const [, , third, fourth] = value(
			compressionVerdicts(set(10.34, 10, 10.2, 7.45), '75-of-highest')
		).cylinders;
		expect(third).toMatchObject({ ruling: 'within' });
		expect(third?.next).toBeUndefined();
		expect(fourth).toMatchObject({ ruling: 'low' });
		expect(fourth?.next).toContain('oil');
	});
	it('C08 a rise points to rings, none to valves, none with a low neighbour to the gasket', () => {
		const nextOf = (...wetBar: (number | undefined)[]) =>
			value(
				compressionVerdicts(
					[
						{ dryBar: 10 },
						...wetBar.map((wet) => ({ dryBar: 7, ...(wet ? { wetBar: wet } : {}) }))
					],
					'75-of-highest'
				)
			).cylinders[1]?.next;
		expect(nextOf(9)).toContain('Rings');
		expect(nextOf(7)).toContain('valve lash');
		expect(nextOf(7.7)).toContain('neither');
		expect(nextOf(7, 7)).toContain('gasket');
		expect(nextOf(undefined, undefined)).toContain('cylinder 3');
	});
	it('a diesel is not given oil, and a cylinder that shows nothing neither', () => {
		expect(
			value(compressionVerdicts(set(28, 20), '100-psi-apart')).cylinders[1]?.next
		).not.toContain('oil');
		expect(
			value(compressionVerdicts(set(10, 0), '75-of-highest')).cylinders[1]?.next
		).not.toContain('oil');
	});
	it('the engine’s own least rules as well, and the 70 per cent rule has a floor of 100 psi', () => {
		const own = value(compressionBalance([9.4, 9], '75-of-highest', 9.5));
		expect(own.low).toEqual([1, 2]);
		expect(own.ruleBar).toBeCloseTo(7.05, 9);
		expect(own.allowedBar).toBe(9.5);
		// 70 per cent of 8 bar is 5.6, and 100 psi is 6.895 bar.
		expect(value(compressionBalance([8, 6.5], '70-of-highest')).low).toEqual([2]);
	});
	it('calls low what lies under the line, in the order of the cylinders, by every rule', () => {
		fc.assert(
			fc.property(
				fc.array(number(1, 30), { minLength: 2, maxLength: 12 }),
				fc.constantFrom(...rules),
				(dry, rule) => {
					const { balance, cylinders } = value(compressionVerdicts(set(...dry), rule));
					expect(cylinders.map((one) => one.cylinder)).toEqual(dry.map((_, at) => at + 1));
					for (const [at, one] of cylinders.entries()) {
						expect(one.ruling === 'low').toBe((dry[at] ?? 0) < balance.allowedBar - 1e-9);
						expect(one.next !== undefined).toBe(one.ruling === 'low');
						expect(one.share).toBeLessThanOrEqual(1);
					}
				}
			)
		);
	});
	it.each([
		[[10], 'at least two'],
		[[10, -1], '0 to 200'],
		[[10, NaN], '0 to 200'],
		[[0, 0], 'gauge first']
	])('%j is refused with the reason', (dry, reason) => {
		expect(because(compressionVerdicts(set(...dry), '75-of-highest'))).toContain(reason);
	});
	it('a wet reading at fault names its cylinder', () => {
		expect(
			because(compressionVerdicts([{ dryBar: 10 }, { dryBar: 0, wetBar: 3 }], '75-of-highest'))
		).toMatch(/cylinder 2: .*a way open/);
	});
});

describe('the verdict of a leak-down test', () => {
	it('C10 and C11: more than a quarter lost is looked into, warm and a second time', () => {
		const found = value(leakVerdict(80, 59));
		expect(found).toMatchObject({ suspect: true, band: 'needs work' });
		expect(found.next).toMatch(/warm.*listen/);
		expect(value(leakVerdict(80, 60))).toMatchObject({ suspect: false });
		expect(value(leakVerdict(80, 76)).next).toBeUndefined();
	});
	it('C14 the place where it is heard names the part, C15 and one maker’s limit for it', () => {
		const heard = (held: number, way: AirWay) => value(leakVerdict(5.5, held, way));
		expect(heard(3.9, 'exhaust').next).toContain('exhaust valve');
		expect(heard(4.8, 'inlet').printed).toEqual({ limit: 10, passed: true });
		expect(heard(4.8, 'breather').printed).toEqual({ limit: 20, passed: false });
		expect(heard(4.3, 'breather').printed).toEqual({ limit: 20, passed: true });
	});
	it('knows the words that people write for the places, and refuses others', () => {
		for (const way of Object.keys(whereAirComesOut))
			expect(airWay(way)).toEqual({ ok: true, value: way });
		expect(value(airWay(' Oil filler'))).toBe('breather');
		expect(value(airWay('next plug hole'))).toBe('neighbour');
		expect(because(airWay('somewhere'))).toContain('exhaust, inlet, breather, coolant, neighbour');
	});
	it.each([
		[0, 0],
		[5, 6],
		[5, -1],
		[NaN, 1]
	])('gauges at %s and %s are refused', (input, held) => {
		expect(leakVerdict(input, held)).toMatchObject({ ok: false });
	});
});

describe('crank throws', () => {
	const order = fc.integer({ min: 1, max: 12 }).chain((count) =>
		fc.shuffledSubarray(
			[...Array(count).keys()].map((one) => one + 1),
			{ minLength: count }
		)
	);
	it('of an even order fire it evenly, over one whole cycle', () => {
		fc.assert(
			fc.property(
				order,
				fc.constantFrom<Cycle>('four-stroke', 'two-stroke'),
				(cylinders, cycle) => {
					const firings = value(
						firingsOf(value(evenThrowsDeg(cylinders, cycle)), cylinders, cycle)
					);
					const full = cycle === 'four-stroke' ? 720 : 360;
					expect(intervalsOf(firings).even).toBe(true);
					expect(firings.reduce((sum, one) => sum + one.toNextDeg, 0)).toBeCloseTo(full, 6);
				}
			)
		);
	});
	it('sum to a whole cycle wherever they stand, or the order is refused', () => {
		fc.assert(
			fc.property(
				order.chain((cylinders) =>
					fc.tuple(
						fc.constant(cylinders),
						fc.array(fc.integer({ min: 0, max: 359 }), {
							minLength: cylinders.length,
							maxLength: cylinders.length
						})
					)
				),
				([cylinders, throws]) => {
					const found = firingsOf(throws, cylinders, 'four-stroke');
					if (!found.ok) expect(found.because).toContain('within one');
					else expect(found.value.reduce((sum, one) => sum + one.toNextDeg, 0)).toBeCloseTo(720, 6);
				}
			)
		);
	});
	it('F13 a cross-plane eight: pins at 0, 90, 270, 180 in banks that lean 90° apart', () => {
		const pins = [0, 270, 90, 180];
		const throws = pins.flatMap((pin) => [
			value(bankedThrowDeg(pin, 0)),
			value(bankedThrowDeg(pin, -90))
		]);
		const firings = value(firingsOf(throws, [1, 8, 4, 3, 6, 5, 7, 2], 'four-stroke'));
		expect(intervalsOf(firings)).toMatchObject({ leastDeg: 90, mostDeg: 90 });
	});
	it('in a bank come round with whole turns dropped, and nonsense is refused', () => {
		fc.assert(
			fc.property(number(-720, 720), number(-720, 720), (pin, bank) => {
				const found = value(bankedThrowDeg(pin, bank));
				expect(found).toBeGreaterThanOrEqual(0);
				expect(found).toBeLessThanOrEqual(360);
				const turns = (pin + bank - found) / 360;
				expect(Math.abs(turns - Math.round(turns))).toBeLessThan(1e-9);
			})
		);
		expect(bankedThrowDeg(NaN, 0)).toMatchObject({ ok: false });
		expect(bankedThrowDeg(0, Infinity)).toMatchObject({ ok: false });
		expect(because(evenThrowsDeg([1, 1], 'four-stroke'))).toContain('twice');
		expect(() => intervalsOf([])).toThrow(RangeError);
	});
});

describe('a skimmed head', () => {
	it('loses what was taken off it, and no more than there is', () => {
		fc.assert(
			fc.property(number(20, 100), number(10, 80), number(0, 2), (chamber, opening, cut) => {
				const left = value(skimmedChamberCm3(chamber, opening, cut));
				expect(chamber - left).toBeCloseTo((opening * cut) / 10, 9);
			})
		);
		expect(because(skimmedChamberCm3(5, 50, 2))).toContain('nothing of the chamber');
		for (const odd of [NaN, -1])
			expect(skimmedChamberCm3(30, 40, odd)).toMatchObject({ ok: false });
		expect(skimmedChamberCm3(0, 40, 1)).toMatchObject({ ok: false });
	});
});
