import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { stages } from '$lib/domain/crib/calculators/stages';
import type { Worked } from '$lib/domain/crib/worked';
import { figureOf, refusalOf, typed, workedOf } from './typed';

function roundsOf(worked: Worked) {
	if (worked.drawing?.kind !== 'stage-rounds') throw new Error('no rounds are drawn');
	return worked.drawing.rounds;
}
const planOf = (worked: Worked) =>
	worked.lines.flatMap((one) => (one.key === 'plan' && 'text' in one ? [one.text] : [])).join('');

describe('stages to tick off', () => {
	it('take every bolt through one stage before the next', () => {
		// US Army TM 10-3930-669-20, para E-4 example, two screws and two stages (reference OR02).
		const rounds = roundsOf(workedOf(stages, { order: 's1 s2', plan: '20 N·m, 90°' }));
		expect(
			rounds.flatMap(({ bolts }, at) => bolts.map((bolt) => `${bolt} stage ${at + 1}`))
		).toEqual(['s1 stage 1', 's2 stage 1', 's1 stage 2', 's2 stage 2']);
	});
	it('count their boxes, the last torque and the angle after it', () => {
		// Reference OR34: 20, 35, 45 N·m, then 90° and 90°: 180° after 45 N·m.
		const worked = workedOf(stages, { plan: '20 N·m, 35 N·m, 45 N·m, 90°, 90°' });
		expect(figureOf(worked, 'boxes')).toBe(40);
		expect(figureOf(worked, 'torque')).toBe(45);
		expect(figureOf(worked, 'angle')).toBe(180);
		expect(worked.notes?.join(' ')).toContain('no second check with the torque wrench');
	});
	it('slacken between where the plan says so, last tightened first, and count from there', () => {
		// References OR32 and OR33: 53, 84, back to nothing in reverse order, 53, 105 N·m.
		const worked = workedOf(stages, {
			order: 'a b c',
			plan: '53 N·m, 84 N·m, 53 N·m, 105 N·m',
			slackenAfter: '2'
		});
		expect(roundsOf(worked).map(({ does }) => does)).toEqual([
			{ torqueNm: 53 },
			{ torqueNm: 84 },
			'slacken',
			{ torqueNm: 53 },
			{ torqueNm: 105 }
		]);
		expect(roundsOf(worked)[2]?.bolts).toEqual(['c', 'b', 'a']);
		expect(figureOf(worked, 'boxes')).toBe(15);
		// Reference OR35: 40 N·m and 90°, loosened, then 40 N·m, 90° and 90°.
		const turned = workedOf(stages, {
			order: 'a b',
			plan: '40 N·m, 90°, 40 N·m, 90°, 90°',
			slackenAfter: '2'
		});
		expect(figureOf(turned, 'angle')).toBe(180);
	});
	it.each([
		['OR20', '90', '30 N·m, 60 N·m, 90 N·m'],
		['OR21', '75', '25 N·m, 50 N·m, 75 N·m'],
		['OR22', '24', '8 N·m, 16 N·m, 24 N·m']
	])('%s: %s N·m in thirds is %s (common practice)', (_, plan, wanted) => {
		expect(planOf(workedOf(stages, { plan, taken: 'in-thirds' }))).toBe(wanted);
	});
	it('are refused where no hand could follow them', () => {
		expect(refusalOf(stages, { plan: '90°' })).toContain('counted from a torque');
		expect(refusalOf(stages, { plan: '40 N·m, 20 N·m' })).toContain('less than the one before');
		expect(refusalOf(stages, { plan: '40 N·m, 90°, 60 N·m' })).toContain('torque after an angle');
		expect(refusalOf(stages, { plan: '40 N·m, soon' })).toContain('stage 2');
		expect(refusalOf(stages, { order: 'A1 A2 A1' })).toContain('A1 is named twice');
		expect(refusalOf(stages, { slackenAfter: '3' })).toContain('a later stage is missing');
		expect(refusalOf(stages, { taken: 'in-thirds' })).toContain('thirds are taken of one torque');
		expect(typed(stages, { slackenAfter: '1.5' }).faults).toHaveProperty('slackenAfter');
	});
	it('take the same torque twice where a plan says so', () => {
		// Reference OR36: 61, 88, 88 again, then 90°.
		expect(planOf(workedOf(stages, { plan: '61 Nm; 88 Nm; 88 Nm; 90°' }))).toBe(
			'61 N·m, 88 N·m, 88 N·m, 90°'
		);
	});
	it('come from every pattern of a data sheet, in its printed order or a sound one', () => {
		const sheet = catalogue().engines.find((one) => one.key === 'av3-1150');
		if (!sheet) throw new Error('the data sheet is gone');
		const taken = stages.presets?.(sheet) ?? [];
		expect(taken.map(({ key }) => key)).toEqual(sheet.patterns.map(({ key }) => key));
		for (const { key, values } of taken) {
			const pattern = sheet.patterns.find((one) => one.key === key);
			const rounds = roundsOf(workedOf(stages, values));
			const fastener = sheet.fasteners.find((one) => one.key === pattern?.fastener);
			expect(rounds.map(({ does }) => does)).toEqual(fastener?.stages);
			if (pattern?.printedOrder) expect(rounds[0]?.bolts).toEqual(pattern.printedOrder);
			expect(rounds[0]?.bolts.toSorted()).toEqual(pattern?.bolts.map(({ id }) => id).toSorted());
		}
	});
});
