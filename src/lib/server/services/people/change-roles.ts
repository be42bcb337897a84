import { z } from 'zod';
import { roles, roleWords, type Role } from '$lib/domain/actor';
import { Problem } from '$lib/domain/problem';
import { adminsOf, giveRole, takeRole } from '../../data/queries/people';
import { findPerson, rolesOf } from '../../data/queries/schools';
import { endSessions } from '../../data/queries/sessions';
import { writeCase } from '../use-case';

/**
 * Gives and withdraws roles: the ones ticked are the ones held afterwards. Whoever gets other
 * rights signs in anew, except on the device from which the change was made.
 */
export const changeRoles = writeCase({
	name: 'change-roles',
	action: 'people:edit',
	input: z.object({
		personId: z.string().min(1),
		roles: z.array(z.enum(roles)).default([])
	}),
	async subject({ scope, input }) {
		const person = await findPerson(scope, input.personId);
		return person && { schoolId: scope.schoolId, person };
	},
	async run({ scope, subject: { person }, input, actor, at, record }) {
		const held = (await rolesOf(scope, person.id)).map((one) => one.role);
		const given = input.roles.filter((role) => !held.includes(role));
		const taken = held.filter((role) => !input.roles.includes(role));
		if (given.length === 0 && taken.length === 0) return { given, taken };
		if (taken.includes('admin') && (await adminsOf(scope)) === 1)
			throw new Problem('conflict', 'A school keeps at least one admin. Make another one first.');
		for (const role of given) await giveRole(scope, person.id, role, at.toISOString());
		for (const role of taken) await takeRole(scope, person.id, role);
		const isSelf = actor.kind === 'account' && actor.accountId === person.accountId;
		await endSessions(scope, person.accountId, isSelf ? actor.sessionId : undefined);
		await record({ kind: 'roles-changed', subject: person.id, data: { given, taken } });
		return { given, taken };
	}
});

/** "instructor", "instructor and verifier", "instructor, verifier and school admin". */
export function rolesInWords(held: readonly Role[]): string {
	const words = roles.filter((role) => held.includes(role)).map((role) => roleWords[role]);
	const last = words.pop() ?? '';
	return words.length === 0 ? last : `${words.join(', ')} and ${last}`;
}
