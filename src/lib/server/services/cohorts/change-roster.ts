import { z } from 'zod';
import { Problem } from '$lib/domain/problem';
import { findCohort, findRosterEntry } from '../../data/queries/cohorts';
import { endTokens } from '../../data/queries/tokens';
import { rosterEntries } from '../../data/models';
import { update } from '../../data/rows';
import type { SchoolScope } from '../../data/scope';
import { writeCase } from '../use-case';
import { inviteWaiting, sendInvitation } from './invite-waiting';

const input = z.object({ entryId: z.string() });

async function findEntry({ scope, input }: { scope: SchoolScope; input: { entryId: string } }) {
	const entry = await findRosterEntry(scope, input.entryId);
	const cohort = entry && (await findCohort(scope, entry.cohortId));
	return entry && cohort ? { schoolId: scope.schoolId, entry, cohort } : undefined;
}

export const inviteAgain = writeCase({
	name: 'invite-again',
	action: 'invitation:send',
	input,
	subject: findEntry,
	async run({ subject: { entry, cohort }, ...work }) {
		if (entry.state !== 'invited')
			throw new Problem('conflict', '{name} has no open invitation.', { name: entry.name });
		const invitedAt = work.at.toISOString();
		await update(work.scope, rosterEntries, { id: entry.id }, { invitedAt });
		await sendInvitation(work, cohort, entry);
		return { sentTo: entry.email };
	}
});

/** Takes somebody off the roster before they have come. The place is free for the next who waits. */
export const withdrawFromRoster = writeCase({
	name: 'withdraw-from-roster',
	action: 'invitation:send',
	input,
	subject: findEntry,
	async run({ subject: { entry, cohort }, ...work }) {
		if (entry.state === 'enrolled')
			throw new Problem('conflict', '{name} is enrolled already.', { name: entry.name });
		const { scope } = work;
		await update(scope, rosterEntries, { id: entry.id }, { state: 'withdrawn', placeId: null });
		await endTokens(scope, 'invitation', `${scope.schoolId}:${entry.id}`);
		await work.record({ kind: 'roster-withdrawn', subject: entry.id, data: { cohort: cohort.id } });
		return { invited: await inviteWaiting(work, cohort) };
	}
});
