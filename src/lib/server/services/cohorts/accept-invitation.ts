import { z } from 'zod';
import { newPassword } from '$lib/domain/accounts/password';
import { inputProblem, Problem } from '$lib/domain/problem';
import { hashPassword } from '../../gateways/passwords/passwords';
import { readToken, useToken } from '../../data/queries/tokens';
import { enrol } from '../../data/queries/enrolments';
import { personOfAccount, schoolById } from '../../data/queries/schools';
import { accounts, people, personRoles, rosterEntries } from '../../data/models';
import { find, insert, update } from '../../data/rows';
import { acrossSchools, type SchoolScope } from '../../data/scope';
import { writeCase } from '../use-case';
import { entryBehind, token } from './read-invitation';

/**
 * Accepts an invitation: the mailbox is proven by the link, so a new person sets a password and
 * is in. An account that exists is never changed; its owner signs in first and then accepts.
 */
export const acceptInvitation = writeCase({
	name: 'accept-invitation',
	action: 'invitation:accept',
	where: 'common',
	input: z.object({
		token,
		name: z.string().trim().max(120).optional(),
		password: newPassword.optional()
	}),
	prepare: async ({ input }) =>
		input.password === undefined ? undefined : hashPassword(input.password),
	async subject({ scope, input, at }) {
		return entryBehind(scope, await readToken(scope, 'invitation', input.token, at));
	},
	async run({ scope, subject, input, actor, prepared: passwordHash, at, newId, record }) {
		const { entry, placeId, cohort, schoolScope } = subject;
		const common = acrossSchools(scope);
		const known = await find(common, accounts, { email: entry.email });
		if (known && !(actor.kind === 'account' && actor.accountId === known.id))
			throw new Problem('signed-out', 'Sign in as {email} first, then accept.', {
				email: entry.email
			});
		if (!known && passwordHash === undefined)
			throw inputProblem({ password: ['Choose a password.'] });
		if ((await useToken(scope, 'invitation', input.token, at)) === undefined)
			throw new Problem('closed', 'This link was used already.');

		const now = at.toISOString();
		const accountId = known?.id ?? newId();
		const name = known?.name ?? (input.name || entry.name);
		if (!known)
			await insert(common, accounts, {
				id: accountId,
				email: entry.email,
				name,
				passwordHash: passwordHash ?? null,
				emailVerifiedAt: now,
				createdAt: now
			});
		const personId = await studentOf(schoolScope, { accountId, name, entry, now, newId });
		const enrolmentId = newId();
		await enrol(schoolScope, {
			id: enrolmentId,
			cohortId: cohort.id,
			courseRevisionId: cohort.courseRevisionId,
			personId,
			placeId,
			rosterEntryId: entry.id,
			enrolledAt: now
		});
		await update(schoolScope, rosterEntries, { id: entry.id }, { state: 'enrolled' });
		const { schoolId } = schoolScope;
		const data = { cohort: cohort.id, person: personId };
		await record({ schoolId, kind: 'enrolled', subject: enrolmentId, data });
		const school = await schoolById(scope, schoolId);
		return { accountId, isNew: !known, schoolId, schoolSlug: school?.slug ?? '' };
	}
});

async function studentOf(
	scope: SchoolScope,
	of: {
		accountId: string;
		name: string;
		entry: { studentNumber: string | null };
		now: string;
		newId: () => string;
	}
): Promise<string> {
	const standing = await personOfAccount(scope, of.accountId);
	const personId = standing?.id ?? of.newId();
	if (!standing)
		await insert(scope, people, {
			id: personId,
			accountId: of.accountId,
			name: of.name,
			studentNumber: of.entry.studentNumber,
			extraTimePercent: 0,
			createdAt: of.now
		});
	const role = { personId, role: 'student' as const };
	if (!(await find(scope, personRoles, role)))
		await insert(scope, personRoles, { ...role, givenAt: of.now });
	return personId;
}
