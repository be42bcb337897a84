import { createHash } from 'node:crypto';
import type { Actor } from '$lib/domain/actor';
import { accounts, knownDevices, sessions, signInAttempts } from '../models';
import { find, insert, remove, select, sql, update } from '../rows';
import { acrossSchools, type Scope } from '../scope';
import { membershipsOf } from './schools';

export function hashToken(token: string): string {
	return createHash('sha256').update(token).digest('hex');
}

export function accountByEmail(scope: Scope, email: string) {
	return find(acrossSchools(scope), accounts, { email: email.trim().toLowerCase() });
}

export function accountById(scope: Scope, id: string) {
	return find(acrossSchools(scope), accounts, { id });
}

type SessionRow = { id: string; accountId: string; email: string; name: string; seenAt: string };

/** Who a session cookie stands for: one joined read, then the memberships. */
export async function actorOfSession(scope: Scope, token: string, at: Date): Promise<Actor> {
	const [row] = await sql<SessionRow>(
		acrossSchools(scope),
		`SELECT s.id, s.accountId, a.email, a.name, s.seenAt FROM sessions s JOIN accounts a ON a.id = s.accountId
		 WHERE s.tokenHash = :hash AND s.expiresAt > :at`,
		{ hash: hashToken(token), at: at.toISOString() }
	);
	if (!row) return { kind: 'anyone' };
	return {
		kind: 'account',
		accountId: row.accountId,
		sessionId: row.id,
		email: row.email,
		name: row.name,
		memberships: await membershipsOf(scope, row.accountId)
	};
}

export async function makeSession(
	scope: Scope,
	row: {
		id: string;
		accountId: string;
		token: string;
		device: string;
		address: string;
		at: Date;
		expiresAt: Date;
	}
) {
	const { token, at, expiresAt, ...rest } = row;
	await insert(acrossSchools(scope), sessions, {
		...rest,
		tokenHash: hashToken(token),
		createdAt: at.toISOString(),
		seenAt: at.toISOString(),
		expiresAt: expiresAt.toISOString()
	});
}

export function sessionsOf(scope: Scope, accountId: string) {
	return select(acrossSchools(scope), sessions, { accountId }, { order: [['seenAt', 'desc']] });
}

export function endSession(scope: Scope, where: { id: string; accountId: string }) {
	return remove(acrossSchools(scope), sessions, where);
}

export function endSessionByToken(scope: Scope, token: string) {
	return remove(acrossSchools(scope), sessions, { tokenHash: hashToken(token) });
}

/** All of an account's sessions, or all but the one in hand. */
export async function endOtherSessions(scope: Scope, accountId: string, keepId?: string) {
	return remove(
		acrossSchools(scope),
		sessions,
		keepId ? { accountId, id: { not: keepId } } : { accountId }
	);
}

export function setPassword(scope: Scope, accountId: string, passwordHash: string, at: Date) {
	return update(
		acrossSchools(scope),
		accounts,
		{ id: accountId },
		{ passwordHash, emailVerifiedAt: at.toISOString() }
	);
}

export function attempts(scope: Scope, bucket: string) {
	return find(acrossSchools(scope), signInAttempts, { bucket });
}

export async function keepAttempts(
	scope: Scope,
	row: { bucket: string; failures: number; lastAt: string; waitUntil: string | null }
) {
	const { bucket, ...change } = row;
	const changed = await update(acrossSchools(scope), signInAttempts, { bucket }, change);
	if (changed === 0) await insert(acrossSchools(scope), signInAttempts, row);
}

export function forgetAttempts(scope: Scope, bucket: string) {
	return remove(acrossSchools(scope), signInAttempts, { bucket });
}

export async function isKnownDevice(scope: Scope, accountId: string, device: string) {
	const where = { accountId, deviceHash: hashToken(device) };
	return (await find(acrossSchools(scope), knownDevices, where)) !== undefined;
}

export async function knowDevice(scope: Scope, accountId: string, device: string, at: Date) {
	const where = { accountId, deviceHash: hashToken(device) };
	const seenAt = at.toISOString();
	const changed = await update(acrossSchools(scope), knownDevices, where, { seenAt });
	if (changed === 0) await insert(acrossSchools(scope), knownDevices, { ...where, seenAt });
}
