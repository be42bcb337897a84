import { z } from 'zod';
import { hasRole } from '$lib/domain/actor';
import type { Course } from '$lib/domain/courses/schema';
import { minutesOfCohort } from '../../data/queries/bench-hours';
import { findCohort, listCohorts } from '../../data/queries/cohorts';
import { enrolmentsOfCohort, stepStatesOfCohort } from '../../data/queries/enrolments';
import { revisionById } from '../../data/queries/publications';
import { readCase } from '../use-case';

export const listProgress = readCase({
	name: 'list-progress',
	action: 'progress:read',
	input: z.object({}).default({}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	run: async ({ scope }) => ({ cohorts: await listCohorts(scope) })
});

/** The progress chart of a cohort: students by steps, from one query of step states. */
export const readProgress = readCase({
	name: 'read-progress',
	action: 'progress:read',
	input: z.object({ cohortId: z.string() }),
	async subject({ scope, input }) {
		const cohort = await findCohort(scope, input.cohortId);
		return cohort && { schoolId: scope.schoolId, cohort };
	},
	async run({ scope, actor, subject: { cohort } }) {
		const [revision, enrolments, states, minutes] = await Promise.all([
			revisionById(scope, cohort.courseRevisionId),
			enrolmentsOfCohort(scope, cohort.id),
			stepStatesOfCohort(scope, cohort.id),
			minutesOfCohort(scope, cohort.id)
		]);
		const course = revision?.body as Course;
		const minutesBy = new Map(minutes.map((one) => [one.enrolmentId, one.minutes]));
		return {
			cohort,
			/** Whether the names lead to the bench hours: a courtesy, the page there asks again. */
			entersHours: hasRole(actor, scope.schoolId, 'instructor'),
			benchHours: course.award.benchHours,
			steps: course.steps.map(({ key, title, kind }, index) => ({
				key,
				title,
				kind,
				number: index + 1
			})),
			students: enrolments.map((enrolment) => {
				const own = states.filter((one) => one.enrolmentId === enrolment.id);
				const scores = own.flatMap((one) => (one.score === null ? [] : [one.score]));
				return {
					enrolmentId: enrolment.id,
					name: enrolment.personName,
					states: course.steps.map(
						(step) => own.find((one) => one.stepKey === step.key)?.state ?? 'not-begun'
					),
					benchMinutes: minutesBy.get(enrolment.id) ?? 0,
					quizMean:
						scores.length > 0 ? scores.reduce((sum, one) => sum + one, 0) / scores.length : null
				};
			})
		};
	}
});
