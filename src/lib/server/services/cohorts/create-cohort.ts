import { z } from 'zod';
import { inputProblem } from '$lib/domain/problem';
import type { Course } from '$lib/domain/courses/schema';
import { cohortByTitle } from '../../data/queries/cohorts';
import { newestRevision } from '../../data/queries/publications';
import { rolesOf, schoolById } from '../../data/queries/schools';
import { cohorts } from '../../data/models';
import { insert } from '../../data/rows';
import { writeCase } from '../use-case';

const day = z.iso.date('Give a day as year-month-day.');

export const createCohort = writeCase({
	name: 'create-cohort',
	action: 'cohort:create',
	input: z
		.object({
			title: z.string().trim().min(1, 'Give the cohort a name.').max(120),
			courseKey: z.string().min(1, 'Choose a course.'),
			startsOn: day,
			endsOn: day,
			instructorId: z.string().min(1, 'Choose an instructor.')
		})
		.refine((one) => one.endsOn >= one.startsOn, {
			path: ['endsOn'],
			message: 'The last day comes after the first.'
		}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope, input, at, newId, record }) {
		const [course, school, roles] = await Promise.all([
			newestRevision(scope, 'course', input.courseKey),
			schoolById(scope, scope.schoolId),
			rolesOf(scope, input.instructorId)
		]);
		if (!course || !school) throw inputProblem({ courseKey: ['Choose a course of this school.'] });
		if (!roles.some((one) => one.role === 'instructor'))
			throw inputProblem({ instructorId: ['Choose somebody who is an instructor here.'] });
		if (await cohortByTitle(scope, input.title))
			throw inputProblem({ title: ['A cohort of this name exists. Give this one another name.'] });
		const body = course.body as Course;
		const id = newId();
		await insert(scope, cohorts, {
			id,
			courseId: course.publicationId,
			courseRevisionId: course.id,
			title: input.title,
			startsOn: input.startsOn,
			endsOn: input.endsOn,
			instructorId: input.instructorId,
			priceMinor: body.priceMinor,
			currency: school.currency,
			createdAt: at.toISOString()
		});
		await record({
			kind: 'cohort-created',
			subject: id,
			data: { courseRevision: course.id, startsOn: input.startsOn, endsOn: input.endsOn }
		});
		return { cohortId: id };
	}
});
