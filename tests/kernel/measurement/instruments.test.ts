import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { boreByDial, whereNeedleTurns } from '$lib/kernel/measurement/instruments/bore-gauge';
import {
	gaugeThreads,
	threadsFor,
	threadTaper
} from '$lib/kernel/measurement/instruments/gauge-thread';
import {
	freedOfZeroError,
	inchMicrometerIn,
	metricMicrometerMm
} from '$lib/kernel/measurement/instruments/micrometer';
import {
	inchVernierIn,
	metricVernierMm,
	vernierValue
} from '$lib/kernel/measurement/instruments/vernier';
import { cannot, type Outcome } from '$lib/kernel/outcome';
import { expectWithin, referenceOf } from '../../support/reference';

type Shown = Record<string, number>;
const value = (outcome: Outcome<number>) => {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
};
/** The letters of the published sheet, by what is read. */
const read: Record<string, (shown: Shown) => Outcome<number>> = {
	'inch micrometer reading': inch,
	'2 to 3 in micrometer: add the frame size': inch,
	'metric micrometer reading': metric,
	'frame-size trap: 50 to 75 mm micrometer': metric,
	'zero error correction': ({ r = NaN, z = NaN }) => freedOfZeroError(r, z),
	'inch vernier caliper reading': ({ i = NaN, t_ = NaN, f = NaN, v = NaN }) =>
		inchVernierIn({ inches: i, tenths: t_, lines: f, vernierLine: v }),
	'micrometer vernier value': ({ th = NaN, n = NaN }) => vernierValue(th, n),
	'metric vernier caliper, 0.02 mm': caliper,
	'metric vernier caliper, 0.05 mm': caliper,
	'dial bore gauge, zeroed at 2 in, turns back at +7 divisions': dial,
	'dial bore gauge, other side of zero': dial,
	'dial bore gauge, metric': dial,
	'taper seen by gauging thread': ({ w1 = NaN, w2 = NaN }) => threadTaper(w1, w2)
};
function inch({ base, b = NaN, l = NaN, th = NaN, v }: Shown) {
	return inchMicrometerIn({
		frameIn: base,
		barrelFigure: b,
		lines: l,
		thimbleLine: th,
		vernierLine: v
	});
}
function metric({ base, w = NaN, h = NaN, th = NaN, v }: Shown) {
	return metricMicrometerMm({
		frameMm: base,
		wholeMm: w,
		halfLines: h,
		thimbleLine: th,
		vernierLine: v
	});
}
function caliper({ m = NaN, v = NaN, c = NaN }: Shown) {
	return metricVernierMm(m, v, c);
}
function dial({ z = NaN, r = NaN }: Shown) {
	return boreByDial(z, r);
}

describe('readings of instruments, published', () => {
	it.each(referenceOf<{ inputs: Shown }>('instrument-readings.json'))('%s', (_, entry) => {
		const found = (read[entry.quantity] ?? (() => cannot('nothing reads this')))(entry.inputs);
		expectWithin(value(found), entry);
	});
	type Threads = { id: string; source: string; expected: Record<string, [number, number]> };
	const path = join(import.meta.dirname, '../../reference/workshop/gauge-threads.json');
	const threads = JSON.parse(readFileSync(path, 'utf8')) as Threads[];
	it.each(threads.map((one) => [`${one.id} (${one.source})`, one] as const))(
		'%s: ranges of gauging thread',
		(_, { expected }) => {
			for (const [key, [least, most]] of Object.entries(expected)) {
				const [name, unit] = key.split('_') as [string, 'mm' | 'in'];
				const factor = unit === 'in' ? 25.4 : 1;
				const found = gaugeThreads.find((one) => one.name === name || one.name === `type ${name}`);
				expect(found?.leastMm).toBeCloseTo(least * factor, 9);
				expect(found?.mostMm).toBeCloseTo(most * factor, 9);
			}
		}
	);
});

describe('readings of instruments', () => {
	it('count up line by line without a gap', () => {
		const metricSteps = fc.record({
			wholeMm: fc.nat(24),
			halfLines: fc.nat(1),
			thimbleLine: fc.nat(48)
		});
		fc.assert(
			fc.property(metricSteps, (shown) => {
				const next = { ...shown, thimbleLine: shown.thimbleLine + 1 };
				expect(value(metricMicrometerMm(next)) - value(metricMicrometerMm(shown))).toBeCloseTo(
					0.01,
					9
				);
			})
		);
		// The last line of the thimble goes over into the half, and the half into the next whole.
		const turn = [
			{ wholeMm: 8, halfLines: 0, thimbleLine: 49 },
			{ wholeMm: 8, halfLines: 1, thimbleLine: 0 },
			{ wholeMm: 8, halfLines: 1, thimbleLine: 49 },
			{ wholeMm: 9, halfLines: 0, thimbleLine: 0 }
		].map((shown) => value(metricMicrometerMm(shown)));
		expect(turn).toEqual([8.49, 8.5, 8.99, 9]);
	});
	it('refuse lines that a scale does not have', () => {
		const bad = [-1, 0.5, 101, Number.NaN, Infinity];
		for (const one of bad) {
			expect(metricMicrometerMm({ wholeMm: one, halfLines: 0, thimbleLine: 0 }).ok).toBe(false);
			expect(metricMicrometerMm({ wholeMm: 0, halfLines: one, thimbleLine: 0 }).ok).toBe(false);
			expect(metricMicrometerMm({ wholeMm: 0, halfLines: 0, thimbleLine: one }).ok).toBe(false);
			expect(inchMicrometerIn({ barrelFigure: one, lines: 0, thimbleLine: 0 }).ok).toBe(false);
			expect(inchMicrometerIn({ barrelFigure: 0, lines: one, thimbleLine: 0 }).ok).toBe(false);
			expect(inchVernierIn({ inches: 0, tenths: one, lines: 0, vernierLine: 0 }).ok).toBe(false);
			expect(metricVernierMm(0, one, 0.02).ok).toBe(false);
			expect(vernierValue(1, one === 101 ? 1 : one).ok).toBe(false);
		}
		for (const count of [0, -0.1, 0.3, Number.NaN, Infinity])
			expect(metricVernierMm(1, 1, count).ok).toBe(false);
		expect(metricMicrometerMm({ frameMm: -25, wholeMm: 1, halfLines: 0, thimbleLine: 0 }).ok).toBe(
			false
		);
		expect(freedOfZeroError(Number.NaN, 0).ok).toBe(false);
	});
	it('a bore is where the rocked needle turns, and the sign is looked at', () => {
		expect(value(whereNeedleTurns([0.041, 0.036, 0.035, 0.038]))).toBe(0.035);
		expect(whereNeedleTurns([]).ok).toBe(false);
		expect(whereNeedleTurns([Number.NaN]).ok).toBe(false);
		expect(boreByDial(2, -3).ok).toBe(false);
		expect(boreByDial(0, 1).ok).toBe(false);
		expect(boreByDial(2, Number.NaN).ok).toBe(false);
	});
	it('thread is found for limits that it spans, and for no others', () => {
		expect(threadsFor(0.03, 0.07)).toEqual({ ok: true, value: ['green', 'type A'] });
		expect(threadsFor(0, 5)).toEqual({ ok: true, value: [] });
		expect(threadsFor(0.07, 0.03).ok).toBe(false);
		expect(threadTaper(-1, 0).ok).toBe(false);
	});
});
