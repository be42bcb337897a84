import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { effectiveLever, torqueAtFastener, wrenchSetting } from '$lib/kernel/fasteners/extension';
import { preloadN, torqueForPreloadNm } from '$lib/kernel/fasteners/preload';
import { proofLoadN, proofStressMPa } from '$lib/kernel/fasteners/proof-load';
import { stressAreaIn2, stressAreaMm2 } from '$lib/kernel/fasteners/stress-area';
import { firstWrongStep } from '$lib/kernel/fasteners/departure';
import { loosening, orderFromMiddle } from '$lib/kernel/fasteners/tightening-order';
import { travelMm } from '$lib/kernel/fasteners/turn';

const value = (outcome: { ok: true; value: number } | { ok: false; because: string }) => {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
};

describe('a wrench with an extension', () => {
	it('setting and arrival are inverse at any angle', () => {
		const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
		fc.assert(
			fc.property(
				number(1, 500),
				number(100, 800),
				number(0, 90),
				number(0, 360),
				(torque, lengthL, extensionE, angleDeg) => {
					const lever = { lengthL, extensionE, angleDeg };
					const arrived = value(
						torqueAtFastener({ ...lever, torque: value(wrenchSetting({ ...lever, torque })) })
					);
					expect(arrived).toBeCloseTo(torque, 6);
				}
			)
		);
	});
	it('a lever that reaches back to the hand cannot be computed', () => {
		expect(wrenchSetting({ torque: 10, lengthL: 100, extensionE: 100, angleDeg: 180 }).ok).toBe(
			false
		);
	});
});

describe('stress areas, loads and preload', () => {
	it('torque and preload are inverse, and more torque is more preload', () => {
		const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
		fc.assert(
			fc.property(number(1, 500), number(0.08, 0.4), number(4, 30), (torque, k, d) => {
				const preload = value(preloadN(torque, k, d));
				expect(value(torqueForPreloadNm(preload, k, d))).toBeCloseTo(torque, 6);
				expect(value(preloadN(torque * 1.01, k, d))).toBeGreaterThan(preload);
				expect(value(preloadN(torque, k * 1.01, d))).toBeLessThan(preload);
			})
		);
	});
	it('a coarser thread on the same bolt bears less, a higher class more', () => {
		const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
		fc.assert(
			fc.property(number(5, 30), number(0.5, 1.5), (d, pitch) => {
				expect(value(stressAreaMm2(d, pitch * 1.1))).toBeLessThan(value(stressAreaMm2(d, pitch)));
				const loads = (['4.6', '5.8', '8.8', '10.9', '12.9'] as const).map((one) =>
					value(proofLoadN(d, pitch, one))
				);
				expect(loads).toEqual(loads.toSorted((a, b) => a - b));
			})
		);
		expect([16, 16.5].map((d) => proofStressMPa('8.8', d))).toEqual([580, 600]);
	});
	it('an answer is a number or a reason, never NaN, whatever is asked', () => {
		const any = fc.double();
		const sound = (found: { ok: true; value: number } | { ok: false; because: string }) =>
			found.ok ? Number.isFinite(found.value) : found.because.length > 0;
		fc.assert(
			fc.property(any, any, any, any, (a, b, c, d) => {
				const lever = { torque: a, lengthL: b, extensionE: c, angleDeg: d };
				for (const found of [
					wrenchSetting(lever),
					torqueAtFastener(lever),
					effectiveLever(lever),
					stressAreaMm2(a, b),
					stressAreaIn2(a, b),
					proofLoadN(a, b, '8.8'),
					preloadN(a, b, c),
					torqueForPreloadNm(a, b, c)
				])
					expect(sound(found)).toBe(true);
			}),
			{ numRuns: 500 }
		);
	});
	it('the metric diameters are those of the profile: d2 = d − 3/4 H, d3 = d − 17/12 H, H = √3/2 P', () => {
		// ISO 68-1 (H, and d2 at 3/8 H a side) and ISO 898-1 (d3 = d1 − H/6, d1 = d − 5/4 H).
		const h = (Math.sqrt(3) / 2) * 1.5;
		const mean = (10 - 0.75 * h + (10 - (17 / 12) * h)) / 2;
		expect(value(stressAreaMm2(10, 1.5))).toBeCloseTo((Math.PI / 4) * mean ** 2, 4);
	});
	it('refuses threads that cannot be cut', () => {
		for (const [d, p] of [
			[0, 1],
			[10, 0],
			[4, 3],
			[Number.NaN, 1]
		] as const)
			expect(stressAreaMm2(d, p).ok).toBe(false);
	});
});

describe('tightening orders', () => {
	// Common practice, no source: from the middle outwards.
	const plate = [-60, -20, 20, 60].flatMap((xMm, i) => [
		{ id: `A${i}`, xMm, yMm: 30 },
		{ id: `B${i}`, xMm, yMm: -30 }
	]);
	it('go from the middle outwards and name each bolt once', () => {
		const order = orderFromMiddle(plate);
		if (!order.ok) throw new Error(order.because);
		expect(new Set(order.value).size).toBe(8);
		expect(order.value.slice(0, 4).toSorted()).toEqual(['A1', 'A2', 'B1', 'B2']);
		expect(loosening(order.value)[0]).toBe(order.value[7]);
	});
	it('have as many bolts as the pattern, whatever the pattern', () => {
		const place = fc.integer({ min: -200, max: 200 });
		const bolts = fc
			.array(fc.tuple(place, place), { minLength: 2, maxLength: 14 })
			.map((places) => places.map(([xMm, yMm], i) => ({ id: `${i}`, xMm, yMm })));
		fc.assert(
			fc.property(bolts, (pattern) => {
				const order = orderFromMiddle(pattern);
				if (!order.ok) throw new Error(order.because);
				expect(order.value.toSorted()).toEqual(pattern.map(({ id }) => id).toSorted());
				expect(firstWrongStep(order.value, order.value)).toEqual({ ok: true, value: null });
				expect(loosening(loosening(order.value))).toEqual(order.value);
			})
		);
	});
	it('are not made of bolts without a place or with one name', () => {
		const here = { id: 'a', xMm: 0, yMm: 0 };
		expect(orderFromMiddle([here, { ...here, id: 'b', xMm: Number.NaN }]).ok).toBe(false);
		expect(orderFromMiddle([here, here])).toEqual({ ok: false, because: 'a is named twice' });
		expect(orderFromMiddle([here]).ok).toBe(false);
	});
	it('find a swap of two bolts at the earlier one', () => {
		const wanted = ['a', 'b', 'c', 'd', 'e', 'f', 'g', 'h'];
		const step = fc.integer({ min: 0, max: wanted.length - 1 });
		fc.assert(
			fc.property(step, step, (i, j) => {
				fc.pre(i !== j);
				const given = wanted.with(i, wanted[j] ?? '').with(j, wanted[i] ?? '');
				const first = Math.min(i, j);
				expect(firstWrongStep(wanted, given)).toEqual({
					ok: true,
					value: { step: first + 1, was: given[first], wanted: wanted[first] }
				});
			})
		);
	});
	it('name the first wrong step', () => {
		expect(firstWrongStep(['a', 'b', 'c'], ['a', 'c', 'b'])).toEqual({
			ok: true,
			value: { step: 2, was: 'c', wanted: 'b' }
		});
		expect(firstWrongStep(['a', 'b'], ['a', 'b'])).toEqual({ ok: true, value: null });
		expect(firstWrongStep(['a', 'b'], ['a'])).toEqual({ ok: false, because: '1 bolt is missing' });
		expect(firstWrongStep(['a', 'b'], ['a', 'x']).ok).toBe(false);
		expect(firstWrongStep(['a', 'b'], ['a', 'a']).ok).toBe(false);
	});
	it('a turn travels its share of the pitch', () => {
		expect(travelMm(360, 1.25)).toBe(1.25);
		expect(travelMm(90, 1.25)).toBe(0.3125);
		expect(() => travelMm(-1, 1.25)).toThrow(RangeError);
		expect(() => travelMm(Infinity, 1.25)).toThrow(RangeError);
	});
});
