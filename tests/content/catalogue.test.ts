import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { drawSitting } from '$lib/domain/quizzes/draw-sitting';
import { questionCount } from '$lib/domain/quizzes/schema';

describe('the catalogue', () => {
	const { courses } = catalogue();

	it('holds a course for each demo school', () => {
		expect(courses.map((one) => one.course.key).sort()).toEqual([
			'crankpins-of-a-diesel',
			'reading-failed-engines'
		]);
	});

	it.each(courses.flatMap((one) => one.quizzes.map((quiz) => [quiz.key, one, quiz] as const)))(
		'can draw the quiz %s many times over, with at least ten questions at Averholm',
		(_, { questions, course }, quiz) => {
			const pool = questions.map(({ key, outcome, kind }) => ({ key, outcome, kind }));
			for (let i = 0; i < 50; i++)
				expect(drawSitting(quiz, pool, `seed-${i}`)).toMatchObject({ ok: true });
			if (course.key === 'reading-failed-engines')
				expect(questionCount(quiz)).toBeGreaterThanOrEqual(10);
		}
	);

	it.each(courses.flatMap((one) => one.lessons.map((lesson) => [lesson.key, lesson] as const)))(
		'begins the lesson %s with its caution, and every heading can be led to',
		(_, lesson) => {
			const body = lesson.text.slice(lesson.text.indexOf('</script>'));
			expect(body.indexOf('<Caution>')).toBeGreaterThan(0);
			expect(body.indexOf('<Caution>')).toBeLessThan(body.indexOf('<h2'));
			expect(body.match(/^## /m), 'headings carry an id').toBeNull();
			for (const [, href] of lesson.text.matchAll(/href: '#([^']+)'/g))
				expect(lesson.text).toContain(`id="${href}"`);
		}
	);
});
