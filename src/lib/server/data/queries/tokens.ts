import { createHash } from 'node:crypto';
import { tokens, type TokenPurpose } from '../models';
import { find, insert, remove } from '../rows';
import { acrossSchools, type Scope } from '../scope';

export function tokenHash(token: string): string {
	return createHash('sha256').update(token).digest('hex');
}

type NewToken = { purpose: TokenPurpose; identifier: string; at: Date; heldForMs: number };

/**
 * Makes a one-time link's token. Only its hash is kept; earlier ones for the same thing end.
 * @param chance 32 random bytes
 * @returns the token itself, to be put in a link and forgotten
 */
export async function makeToken(scope: Scope, chance: Uint8Array, wanted: NewToken) {
	const { purpose, identifier, at, heldForMs } = wanted;
	const token = Buffer.from(chance).toString('base64url');
	await remove(acrossSchools(scope), tokens, { purpose, identifier });
	await insert(acrossSchools(scope), tokens, {
		tokenHash: tokenHash(token),
		purpose,
		identifier,
		createdAt: at.toISOString(),
		expiresAt: new Date(at.getTime() + heldForMs).toISOString()
	});
	return token;
}

/** Looks without using it up: for the page whose button posts. */
export async function readToken(scope: Scope, purpose: TokenPurpose, token: string, at: Date) {
	const found = await find(acrossSchools(scope), tokens, { tokenHash: tokenHash(token), purpose });
	return found && found.expiresAt > at.toISOString() ? found.identifier : undefined;
}

/** Uses a token up. Of two that come at once, one gets it: the delete decides. */
export function useToken(scope: Scope, purpose: TokenPurpose, token: string, at: Date) {
	return endTokenWithHash(scope, purpose, tokenHash(token), at);
}

/** The same for who is given the hash only, as Auth.js hands it on. */
export async function endTokenWithHash(
	scope: Scope,
	purpose: TokenPurpose,
	hash: string,
	at: Date
): Promise<string | undefined> {
	const held = { tokenHash: hash, purpose };
	const found = await find(acrossSchools(scope), tokens, held);
	const gone = await remove(acrossSchools(scope), tokens, held);
	return found && gone === 1 && found.expiresAt > at.toISOString() ? found.identifier : undefined;
}

export function endTokens(scope: Scope, purpose: TokenPurpose, identifier: string) {
	return remove(acrossSchools(scope), tokens, { purpose, identifier });
}
