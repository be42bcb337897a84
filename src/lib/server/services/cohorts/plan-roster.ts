import { z } from 'zod';
import { planRoster } from '$lib/domain/cohorts/plan-roster';
import { readRoster } from '$lib/domain/cohorts/read-roster';
import { inputProblem } from '$lib/domain/problem';
import { findCohort, freePlaces, rosterOf } from '../../data/queries/cohorts';
import { rosterEntries } from '../../data/models';
import { insertAll, remove } from '../../data/rows';
import type { SchoolScope } from '../../data/scope';
import { readCase, writeCase } from '../use-case';
import { inviteWaiting } from './invite-waiting';

const input = z.object({
	cohortId: z.string(),
	list: z
		.string()
		.min(1, 'Paste the list, or choose a file.')
		.max(200_000, 'The list is too long. Send it in parts.')
});

async function findHere({ scope, input }: { scope: SchoolScope; input: { cohortId: string } }) {
	const cohort = await findCohort(scope, input.cohortId);
	return cohort && { schoolId: scope.schoolId, cohort };
}

async function planFor(scope: SchoolScope, cohortId: string, list: string) {
	const reading = readRoster(list);
	if (reading.fault) throw inputProblem({ list: [reading.fault] });
	// Who was taken off may be put on again.
	const roster = (await rosterOf(scope, cohortId)).filter((one) => one.state !== 'withdrawn');
	const standing = new Set(roster.map((one) => one.email));
	return planRoster(reading.rows, standing, (await freePlaces(scope, cohortId)).length);
}

/** The dry run: what would happen, row by row. Nothing is written. */
export const planCohortRoster = readCase({
	name: 'plan-roster',
	action: 'roster:plan',
	input,
	subject: findHere,
	run: async ({ scope, input: { cohortId, list } }) => planFor(scope, cohortId, list)
});

/**
 * Writes a roster without faults and invites as far as the paid places go; the rest wait. The
 * plan is made again here: what the page showed is never taken on trust.
 */
export const applyCohortRoster = writeCase({
	name: 'apply-roster',
	action: 'roster:apply',
	input,
	subject: findHere,
	async run({ subject: { cohort }, ...work }) {
		const { scope, at, newId, record } = work;
		const plan = await planFor(scope, cohort.id, work.input.list);
		if (plan.counts.fault > 0)
			throw inputProblem({
				list: plan.rows.flatMap((row) => row.faults.map((fault) => `Line ${row.line}: ${fault}`))
			});
		const fresh = plan.rows.filter((row) => row.outcome !== 'already');
		// One entry an address and cohort: whoever was taken off before stands at the end again.
		const emails = fresh.map((row) => row.email);
		await remove(scope, rosterEntries, { cohortId: cohort.id, email: emails, state: 'withdrawn' });
		// Places go by the order of the list: ids made in one millisecond have none by themselves.
		const ids = fresh.map(newId).sort();
		await insertAll(
			scope,
			rosterEntries,
			fresh.map((row, index) => ({
				id: ids[index] ?? newId(),
				cohortId: cohort.id,
				email: row.email,
				name: row.name,
				studentNumber: row.studentNumber || null,
				placeId: null,
				state: 'waiting' as const,
				invitedAt: null,
				createdAt: at.toISOString()
			}))
		);
		await record({ kind: 'roster-written', subject: cohort.id, data: { rows: fresh.length } });
		const invited = await inviteWaiting(work, cohort);
		return { added: fresh.length, invited, waiting: fresh.length - invited };
	}
});
