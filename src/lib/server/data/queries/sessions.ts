import type { Actor, Membership, Role } from '$lib/domain/actor';
import { sessions } from '../models';
import { remove, select, sql, update } from '../rows';
import { acrossSchools, type Scope } from '../scope';
import { tokenHash } from './tokens';

type Row = {
	sessionId: string;
	seenAt: string;
	accountId: string;
	email: string;
	name: string;
	schoolId: string | null;
	slug: string;
	schoolName: string;
	personId: string;
	roles: string;
};
export type AccountActor = Extract<Actor, { kind: 'account' }>;

/** Who holds a session, with every membership: one joined query, asked on each request. */
export async function actorOfSession(
	scope: Scope,
	token: string,
	at: Date
): Promise<{ actor: AccountActor; seenAt: string } | undefined> {
	const rows = await sql<Row>(
		acrossSchools(scope),
		`SELECT s.id AS sessionId, s.seenAt, a.id AS accountId, a.email, a.name, m.schoolId,
			h.slug, h.name AS schoolName, m.personId, m.roles
		 FROM sessions s JOIN accounts a ON a.id = s.accountId
		 LEFT JOIN (SELECT p.accountId, p.schoolId, p.id AS personId, group_concat(r.role) AS roles
			FROM people p JOIN person_roles r ON r.schoolId = p.schoolId AND r.personId = p.id
			GROUP BY p.schoolId, p.id) m ON m.accountId = a.id
		 LEFT JOIN schools h ON h.id = m.schoolId
		 WHERE s.tokenHash = :tokenHash AND s.expiresAt > :now ORDER BY h.name`,
		{ tokenHash: tokenHash(token), now: at.toISOString() }
	);
	const [first] = rows;
	if (!first) return undefined;
	const { accountId, sessionId, email, name, seenAt } = first;
	const memberships = rows.flatMap((row) => (row.schoolId === null ? [] : [membership(row)]));
	return { actor: { kind: 'account', accountId, sessionId, email, name, memberships }, seenAt };
}

function membership(row: Row): Membership {
	return {
		schoolId: row.schoolId ?? '',
		schoolSlug: row.slug,
		schoolName: row.schoolName,
		personId: row.personId,
		roles: row.roles.split(',') as Role[]
	};
}

export function sessionsOf(scope: Scope, accountId: string, at: Date) {
	return select(
		acrossSchools(scope),
		sessions,
		{ accountId, expiresAt: { above: at.toISOString() } },
		{ order: [['seenAt', 'desc']] }
	);
}

export function touchSession(scope: Scope, id: string, at: Date) {
	return update(acrossSchools(scope), sessions, { id }, { seenAt: at.toISOString() });
}

/** Ends an account's sessions, all of them or all but one. @returns how many */
export function endSessions(scope: Scope, accountId: string, except?: string) {
	const others = except === undefined ? {} : { id: { not: except } };
	return remove(acrossSchools(scope), sessions, { accountId, ...others });
}
