import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { patternFaults } from '$lib/kernel/fasteners/bolt-pattern';
import { forgottenExtension, withDrag } from '$lib/kernel/fasteners/drag';
import { effectiveLever, torqueAtFastener, wrenchSetting } from '$lib/kernel/fasteners/extension';
import { stagePasses } from '$lib/kernel/fasteners/stage-passes';
import { stageSequence, thirdsNm, turnedDeg } from '$lib/kernel/fasteners/stage-sequence';
import { departureFromSound } from '$lib/kernel/fasteners/departure';
import { orderFromMiddle, orderFromOutside } from '$lib/kernel/fasteners/tightening-order';
import {
	accuracyFrom,
	bestRange,
	shareOfScale,
	usualAccuracy
} from '$lib/kernel/fasteners/wrench-range';
import type { Outcome } from '$lib/kernel/outcome';
import { expectWithin, given, referenceOf, type Worked } from '../../support/reference';

function value<T>(found: Outcome<T>): T {
	if (!found.ok) throw new Error(found.because);
	return found.value;
}

/** The kernel's answer for an entry on wrenches; it keeps the unit that it is given. */
function leverAnswer(entry: Worked): number {
	const of = (name: string) => given(entry, name);
	const angleDeg = entry.inputs.a ?? 0;
	const { id } = entry;
	if (id === 'X22') return value(withDrag(of('wanted'), of('drag')));
	const straight = { lengthL: of('L'), extensionE: of('E') };
	if (id === 'X06') return value(effectiveLever({ ...straight, angleDeg }));
	if (id === 'X20') return value(torqueAtFastener({ ...straight, torque: of('Tw'), angleDeg }));
	if (id === 'X21') return 100 * value(forgottenExtension(of('L'), of('E'), 0));
	// An adapter that shortens the lever points back along the handle.
	const back = id === 'X04' ? 180 : angleDeg;
	return value(wrenchSetting({ ...straight, torque: of('Ta'), angleDeg: back }));
}

describe('wrenches with extensions and drag, published values', () => {
	it.each(referenceOf<Worked>('torque-wrench-levers.json'))('%s', (_, entry) => {
		expectWithin(leverAnswer(entry), entry);
	});
});

const ranges = referenceOf<Worked>('torque-wrench-ranges.json');
describe('the part of a torque wrench that is used, published values', () => {
	it.each(ranges.filter(([, { id }]) => id.startsWith('X25')))('%s', (_, { expected }) => {
		const { from, within } = expected as unknown as { from: number; within: number };
		expect([100 * accuracyFrom, 100 * usualAccuracy]).toEqual([from, within]);
		expect(value(shareOfScale((200 * from) / 100, 200))).toBeCloseTo(accuracyFrom, 12);
	});
	it.each(ranges.filter(([, { id }]) => id.startsWith('X26')))('%s', (_, { expected }) => {
		const { min, max } = expected as unknown as { min: number; max: number };
		expect([100 * bestRange.least, 100 * bestRange.most]).toEqual([min, max]);
	});
	it('is no more than all of it, whatever the unit', () => {
		const torque = fc.double({ min: 0.1, max: 1000, noNaN: true });
		fc.assert(
			fc.property(torque, torque, (setting, full) => {
				const found = shareOfScale(setting, full);
				if (setting > full) expect(found).toMatchObject({ ok: false });
				else {
					expect(value(found)).toBeLessThanOrEqual(1);
					// 1 lbf·ft = 1.3558179483314 N·m exactly, NIST SP 811.
					const inPounds = value(shareOfScale(setting / 1.3558179483314, full / 1.3558179483314));
					expect(inPounds).toBeCloseTo(value(found), 10);
				}
			})
		);
		for (const odd of [0, -1, NaN, Infinity])
			expect(shareOfScale(odd, 100)).toMatchObject({ ok: false });
	});
});

const orders = referenceOf<Worked>('tightening-orders.json');
const only = (shape: RegExp) => orders.filter(([, { id }]) => shape.test(id));

/** Bolts evenly around a flange, named by their place on the turn. */
const flange = (count: number) =>
	Array.from({ length: count }, (_, at) => ({
		id: String(at + 1),
		xMm: 100 * Math.cos((at * 2 * Math.PI) / count),
		yMm: 100 * Math.sin((at * 2 * Math.PI) / count)
	}));
/** Two rows of a head, numbered left to right, 80 mm apart along and 90 mm across. */
const head = (count: number) =>
	['T', 'B'].flatMap((row) =>
		Array.from({ length: count / 2 }, (_, at) => ({
			id: `${row}${at + 1}`,
			xMm: 80 * at,
			yMm: row === 'T' ? 90 : 0
		}))
	);

describe('tightening orders, published', () => {
	it.each(only(/^OR-F/))('%s: is the order of the kernel, and sound', (_, { inputs, expected }) => {
		const bolts = flange(inputs.n ?? 0);
		const printed = (expected as unknown as number[]).map(String);
		expect(patternFaults({ bolts, printedOrder: printed })).toEqual([]);
		expect(value(orderFromMiddle(bolts))).toEqual(printed);
		expect(value(departureFromSound(bolts, printed))).toBeNull();
	});
	it.each(only(/^OR-H/))('%s: is whole and sound', (_, { inputs, expected }) => {
		const bolts = head(inputs.n ?? 0);
		const printed = expected as unknown as string[];
		expect(patternFaults({ bolts, printedOrder: printed })).toEqual([]);
		expect(value(departureFromSound(bolts, printed))).toBeNull();
		expect(value(departureFromSound(bolts, printed.toReversed(), 'loosen'))).toBeNull();
		expect(value(departureFromSound(bolts, value(orderFromOutside(bolts)), 'loosen'))).toBeNull();
		const own = value(orderFromMiddle(bolts));
		expect(value(departureFromSound(bolts, own))).toBeNull();
	});
	it.each(only(/^OR2/))('%s', (_, { inputs, expected, tolerance }) => {
		const stages = value(thirdsNm(inputs.T ?? 0));
		for (const [at, wanted] of (expected as unknown as number[]).entries())
			expect(Math.abs((stages[at] ?? 0) - wanted)).toBeLessThanOrEqual(tolerance.value ?? 0);
	});
	it.each(only(/^OR02/))('%s', (_, { inputs, expected }) => {
		const screws = Array.from({ length: inputs.screws ?? 0 }, (__, at) => `screw ${at + 1}`);
		const steps = value(stageSequence(screws, inputs.stages ?? 0));
		expect(steps.map(({ stage, bolt }) => `${bolt} stage ${stage}`)).toEqual(expected);
	});
	it.each(only(/^OR3[35]/))('%s: one round a stage, all slackened where it says so', (_, entry) => {
		const printed = entry.expected as unknown as (number | string)[];
		const slack = printed.findIndex((one) => one === 0 || String(one).startsWith('loosen'));
		const passes = value(stagePasses(['a', 'b', 'c'], printed.length - 1, slack));
		expect(passes).toHaveLength(printed.length);
		expect(passes.findIndex(({ stage }) => stage === undefined)).toBe(slack);
		expect(passes[slack]?.bolts).toEqual(['c', 'b', 'a']);
	});
	it.each(only(/^OR34/))('%s', (_, entry) => {
		const stages = [
			{ torqueNm: 45 },
			{ angleDeg: given(entry, 'a') },
			{ angleDeg: given(entry, 'b') }
		];
		expect(turnedDeg(stages)).toBe(entry.expected);
	});
});
