import type { Membership, Role } from '$lib/domain/actor';
import { people, personRoles, schools } from '../models';
import { find, select, sql } from '../rows';
import { acrossSchools, type Scope, type SchoolScope } from '../scope';

export function findSchool(scope: Scope, slug: string) {
	return find(acrossSchools(scope), schools, { slug });
}

export function schoolById(scope: Scope, id: string) {
	return find(acrossSchools(scope), schools, { id });
}

export function allSchools(scope: Scope) {
	return select(acrossSchools(scope), schools, {}, { order: [['name', 'asc']] });
}

/** Every school that an account belongs to, with its roles there. */
export async function membershipsOf(scope: Scope, accountId: string): Promise<Membership[]> {
	const rows = await sql<{
		schoolId: string;
		slug: string;
		name: string;
		personId: string;
		roles: string;
	}>(
		acrossSchools(scope),
		`SELECT p.schoolId, s.slug, s.name, p.id AS personId, group_concat(r.role) AS roles
		 FROM people p JOIN schools s ON s.id = p.schoolId
		 JOIN person_roles r ON r.schoolId = p.schoolId AND r.personId = p.id
		 WHERE p.accountId = :accountId GROUP BY p.schoolId, p.id ORDER BY s.name`,
		{ accountId }
	);
	return rows.map((row) => ({
		schoolId: row.schoolId,
		schoolSlug: row.slug,
		schoolName: row.name,
		personId: row.personId,
		roles: row.roles.split(',') as Role[]
	}));
}

export function findPerson(scope: SchoolScope, id: string) {
	return find(scope, people, { id });
}

export function personOfAccount(scope: SchoolScope, accountId: string) {
	return find(scope, people, { accountId });
}

export function peopleWithRole(scope: SchoolScope, role: Role) {
	return sql<{ id: string; name: string; accountId: string }>(
		scope,
		`SELECT p.id, p.name, p.accountId FROM people p
		 JOIN person_roles r ON r.schoolId = p.schoolId AND r.personId = p.id
		 WHERE p.schoolId = :schoolId AND r.role = :role ORDER BY p.name`,
		{ role }
	);
}

export function rolesOf(scope: SchoolScope, personId: string) {
	return select(scope, personRoles, { personId });
}
