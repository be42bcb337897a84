import { z } from 'zod';
import type { Course } from '$lib/domain/courses/schema';
import { nextStep } from '$lib/domain/courses/next-step';
import { awardsOf, certificatesOf } from '../../data/queries/awards';
import { minutesOf } from '../../data/queries/bench-hours';
import { enrolmentsOfPerson, stepStatesOf } from '../../data/queries/enrolments';
import { revisionById } from '../../data/queries/publications';
import { readCase } from '../use-case';

/** The student's bench: each course they are in, where each step stands, and what is next. */
export const readBench = readCase({
	name: 'read-bench',
	action: 'bench:read',
	input: z.object({}).default({}),
	subject: ({ scope, me }) => Promise.resolve({ schoolId: scope.schoolId, ownerId: me }),
	async run({ scope, me, at }) {
		const today = at.toISOString().slice(0, 10);
		const enrolments = await enrolmentsOfPerson(scope, me);
		const courses = await Promise.all(
			enrolments.map(async (enrolment) => {
				const [revision, states, minutes, awards, certificates] = await Promise.all([
					revisionById(scope, enrolment.courseRevisionId),
					stepStatesOf(scope, enrolment.id),
					minutesOf(scope, enrolment.id),
					awardsOf(scope, enrolment.id),
					certificatesOf(scope, enrolment.id)
				]);
				const course = revision?.body as Course;
				const byKey = new Map(states.map((one) => [one.stepKey, one]));
				const steps = course.steps.map((step) => ({
					...step,
					state: byKey.get(step.key)?.state ?? ('not-begun' as const),
					note: byKey.get(step.key)?.note ?? null
				}));
				return {
					enrolmentId: enrolment.id,
					courseKey: course.key,
					title: course.title,
					cohortTitle: enrolment.cohortTitle,
					startsOn: enrolment.startsOn,
					endsOn: enrolment.endsOn,
					ended: enrolment.endsOn < today,
					steps,
					next: nextStep(steps),
					benchMinutes: minutes,
					benchMinutesWanted: course.award.benchHours * 60,
					award: awards[0]?.state ?? null,
					certificate: certificates[0] ?? null
				};
			})
		);
		return { courses };
	}
});
