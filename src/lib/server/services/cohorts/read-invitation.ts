import { z } from 'zod';
import { findCohort, findRosterEntry } from '../../data/queries/cohorts';
import { schoolById } from '../../data/queries/schools';
import { readToken } from '../../data/queries/tokens';
import { accounts } from '../../data/models';
import { find } from '../../data/rows';
import { acrossSchools, within, type Scope } from '../../data/scope';
import { readCase } from '../use-case';

export const token = z.string().min(20).max(100);

/** The roster entry behind a link that still stands, with what the page shows of it. */
export async function entryBehind(scope: Scope, identifier: string | undefined) {
	const [schoolId, entryId] = identifier?.split(':') ?? [];
	if (!schoolId || !entryId) return undefined;
	const school = within(scope, schoolId);
	const entry = await findRosterEntry(school, entryId);
	const cohort = entry && (await findCohort(school, entry.cohortId));
	return entry?.state === 'invited' && entry.placeId && cohort
		? { schoolScope: school, entry, placeId: entry.placeId, cohort }
		: undefined;
}

/** Opening the page uses nothing up: mail scanners follow links. */
export const readInvitation = readCase({
	name: 'read-invitation',
	action: 'invitation:read',
	where: 'common',
	input: z.object({ token }),
	async subject({ scope, input, at }) {
		return entryBehind(scope, await readToken(scope, 'invitation', input.token, at));
	},
	async run({ scope, subject: { entry, cohort, schoolScope }, actor }) {
		const account = await find(acrossSchools(scope), accounts, { email: entry.email });
		const school = await schoolById(scope, schoolScope.schoolId);
		const asInvited = actor.kind === 'account' && actor.email === entry.email;
		return {
			email: entry.email,
			name: entry.name,
			schoolName: school?.name ?? '',
			cohortTitle: cohort.title,
			courseTitle: cohort.courseTitle,
			startsOn: cohort.startsOn,
			endsOn: cohort.endsOn,
			/** What the page asks for: a new password, a sign-in first, or only the button. */
			next: asInvited
				? ('accept' as const)
				: account
					? ('sign-in' as const)
					: ('new-password' as const)
		};
	}
});
