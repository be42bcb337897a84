import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { torqueAtFastener, wrenchSetting } from '$lib/kernel/fasteners/extension';
import {
	preloadN,
	proofLoadN,
	stressAreaIn2,
	stressAreaMm2
} from '$lib/kernel/fasteners/stress-area';
import { firstWrongStep, loosening, orderFromMiddle } from '$lib/kernel/fasteners/tightening-order';
import { travelMm } from '$lib/kernel/fasteners/turn';
import { convert } from '$lib/kernel/quantity/units';
import { expectWithin, referenceOf } from '../../support/reference';

type Lever = { torque: number; lengthL: number; extensionE: number; angleDeg: number };
const value = (outcome: { ok: true; value: number } | { ok: false; because: string }) => {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
};

describe('a wrench with an extension, published examples', () => {
	it.each(referenceOf<Lever>('torque-extension.json'))('%s', (_, entry) => {
		expectWithin(value(wrenchSetting(entry)), entry);
	});
	it.each(referenceOf<Lever>('torque-extension-inverse.json'))('%s', (_, entry) => {
		expectWithin(value(torqueAtFastener(entry)), entry);
	});
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

describe('stress areas and loads, published tables', () => {
	it.each(referenceOf<{ diameterMm: number; pitchMm: number }>('stress-areas-metric.json'))(
		'%s',
		(_, entry) => {
			expectWithin(value(stressAreaMm2(entry.diameterMm, entry.pitchMm)), entry);
		}
	);
	it.each(referenceOf<{ diameterIn: number; threadsPerInch: number }>('stress-areas-unified.json'))(
		'%s',
		(_, entry) => {
			expectWithin(value(stressAreaIn2(entry.diameterIn, entry.threadsPerInch)), entry);
		}
	);
	it.each(
		referenceOf<{ diameterMm: number; pitchMm: number; propertyClass: '8.8' }>('proof-loads.json')
	)('%s', (_, entry) => {
		expectWithin(
			value(proofLoadN(entry.diameterMm, entry.pitchMm, entry.propertyClass)) / 1000,
			entry
		);
	});
	it.each(
		referenceOf<{ nutFactor: number; diameterIn: number; preloadLbf: number }>('nut-factor.json')
	)('%s: the published torque gives the preload back', (_, entry) => {
		const torqueNm = convert(
			'torque',
			entry.expected,
			entry.unit === 'lbf.in' ? 'lbf·in' : 'lbf·ft',
			'N·m'
		);
		const preload = value(preloadN(torqueNm, entry.nutFactor, entry.diameterIn * 25.4));
		// As good as the printed torque: its tolerance as a share of it.
		const share = (entry.tolerance.value ?? 0) / entry.expected + 0.003;
		expect(Math.abs(convert('force', preload, 'N', 'lbf') / entry.preloadLbf - 1)).toBeLessThan(
			share
		);
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
	it('name the first wrong step', () => {
		expect(firstWrongStep(['a', 'b', 'c'], ['a', 'c', 'b'])).toEqual({
			ok: true,
			value: { step: 2, was: 'c', wanted: 'b' }
		});
		expect(firstWrongStep(['a', 'b'], ['a', 'b'])).toEqual({ ok: true, value: null });
		expect(firstWrongStep(['a', 'b'], ['a']).ok).toBe(false);
		expect(firstWrongStep(['a', 'b'], ['a', 'a']).ok).toBe(false);
	});
	it('a turn travels its share of the pitch', () => {
		expect(travelMm(360, 1.25)).toBe(1.25);
		expect(travelMm(90, 1.25)).toBe(0.3125);
	});
});
