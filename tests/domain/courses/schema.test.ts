import { describe, expect, it } from 'vitest';
import { courseSchema } from '$lib/domain/courses/schema';
import { nextStep } from '$lib/domain/courses/next-step';
import { filmWatched } from '$lib/domain/courses/lesson-rule';

const course = {
	key: 'a-course',
	title: 'A course',
	summary: 'What it is about.',
	engine: 'av1',
	outcomes: [{ key: 'measure', words: 'Measure a pin', shownBy: ['sheet'] }],
	steps: [
		{ key: 'read', kind: 'lesson', ref: 'reading', title: 'Reading' },
		{ key: 'sheet', kind: 'job-sheet', ref: 'a-sheet', title: 'A sheet' }
	],
	award: { rule: 'evidence-complete@1', benchHours: 2, notAssessed: ['Running the engine'] },
	priceMinor: 100,
	hours: 4
};

describe('a course', () => {
	it('is taken as it stands', () => {
		expect(courseSchema.parse(course).steps).toHaveLength(2);
	});

	it('is refused when a step stands twice or an outcome is shown by no step', () => {
		const twice = { ...course, steps: [course.steps[0], course.steps[0], course.steps[1]] };
		expect(courseSchema.safeParse(twice).error?.issues[0]?.message).toBe(
			'the step read stands twice'
		);
		const nowhere = { ...course, outcomes: [{ ...course.outcomes[0], shownBy: ['bench'] }] };
		expect(courseSchema.safeParse(nowhere).error?.issues[0]?.message).toBe(
			'outcome measure: no step bench'
		);
	});
});

describe('what comes next', () => {
	const step = (key: string, state: 'not-begun' | 'under-way' | 'waiting' | 'sent-back') => ({
		key,
		state
	});

	it('is what was sent back, before what is begun, before what is not', () => {
		const all = [step('a', 'not-begun'), step('b', 'under-way'), step('c', 'sent-back')];
		expect(nextStep(all)?.key).toBe('c');
		expect(nextStep(all.slice(0, 2))?.key).toBe('b');
		expect(nextStep(all.slice(0, 1))?.key).toBe('a');
	});

	it('is nothing while all waits for a marker', () => {
		expect(nextStep([step('a', 'waiting')])).toBeUndefined();
	});
});

describe('a film counts as watched', () => {
	it('when nine tenths of it were played, in whatever pieces', () => {
		expect(
			filmWatched(
				[
					[0, 50],
					[40, 91]
				],
				100
			)
		).toEqual({ ok: true });
	});

	it('not when one stretch was played twice, and says what is left', () => {
		expect(
			filmWatched(
				[
					[0, 60],
					[0, 60]
				],
				100
			)
		).toEqual({ ok: false, because: 'Watch the film first. Not yet seen: 1:00–1:40.' });
	});
});
