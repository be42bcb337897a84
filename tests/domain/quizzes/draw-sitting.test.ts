import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { drawSitting, type Drawable } from '$lib/domain/quizzes/draw-sitting';
import { quizSchema } from '$lib/domain/quizzes/schema';

const pool: Drawable[] = ['torque', 'clearance', 'cause'].flatMap((outcome) =>
	(['single-choice', 'number-with-unit', 'ruling'] as const).flatMap((kind) =>
		[1, 2].map((n) => ({ key: `${outcome}-${kind}-${n}`, outcome, kind }))
	)
);
const quiz = quizSchema.parse({
	key: 'q',
	title: 'Quiz',
	intro: 'What it is about.',
	plan: [
		{ question: 'cause-ruling-1' },
		{ draw: 3, outcome: 'torque' },
		{ draw: 3, kind: 'ruling' }
	],
	cutScore: 0.7,
	timeLimitMinutes: 20,
	attempts: 2
});
const seed = fc.string({ minLength: 1, maxLength: 20 });

function drawn(from: string, hadBefore: string[] = [], of = quiz) {
	const made = drawSitting(of, pool, from, hadBefore);
	if (!made.ok) throw new Error(made.because);
	return made.value;
}

describe('a sitting', () => {
	it('holds what the plan says, each question once, for every seed', () => {
		fc.assert(
			fc.property(seed, (from) => {
				const items = drawn(from);
				const keys = items.map((one) => one.key);
				expect(new Set(keys).size).toBe(7);
				expect(keys).toContain('cause-ruling-1');
				expect(items.map((one) => one.place)).toEqual([1, 2, 3, 4, 5, 6, 7]);
				expect(keys.filter((key) => key.startsWith('torque')).length).toBeGreaterThanOrEqual(3);
				expect(keys.filter((key) => key.includes('ruling')).length).toBeGreaterThanOrEqual(4);
			})
		);
	});

	it('spreads over kinds where the plan leaves them open', () => {
		fc.assert(
			fc.property(seed, (from) => {
				const keys = drawn(from, [], { ...quiz, plan: [{ draw: 3, outcome: 'torque' }] });
				expect(new Set(keys.map((one) => one.key.replace(/-\d$/, ''))).size).toBe(3);
			})
		);
	});

	it('is the same again from its seed, and every question has a seed of its own', () => {
		expect(drawn('s')).toEqual(drawn('s'));
		expect(new Set(drawn('s').map((one) => one.seed)).size).toBe(7);
		expect(drawn('s')).not.toEqual(drawn('t'));
	});

	it('takes questions not had before, first', () => {
		fc.assert(
			fc.property(seed, (from) => {
				const one = { ...quiz, plan: [{ draw: 3, outcome: 'torque' }] };
				const first = drawn(from, [], one).map((item) => item.key);
				const second = drawn(`${from}+`, first, one).map((item) => item.key);
				expect(second.filter((key) => first.includes(key))).toEqual([]);
			})
		);
	});

	it('says which line cannot be drawn', () => {
		const asked = { ...quiz, plan: [{ draw: 7, outcome: 'torque' }] };
		expect(drawSitting(asked, pool, 's')).toEqual({
			ok: false,
			because: 'the plan draws 7 on torque, and 6 are published'
		});
		expect(drawSitting({ ...quiz, plan: [{ question: 'gone' }] }, pool, 's')).toMatchObject({
			because: 'the question gone is not published'
		});
	});
});

it('a line to draw names an outcome, a kind or both', () => {
	expect(quizSchema.safeParse({ ...quiz, plan: [{ draw: 2 }] }).success).toBe(false);
});

it('draws no question that is for practice only, and takes it where the plan names it', () => {
	const pool = [
		{ key: 'a', outcome: 'o', kind: 'single-choice' },
		{ key: 'b', outcome: 'o', kind: 'single-choice', practiceOnly: true }
	] as const;
	const plan = (lines: Parameters<typeof drawSitting>[0]['plan']) =>
		drawSitting({ plan: lines, order: 'as-planned' }, pool, 'seed');
	expect(plan([{ draw: 2, outcome: 'o' }]).ok).toBe(false);
	const named = plan([{ question: 'b' }, { draw: 1, outcome: 'o' }]);
	expect(named.ok && named.value.map((one) => one.key)).toEqual(['b', 'a']);
});
