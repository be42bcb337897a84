import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isRing, patternFaults, placedBolts } from '$lib/kernel/fasteners/bolt-pattern';
import { gridPattern, ringPattern } from '$lib/kernel/fasteners/pattern-shapes';
import { stageFaults } from '$lib/kernel/fasteners/stage-faults';
import { stagePasses } from '$lib/kernel/fasteners/stage-passes';
import type { Outcome } from '$lib/kernel/outcome';

function value<T>(found: Outcome<T>): T {
	if (!found.ok) throw new Error(found.because);
	return found.value;
}

describe('a pattern told in few words', () => {
	it('of rows has every bolt once, around its own middle, evenly spaced', () => {
		const count = fc.integer({ min: 1, max: 7 });
		const apart = fc.integer({ min: 10, max: 400 });
		fc.assert(
			fc.property(count, count, apart, apart, (rows, columns, along, across) => {
				fc.pre(rows * columns > 1);
				const bolts = value(gridPattern(rows, columns, along, across));
				expect(bolts).toHaveLength(rows * columns);
				expect(patternFaults({ bolts })).toEqual([]);
				const sum = (of: (one: (typeof bolts)[number]) => number) =>
					bolts.reduce((all, one) => all + of(one), 0);
				expect(sum((one) => one.xMm)).toBeCloseTo(0, 6);
				expect(sum((one) => one.yMm)).toBeCloseTo(0, 6);
				const [a1] = bolts;
				if (columns > 1) expect((bolts[1]?.xMm ?? 0) - (a1?.xMm ?? 0)).toBeCloseTo(along, 9);
				if (rows > 1) expect((a1?.yMm ?? 0) - (bolts[columns]?.yMm ?? 0)).toBeCloseTo(across, 9);
			})
		);
	});
	it('of a flange lies on its circle, and is known for a flange again', () => {
		fc.assert(
			fc.property(
				fc.integer({ min: 3, max: 60 }),
				fc.integer({ min: 100, max: 900 }),
				(count, diameter) => {
					const bolts = value(ringPattern(count, diameter));
					for (const { xMm, yMm } of bolts)
						expect(Math.hypot(xMm, yMm)).toBeCloseTo(diameter / 2, 3);
					expect(patternFaults({ bolts })).toEqual([]);
					expect(isRing(value(placedBolts(bolts)))).toBe(true);
				}
			)
		);
	});
	it('is refused with a reason, whatever nonsense is told', () => {
		const any = fc.double();
		fc.assert(
			fc.property(any, any, any, any, (a, b, c, d) => {
				for (const found of [gridPattern(a, b, c, d), ringPattern(a, b)])
					if (!found.ok) expect(found.because.length).toBeGreaterThan(8);
					else
						for (const { xMm, yMm } of found.value)
							expect(Number.isFinite(xMm) && Number.isFinite(yMm)).toBe(true);
			}),
			{ numRuns: 500 }
		);
		expect(gridPattern(1, 1, 10, 10)).toMatchObject({ ok: false });
		expect(gridPattern(2, 2, 10, 0)).toMatchObject({ ok: false });
		expect(gridPattern(1, 3, 10, 0)).toMatchObject({ ok: true });
		expect(ringPattern(2, 100)).toMatchObject({ ok: false });
	});
});

describe('the stages of a plan', () => {
	it.each([
		// Plans as references OR33 to OR36 print them.
		[[{ torqueNm: 53 }, { torqueNm: 84 }, { torqueNm: 53 }, { torqueNm: 105 }], 2, []],
		[[{ torqueNm: 45 }, { angleDeg: 90 }, { angleDeg: 90 }], undefined, []],
		[
			[{ torqueNm: 40 }, { angleDeg: 90 }, { torqueNm: 40 }, { angleDeg: 90 }, { angleDeg: 90 }],
			2,
			[]
		],
		[[{ torqueNm: 61 }, { torqueNm: 88 }, { torqueNm: 88 }, { angleDeg: 90 }], undefined, []],
		[
			[{ torqueNm: 53 }, { torqueNm: 84 }, { torqueNm: 53 }],
			undefined,
			['stage 3 is less than the one before, and nothing is slackened between']
		],
		[
			[{ torqueNm: 40 }, { angleDeg: 90 }, { torqueNm: 60 }],
			undefined,
			['stage 3 is a torque after an angle: the angle is turned last']
		],
		[[{ angleDeg: 90 }], undefined, ['stage 1 is an angle, and an angle is counted from a torque']],
		[
			[{ torqueNm: 40 }, { angleDeg: 90 }],
			1,
			['stage 2 is an angle, and an angle is counted from a torque']
		],
		[[{ torqueNm: NaN }], undefined, ['stage 1 is no torque']]
	])('%j, slackened after %s: %j', (stages, slackenAfter, faults) => {
		expect(stageFaults(stages, slackenAfter)).toEqual(faults);
	});
	it('that only rise are sound, however many, and give one round each', () => {
		fc.assert(
			fc.property(
				fc.array(fc.integer({ min: 1, max: 60 }), { minLength: 1, maxLength: 10 }),
				fc.array(fc.integer({ min: 1, max: 180 }), { maxLength: 2 }),
				(steps, angles) => {
					let torque = 0;
					const stages = [
						...steps.map((by) => ({ torqueNm: (torque += by) })),
						...angles.map((angleDeg) => ({ angleDeg }))
					];
					expect(stageFaults(stages)).toEqual([]);
					expect(value(stagePasses(['a'], stages.length))).toHaveLength(stages.length);
				}
			)
		);
	});
});
