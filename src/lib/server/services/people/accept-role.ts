import { z } from 'zod';
import { newPassword } from '$lib/domain/accounts/password';
import { inputProblem, Problem } from '$lib/domain/problem';
import { accounts, people } from '../../data/models';
import { accountByEmail } from '../../data/queries/accounts';
import { closeRoleInvitation, giveRole, roleInvitation } from '../../data/queries/people';
import { personOfAccount, rolesOf, schoolById } from '../../data/queries/schools';
import { endSessions } from '../../data/queries/sessions';
import { readToken, useToken } from '../../data/queries/tokens';
import { insert } from '../../data/rows';
import { acrossSchools, within, type Scope, type SchoolScope } from '../../data/scope';
import { hashPassword } from '../../gateways/passwords/passwords';
import { readCase, writeCase } from '../use-case';
import { rolesInWords } from './change-roles';

const token = z.string().min(20).max(200);

async function invitationBehind(scope: Scope, identifier: string | undefined) {
	const [schoolId, id] = identifier?.split(':') ?? [];
	if (!schoolId || !id) return undefined;
	const here = within(scope, schoolId);
	const invited = await roleInvitation(here, { id });
	return invited && invited.acceptedAt === null ? { here, invited } : undefined;
}

/** Opening the page uses nothing up: mail scanners follow links. */
export const readRoleInvitation = readCase({
	name: 'read-role-invitation',
	action: 'role:accept',
	where: 'common',
	input: z.object({ token }),
	subject: async ({ scope, input, at }) =>
		invitationBehind(scope, await readToken(scope, 'role-invitation', input.token, at)),
	async run({ scope, subject: { here, invited }, actor }) {
		const account = await accountByEmail(scope, invited.email);
		const school = await schoolById(scope, here.schoolId);
		const asInvited = actor.kind === 'account' && actor.email === invited.email;
		return {
			email: invited.email,
			name: invited.name,
			roleWords: rolesInWords(invited.roles),
			schoolName: school?.name ?? '',
			next: asInvited
				? ('accept' as const)
				: account
					? ('sign-in' as const)
					: ('new-password' as const)
		};
	}
});

/**
 * Accepts: the link proves the mailbox, so a new person sets a password and is in. An account
 * that exists is never changed by a link; its owner signs in first.
 */
export const acceptRole = writeCase({
	name: 'accept-role',
	action: 'role:accept',
	where: 'common',
	input: z.object({ token, password: newPassword.optional() }),
	prepare: async ({ input }) =>
		input.password === undefined ? null : await hashPassword(input.password),
	subject: async ({ scope, input, at }) =>
		invitationBehind(scope, await readToken(scope, 'role-invitation', input.token, at)),
	async run({ scope, subject: { here, invited }, input, actor, prepared, at, newId, record }) {
		const { email, name } = invited;
		const now = at.toISOString();
		const known = await accountByEmail(scope, email);
		if (known && !(actor.kind === 'account' && actor.accountId === known.id))
			throw new Problem('signed-out', 'Sign in as {email} first, then accept.', { email });
		if (!known && prepared === null) throw inputProblem({ password: ['Choose a password.'] });
		const used = await useToken(scope, 'role-invitation', input.token, at);
		if (used === undefined || !(await closeRoleInvitation(here, invited.id, now)))
			throw new Problem('closed', 'This link was used already.');
		const accountId = known?.id ?? newId();
		if (!known) {
			const account = { id: accountId, email, name, passwordHash: prepared };
			const row = { ...account, emailVerifiedAt: now, createdAt: now };
			await insert(acrossSchools(scope), accounts, row);
		}
		const personId = await personIn(here, { accountId, name: known?.name ?? name, now, newId });
		const held = (await rolesOf(here, personId)).map((one) => one.role);
		const given = invited.roles.filter((role) => !held.includes(role));
		for (const role of given) await giveRole(here, personId, role, now);
		const keep = actor.kind === 'account' ? actor.sessionId : undefined;
		await endSessions(scope, accountId, keep);
		const { schoolId } = here;
		const data = { given, invitedBy: invited.invitedBy };
		await record({ schoolId, kind: 'role-accepted', subject: personId, data });
		const school = await schoolById(scope, schoolId);
		return { accountId, isNew: !known, schoolSlug: school?.slug ?? '' };
	}
});

async function personIn(
	here: SchoolScope,
	of: { accountId: string; name: string; now: string; newId: () => string }
): Promise<string> {
	const standing = await personOfAccount(here, of.accountId);
	if (standing) return standing.id;
	const id = of.newId();
	const person = { id, accountId: of.accountId, name: of.name, createdAt: of.now };
	await insert(here, people, { ...person, studentNumber: null, extraTimePercent: 0 });
	return id;
}
