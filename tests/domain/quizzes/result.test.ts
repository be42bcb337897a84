import fc from 'fast-check';
import { expect, it } from 'vitest';
import { passRuleWords, resultOf } from '$lib/domain/quizzes/result';
import { scoreSitting, type ScoredItem } from '$lib/domain/quizzes/score-sitting';

const item = (points: number, more: Partial<ScoredItem> = {}): ScoredItem => ({
	key: 'k',
	outcome: 'torque',
	points,
	right: points === 1,
	omitted: false,
	...more
});

it('adds points up by outcome; what was left out earns nothing and is counted', () => {
	expect(
		scoreSitting([
			item(1),
			item(0.5, { outcome: 'cause' }),
			item(0, { omitted: true }),
			item(1 / 3),
			item(1 / 3),
			item(1 / 3)
		])
	).toEqual({
		points: 2.5,
		of: 6,
		share: 0.416667,
		right: 1,
		omitted: 1,
		byOutcome: [
			{ outcome: 'torque', points: 2, of: 5 },
			{ outcome: 'cause', points: 0.5, of: 1 }
		]
	});
});

it('passes at the cut score exactly, for every length and cut', () => {
	fc.assert(
		fc.property(fc.integer({ min: 1, max: 60 }), fc.nat({ max: 60 }), (length, cut) => {
			fc.pre(cut >= 1 && cut <= length);
			const right = (count: number) =>
				scoreSitting(Array.from({ length }, (_, i) => item(i < count ? 1 : 0)));
			expect(resultOf(right(cut), { cutScore: cut / length }).passed).toBe(true);
			expect(resultOf(right(cut - 1), { cutScore: cut / length }).passed).toBe(false);
		})
	);
});

it('says the rule in words, and never rounds a miss up to the cut', () => {
	expect(resultOf({ points: 6.996, of: 10, share: 0.6996 }, { cutScore: 0.7 }).words).toBe(
		'Not passed: 6.99 of 10 points, 69.9 %. The cut score is 70 %.'
	);
	expect(passRuleWords({ cutScore: 0.7 }, 12)).toBe(
		'You pass with 8.4 of 12 points, which is 70 %.'
	);
});
