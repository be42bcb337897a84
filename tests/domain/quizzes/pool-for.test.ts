import { expect, it } from 'vitest';
import { poolFor } from '$lib/domain/quizzes/pool-for';

it('leaves out what another course teaches and what stands on another engine', () => {
	const outcome = (key: string) => ({ key, words: key, shownBy: ['quiz'] });
	const course = { engine: 'av3-1150', outcomes: [outcome('torque'), outcome('clearance')] };
	const questions = [
		{ key: 'own', outcome: 'torque', sheet: 'av3-1150' },
		{ key: 'no-sheet', outcome: 'clearance' },
		{ key: 'other-engine', outcome: 'torque', sheet: 'av4-2200d' },
		{ key: 'other-course', outcome: 'diesel' }
	];
	expect(poolFor(course, questions).map((one) => one.key)).toEqual(['own', 'no-sheet']);
});
