import type { Role } from '$lib/domain/actor';
import { personRoles, roleInvitations } from '../models';
import { count, find, insert, remove, select, sql, update } from '../rows';
import type { SchoolScope } from '../scope';

export type PersonLine = {
	id: string;
	accountId: string;
	name: string;
	email: string;
	studentNumber: string | null;
	extraTimePercent: number;
	roles: Role[];
};

/** Everybody in the school with what they are here, by name. */
export async function peopleOfSchool(scope: SchoolScope): Promise<PersonLine[]> {
	const rows = await sql<Omit<PersonLine, 'roles'> & { roles: string | null }>(
		scope,
		`SELECT p.id, p.accountId, p.name, a.email, p.studentNumber, p.extraTimePercent,
			(SELECT group_concat(r.role) FROM person_roles r
			 WHERE r.schoolId = p.schoolId AND r.personId = p.id) AS roles
		 FROM people p JOIN accounts a ON a.id = p.accountId
		 WHERE p.schoolId = :schoolId ORDER BY p.name, p.id`
	);
	return rows.map((row) => ({ ...row, roles: (row.roles?.split(',') ?? []) as Role[] }));
}

export function adminsOf(scope: SchoolScope) {
	return count(scope, personRoles, { role: 'admin' });
}

export function giveRole(scope: SchoolScope, personId: string, role: Role, givenAt: string) {
	return insert(scope, personRoles, { personId, role, givenAt });
}

export function takeRole(scope: SchoolScope, personId: string, role: Role) {
	return remove(scope, personRoles, { personId, role });
}

export function waitingRoleInvitations(scope: SchoolScope) {
	return select(scope, roleInvitations, { acceptedAt: null }, { order: [['invitedAt', 'desc']] });
}

export function roleInvitation(scope: SchoolScope, where: { id: string } | { email: string }) {
	return find(scope, roleInvitations, where);
}

type Invited = {
	id: string;
	email: string;
	name: string;
	roles: Role[];
	invitedBy: string;
	invitedAt: string;
};

/** One invitation an address: inviting again replaces what stood. */
export async function keepRoleInvitation(scope: SchoolScope, invited: Invited): Promise<string> {
	const standing = await roleInvitation(scope, { email: invited.email });
	const { id, ...rest } = invited;
	if (standing) {
		const change = { ...rest, acceptedAt: null };
		await update(scope, roleInvitations, { id: standing.id }, change);
		return standing.id;
	}
	await insert(scope, roleInvitations, { ...invited, acceptedAt: null });
	return id;
}

/** @returns whether it was still open: of two that accept at once, one does */
export async function closeRoleInvitation(scope: SchoolScope, id: string, acceptedAt: string) {
	const open = { id, acceptedAt: null };
	return (await update(scope, roleInvitations, open, { acceptedAt })) === 1;
}

export function dropRoleInvitation(scope: SchoolScope, id: string) {
	return remove(scope, roleInvitations, { id, acceptedAt: null });
}
