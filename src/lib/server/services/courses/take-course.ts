import { z } from 'zod';
import { system } from '$lib/domain/actor';
import { Problem } from '$lib/domain/problem';
import { newestRevisions } from '../../data/queries/publications';
import { allSchools } from '../../data/queries/schools';
import { commonScope, schoolScope } from '../../data/scope';
import type { House } from '../house';
import { readCase, writeCase } from '../use-case';
import { prepareCourse, publishAll } from './publish-course';

/**
 * A school takes a course of the repository onto its prospectus: everything in it is published
 * as the school's own revisions. Taken again, only what changed makes new ones.
 */
export const takeCourse = writeCase({
	name: 'take-course',
	action: 'course:take',
	input: z.object({ courseKey: z.string().min(1, 'Choose a course.'), schoolId: z.string() }),
	async prepare({ house, input }) {
		const found = house.catalogue.courseByKey(input.courseKey);
		if (!found) throw new Problem('absent', 'There is no such course to take.');
		return prepareCourse(schoolScope(house.database, input.schoolId, null), found);
	},
	subject: ({ scope, input }) =>
		Promise.resolve(input.schoolId === scope.schoolId ? { schoolId: scope.schoolId } : undefined),
	async run({ scope, input, prepared, at, newId, record }) {
		const made = await publishAll(scope, prepared, newId, at.toISOString());
		if (made.length > 0)
			await record({
				kind: 'revisions-published',
				subject: input.courseKey,
				data: { revisions: made.map((one) => one.revisionId) }
			});
		return { published: made.length };
	}
});

/** What a school has on its prospectus, and what it may take. */
export const readCourseChoices = readCase({
	name: 'read-course-choices',
	action: 'people:read',
	input: z.object({}).default({}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope, house }) {
		const taken = new Map(
			(await newestRevisions(scope, 'course')).map((one) => [one.key, one] as const)
		);
		return {
			schoolId: scope.schoolId,
			courses: house.catalogue.courses.map(({ course, sheet, lessons, quizzes, jobSheets }) => ({
				key: course.key,
				title: course.title,
				summary: course.summary,
				engine: sheet.code,
				lessons: lessons.length,
				quizzes: quizzes.length,
				jobSheets: jobSheets.length,
				priceMinor: course.priceMinor,
				takenRevision: taken.get(course.key)?.number ?? null
			}))
		};
	}
});

/** At start: a changed repository makes new revisions in every school that has taken a course. */
export async function bringContentUpToDate(house: House): Promise<void> {
	for (const school of await allSchools(commonScope(house.database, null))) {
		const scope = schoolScope(house.database, school.id, null);
		const taken = await newestRevisions(scope, 'course');
		for (const { key } of taken)
			if (house.catalogue.courseByKey(key))
				await takeCourse(
					{ house, actor: system, schoolId: school.id },
					{ courseKey: key, schoolId: school.id }
				);
	}
}
