import { z } from 'zod';
import {
	findCohort,
	freePlaces,
	listCohorts,
	ordersOf,
	rosterOf
} from '../../data/queries/cohorts';
import { newestRevisions } from '../../data/queries/publications';
import { peopleWithRole, schoolById } from '../../data/queries/schools';
import { readCase } from '../use-case';

export const readCohorts = readCase({
	name: 'read-cohorts',
	action: 'cohort:read',
	input: z.object({}).default({}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	run: async ({ scope }) => ({ cohorts: await listCohorts(scope) })
});

/** What the form for a new cohort chooses from. */
export const readCohortChoices = readCase({
	name: 'read-cohort-choices',
	action: 'cohort:create',
	input: z.object({}).default({}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope }) {
		const [courses, instructors] = await Promise.all([
			newestRevisions(scope, 'course'),
			peopleWithRole(scope, 'instructor')
		]);
		return {
			courses: courses.map(({ key, title }) => ({ key, title })),
			instructors: instructors.map(({ id, name }) => ({ id, name }))
		};
	}
});

/** One cohort with its roster and orders, as the office sees it. */
export const readCohort = readCase({
	name: 'read-cohort',
	action: 'cohort:create',
	input: z.object({ cohortId: z.string() }),
	async subject({ scope, input }) {
		const cohort = await findCohort(scope, input.cohortId);
		return cohort && { schoolId: scope.schoolId, cohort };
	},
	async run({ scope, subject: { cohort } }) {
		const [roster, orders, free, school] = await Promise.all([
			rosterOf(scope, cohort.id),
			ordersOf(scope, cohort.id),
			freePlaces(scope, cohort.id),
			schoolById(scope, scope.schoolId)
		]);
		return {
			cohort,
			freePlaces: free.length,
			locale: school?.locale ?? 'en-GB',
			roster: roster.map(({ id, name, email, studentNumber, state, invitedAt }) => ({
				id,
				name,
				email,
				studentNumber,
				state,
				invitedAt
			})),
			orders: orders.map((one) => ({
				id: one.id,
				quantity: one.quantity,
				amountMinor: one.amountMinor,
				currency: one.currency,
				method: one.method,
				state: one.state,
				reference: one.reference,
				checkoutUrl: one.state === 'open' ? one.checkoutUrl : null,
				fault: one.fault,
				createdAt: one.createdAt,
				settledAt: one.settledAt
			}))
		};
	}
});
