import type { Actor } from '$lib/domain/actor';
import { apiTokens } from '../models';
import { find, insert, select, update } from '../rows';
import { acrossSchools, type Scope, type SchoolScope } from '../scope';
import { tokenHash } from './tokens';

type ScriptActor = Extract<Actor, { kind: 'script' }>;

/** A school's script by its bearer token; nobody by a revoked or unknown one. */
export async function actorOfBearer(
	scope: Scope,
	token: string
): Promise<{ actor: ScriptActor; lastUsedAt: string | null } | undefined> {
	const row = await find(acrossSchools(scope), apiTokens, { tokenHash: tokenHash(token) });
	if (!row || row.revokedAt) return undefined;
	const { id: tokenId, schoolId, scopes, lastUsedAt } = row;
	return { actor: { kind: 'script', tokenId, schoolId, scopes }, lastUsedAt };
}

export function noteApiTokenUse(scope: Scope, id: string, lastUsedAt: string) {
	return update(acrossSchools(scope), apiTokens, { id }, { lastUsedAt });
}

export async function makeApiToken(
	scope: SchoolScope,
	row: {
		id: string;
		name: string;
		scopes: string[];
		createdBy: string;
		createdAt: string;
		token: string;
	}
) {
	const { token, ...rest } = row;
	await insert(scope, apiTokens, {
		...rest,
		tokenHash: tokenHash(token),
		lastUsedAt: null,
		revokedAt: null
	});
}

export function apiTokensOf(scope: SchoolScope) {
	return select(scope, apiTokens, {}, { order: [['createdAt', 'desc']] });
}

export function revokeApiToken(scope: SchoolScope, id: string, at: string) {
	return update(scope, apiTokens, { id, revokedAt: null }, { revokedAt: at });
}
