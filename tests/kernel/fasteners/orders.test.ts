import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isRing, patternFaults, placedBolts, type Bolt } from '$lib/kernel/fasteners/bolt-pattern';
import { stagePasses } from '$lib/kernel/fasteners/stage-passes';
import { stageSequence, thirdsNm } from '$lib/kernel/fasteners/stage-sequence';
import { departureFromSound, firstWrongStep, soundSteps } from '$lib/kernel/fasteners/departure';
import { soundNext, soundNextLoose } from '$lib/kernel/fasteners/sound-next';
import {
	loosening,
	orderFromMiddle,
	orderFromOutside
} from '$lib/kernel/fasteners/tightening-order';
import type { Outcome } from '$lib/kernel/outcome';

function value<T>(found: Outcome<T>): T {
	if (!found.ok) throw new Error(found.because);
	return found.value;
}
/** A pattern on a grid of 20 mm, so that no two bolts stand in one place. */
const patterns = fc
	.uniqueArray(fc.tuple(fc.integer({ min: -8, max: 8 }), fc.integer({ min: -4, max: 4 })), {
		minLength: 2,
		maxLength: 24,
		selector: ([x, y]) => `${x} ${y}`
	})
	.map((places) =>
		places.map(([x, y], at): Bolt => ({ id: `b${at + 1}`, xMm: x * 20, yMm: y * 20 }))
	);

describe('a sound order', () => {
	it('takes each bolt once, is sound by its own rule, and is the same whatever order the bolts were typed in', () => {
		fc.assert(
			fc.property(patterns, (bolts) => {
				const order = value(orderFromMiddle(bolts));
				expect(order.toSorted()).toEqual(bolts.map(({ id }) => id).toSorted());
				expect(value(departureFromSound(bolts, order))).toBeNull();
				expect(value(orderFromMiddle(bolts.toReversed()))).toEqual(order);
			})
		);
	});
	it('does not care where the pattern lies, and a mirror image of it is sound too', () => {
		fc.assert(
			fc.property(patterns, fc.integer({ min: -500, max: 500 }), (bolts, by) => {
				const order = value(orderFromMiddle(bolts));
				const moved = bolts.map((one) => ({ ...one, xMm: one.xMm + by, yMm: one.yMm - by }));
				const mirrored = bolts.map((one) => ({ ...one, xMm: -one.xMm }));
				expect(value(departureFromSound(moved, order))).toBeNull();
				expect(value(departureFromSound(mirrored, order))).toBeNull();
			})
		);
	});
	it('goes from the middle outwards where it is no flange', () => {
		fc.assert(
			fc.property(patterns, (bolts) => {
				const placed = value(placedBolts(bolts));
				fc.pre(!isRing(placed));
				const reach = new Map(placed.map((one) => [one.id, one.reachMm]));
				const largest = Math.max(...reach.values());
				const steps = value(orderFromMiddle(bolts)).map((id) => reach.get(id) ?? NaN);
				for (const [at, one] of steps.entries())
					for (const later of steps.slice(at))
						expect(later).toBeGreaterThanOrEqual(one - 0.02 * largest - 1e-6);
			})
		);
	});
	it('loosened backwards is sound as well, and the order of loosening is sound for every pattern', () => {
		fc.assert(
			fc.property(patterns, (bolts) => {
				const loose = value(orderFromOutside(bolts));
				expect(loose.toSorted()).toEqual(bolts.map(({ id }) => id).toSorted());
				expect(value(departureFromSound(bolts, loose, 'loosen'))).toBeNull();
				fc.pre(!isRing(value(placedBolts(bolts))));
				expect(loose).toEqual(loosening(value(orderFromMiddle(bolts))));
			})
		);
	});
	it('is sound still when the pattern is turned, and one made for the turned pattern fits it as it lay', () => {
		fc.assert(
			fc.property(patterns, fc.double({ min: 0, max: 6.28, noNaN: true }), (bolts, turn) => {
				const [cos, sin] = [Math.cos(turn), Math.sin(turn)];
				const turned = bolts.map(({ id, xMm, yMm }) => ({
					id,
					xMm: xMm * cos - yMm * sin,
					yMm: xMm * sin + yMm * cos
				}));
				expect(value(departureFromSound(turned, value(orderFromMiddle(bolts))))).toBeNull();
				expect(value(departureFromSound(bolts, value(orderFromMiddle(turned))))).toBeNull();
			})
		);
	});
	it('is left by any other order at the step that it names, and not before', () => {
		const shuffled = patterns.chain((bolts) =>
			fc.tuple(
				fc.constant(bolts),
				fc.shuffledSubarray(
					bolts.map(({ id }) => id),
					{ minLength: bolts.length }
				),
				fc.constantFrom('tighten' as const, 'loosen' as const)
			)
		);
		fc.assert(
			fc.property(shuffled, ([bolts, given, direction]) => {
				const next = direction === 'loosen' ? soundNextLoose : soundNext;
				const left = value(departureFromSound(bolts, given, direction));
				const held = left ? left.step - 1 : given.length;
				for (let at = 0; at < held; at++)
					expect(value(next(bolts, given.slice(0, at)))).toContain(given[at]);
				if (left) {
					expect(left.was).toBe(given[held]);
					expect(left.sound).not.toContain(left.was);
					expect(left.sound).toEqual(value(next(bolts, given.slice(0, held))));
				}
				expect(value(soundSteps(bolts, given, direction))).toBe(held);
				const cut = Math.floor(given.length / 2);
				expect(value(soundSteps(bolts, given.slice(0, cut), direction))).toBe(Math.min(held, cut));
			})
		);
	});
	it('is left at the first bolt that lies too far out', () => {
		const bolts = [-129, -43, 43, 129].flatMap((x, at) => [
			{ id: `A${at + 1}`, xMm: x, yMm: 45 },
			{ id: `B${at + 1}`, xMm: x, yMm: -45 }
		]);
		const given = ['A2', 'B3', 'A1', 'B2', 'A3', 'A4', 'B1', 'B4'];
		expect(value(departureFromSound(bolts, given))).toEqual({
			step: 3,
			was: 'A1',
			sound: ['A3', 'B2']
		});
		expect(value(soundNext(bolts, ['A2', 'B3', 'B2', 'A3']))).toEqual(['A1', 'A4', 'B1', 'B4']);
	});
	it('of twenty-four bolts is there before a page is drawn', () => {
		const bolts = Array.from({ length: 24 }, (_, at) => ({
			id: `b${at}`,
			xMm: (at % 12) * 40,
			yMm: Math.floor(at / 12) * 90
		}));
		const took = Array.from({ length: 20 }, () => {
			const begun = performance.now();
			expect(value(orderFromMiddle(bolts))).toHaveLength(24);
			return performance.now() - begun;
		});
		// The fastest of twenty, so that a busy machine proves nothing; a page is drawn in 16 ms.
		expect(Math.min(...took)).toBeLessThan(5);
	});
});

describe('a flange', () => {
	it('is crossed: the second of each pair lies across from the first, turned and mirrored alike', () => {
		fc.assert(
			fc.property(
				fc.integer({ min: 2, max: 12 }).map((one) => one * 2),
				fc.double({ min: 0, max: 6.28, noNaN: true }),
				(count, turn) => {
					const bolts = Array.from({ length: count }, (_, at) => ({
						id: String(at + 1),
						xMm: 80 * Math.cos(turn + (at * 2 * Math.PI) / count),
						yMm: 80 * Math.sin(turn + (at * 2 * Math.PI) / count)
					}));
					const order = value(orderFromMiddle(bolts)).map(Number);
					for (let at = 0; at < count; at += 2)
						expect(Math.abs((order[at] ?? 0) - (order[at + 1] ?? 0))).toBe(count / 2);
				}
			)
		);
	});
	it('of any number has a sound order of loosening, an odd one too', () => {
		fc.assert(
			fc.property(fc.integer({ min: 3, max: 30 }), (count) => {
				const bolts = Array.from({ length: count }, (_, at) => ({
					id: String(at + 1),
					xMm: 100 * Math.cos((at * 2 * Math.PI) / count),
					yMm: 100 * Math.sin((at * 2 * Math.PI) / count)
				}));
				const loose = value(orderFromOutside(bolts));
				expect(new Set(loose).size).toBe(count);
				expect(value(departureFromSound(bolts, loose, 'loosen'))).toBeNull();
			})
		);
	});
	it('gone around one by one leaves the sound orders at the second step', () => {
		const bolts = Array.from({ length: 8 }, (_, at) => ({
			id: String(at + 1),
			xMm: 80 * Math.cos((at * Math.PI) / 4),
			yMm: 80 * Math.sin((at * Math.PI) / 4)
		}));
		expect(value(departureFromSound(bolts, ['1', '2', '3', '4', '5', '6', '7', '8']))).toEqual({
			step: 2,
			was: '2',
			sound: ['5']
		});
	});
});

describe('a printed order', () => {
	it('stands alone: an order that differs from it anywhere departs where it differs first', () => {
		const names = fc.uniqueArray(fc.string({ minLength: 1, maxLength: 3 }), {
			minLength: 2,
			maxLength: 24
		});
		const pairs = names.chain((ids) =>
			fc.tuple(fc.constant(ids), fc.shuffledSubarray(ids, { minLength: ids.length }))
		);
		fc.assert(
			fc.property(pairs, ([printed, given]) => {
				const found = value(firstWrongStep(printed, given));
				if (printed.join('\n') === given.join('\n')) expect(found).toBeNull();
				else {
					const step = found?.step ?? 0;
					expect(given.slice(0, step - 1)).toEqual(printed.slice(0, step - 1));
					expect(found).toEqual({ step, was: given[step - 1], wanted: printed[step - 1] });
					expect(found?.was).not.toBe(found?.wanted);
				}
			})
		);
	});
	const printed = ['A2', 'B3', 'B2', 'A3', 'A1', 'B4', 'B1', 'A4'];
	it('is beaten by none of its mirror images', () => {
		const swap = (from: string, to: string) =>
			printed.map((id) => (id[0] === from ? to : id[0] === to ? from : id[0]) + (id[1] ?? ''));
		const across = printed.map((id) => (id[0] ?? '') + String(5 - Number(id[1])));
		for (const mirrored of [
			swap('A', 'B'),
			across,
			swap('A', 'B').map((id) => (id[0] ?? '') + String(5 - Number(id[1])))
		])
			expect(value(firstWrongStep(printed, mirrored))).toMatchObject({ step: 1 });
		expect(value(firstWrongStep(printed, printed))).toBeNull();
	});
});

describe('a pattern', () => {
	const square = [
		{ id: 'a', xMm: 0, yMm: 0 },
		{ id: 'b', xMm: 50, yMm: 0 },
		{ id: 'c', xMm: 50, yMm: 50 },
		{ id: 'd', xMm: 0, yMm: 50 }
	];
	it.each([
		[{ bolts: square }, []],
		[{ bolts: square.slice(0, 1) }, ['a pattern has at least two bolts']],
		[{ bolts: [...square, { id: 'e', xMm: 50.3, yMm: 0.2 }] }, ['b and e stand in one place']],
		[{ bolts: [...square, { id: 'a', xMm: 90, yMm: 0 }] }, ['a is named twice']],
		[{ bolts: [...square, { id: 'e', xMm: NaN, yMm: 0 }] }, ['e has no place']],
		[{ bolts: square, printedOrder: ['a', 'c', 'b'] }, ['the printed order leaves out d']],
		[
			{ bolts: square, printedOrder: ['a', 'c', 'b', 'd', 'a'] },
			['the printed order names a twice']
		],
		[
			{ bolts: square, printedOrder: ['a', 'c', 'b', 'd', 'x'] },
			['the printed order names x, which is not there']
		]
	])('%j has the faults %j', (pattern, faults) => {
		expect(patternFaults(pattern)).toEqual(faults);
	});
	it('with a fault has no order, and an unknown bolt has no next', () => {
		expect(orderFromMiddle([...square, { id: 'e', xMm: 0, yMm: 0.4 }])).toMatchObject({
			ok: false
		});
		expect(soundNext(square, ['x'])).toMatchObject({ ok: false });
		expect(departureFromSound(square, ['a', 'b'])).toMatchObject({
			ok: false,
			because: '2 bolts are missing'
		});
	});
});

describe('stages', () => {
	it('take every bolt through one before any begins the next', () => {
		// US Army TM 10-3930-669-20, para E-4, example (reference OR02).
		expect(
			value(stageSequence(['screw 1', 'screw 2'], 2)).map(
				({ stage, bolt }) => `${bolt} stage ${stage}`
			)
		).toEqual(['screw 1 stage 1', 'screw 2 stage 1', 'screw 1 stage 2', 'screw 2 stage 2']);
		expect(stageSequence([], 2)).toMatchObject({ ok: false });
		expect(stageSequence(['a'], 1.5)).toMatchObject({ ok: false });
	});
	it('can be slackened between, last tightened first, and go on', () => {
		fc.assert(
			fc.property(
				fc.integer({ min: 2, max: 12 }),
				fc.integer({ min: 1, max: 12 }),
				(count, after) => {
					const order = ['a', 'b', 'c'];
					const found = stagePasses(order, count, after);
					if (after >= count) expect(found).toMatchObject({ ok: false });
					else {
						const passes = value(found);
						expect(passes).toHaveLength(count + 1);
						expect(passes[after]).toEqual({ bolts: order.toReversed() });
						expect(passes.flatMap(({ stage }) => stage ?? [])).toEqual(
							Array.from({ length: count }, (_, at) => at + 1)
						);
					}
				}
			)
		);
		expect(stagePasses(['a'], 3, 0.5)).toMatchObject({ ok: false });
		expect(stagePasses([], 1)).toMatchObject({ ok: false });
	});
	it('in thirds rise to the whole', () => {
		fc.assert(
			fc.property(fc.integer({ min: 3, max: 900 }), (torque) => {
				const [a = 0, b = 0, c = 0] = value(thirdsNm(torque));
				expect(a < b && b < c && c === torque).toBe(true);
			})
		);
		expect(thirdsNm(2)).toMatchObject({ ok: false });
	});
});
