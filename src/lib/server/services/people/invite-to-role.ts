import { z } from 'zod';
import { emailAddress } from '$lib/domain/accounts/email';
import { lifetimes } from '$lib/domain/accounts/lifetimes';
import { roles } from '$lib/domain/actor';
import { inputProblem, Problem } from '$lib/domain/problem';
import { accountByEmail } from '../../data/queries/accounts';
import { dropRoleInvitation, keepRoleInvitation } from '../../data/queries/people';
import { personOfAccount, schoolById } from '../../data/queries/schools';
import { endTokens, makeToken } from '../../data/queries/tokens';
import { writeCase } from '../use-case';
import { rolesInWords } from './change-roles';

/** Asks somebody by letter to work in the school. Nothing exists for them until they accept. */
export const inviteToRole = writeCase({
	name: 'invite-to-role',
	action: 'people:edit',
	input: z.object({
		email: emailAddress,
		name: z.string().trim().min(1, 'Give the name.').max(120),
		roles: z.array(z.enum(roles)).min(1, 'Choose at least one role.')
	}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope, house, input, me, at, newId, mail, record }) {
		const account = await accountByEmail(scope, input.email);
		if (account && (await personOfAccount(scope, account.id)))
			throw inputProblem({
				email: ['This person is in the school. Change the roles in the list.']
			});
		const invited = { ...input, id: newId(), invitedBy: me, invitedAt: at.toISOString() };
		const id = await keepRoleInvitation(scope, invited);
		const school = await schoolById(scope, scope.schoolId);
		const token = await makeToken(scope, house.chance(32), {
			purpose: 'role-invitation',
			identifier: `${scope.schoolId}:${id}`,
			at,
			heldForMs: lifetimes.roleInvitationDays * 24 * 3600 * 1000
		});
		await mail({
			kind: 'role-invitation',
			to: input.email,
			payload: {
				name: input.name,
				schoolName: school?.name ?? '',
				roleWords: rolesInWords(input.roles),
				heldForDays: lifetimes.roleInvitationDays
			},
			links: { link: `${house.config.ORIGIN}/joining/${token}` }
		});
		await record({ kind: 'role-invitation-sent', subject: id, data: { roles: input.roles } });
		return { id };
	}
});

/** Takes an invitation back that nobody has accepted; its link ends. */
export const withdrawRoleInvitation = writeCase({
	name: 'withdraw-role-invitation',
	action: 'people:edit',
	input: z.object({ id: z.string().min(1) }),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope, input, record }) {
		if ((await dropRoleInvitation(scope, input.id)) === 0)
			throw new Problem('absent', 'This invitation was accepted or withdrawn already.');
		await endTokens(scope, 'role-invitation', `${scope.schoolId}:${input.id}`);
		await record({ kind: 'role-invitation-withdrawn', subject: input.id, data: {} });
	}
});
