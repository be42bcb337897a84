import { z } from 'zod';
import { accountByEmail } from '../../data/queries/accounts';
import { makeToken, readToken } from '../../data/queries/tokens';
import { tokens } from '../../data/models';
import { find, remove } from '../../data/rows';
import { acrossSchools } from '../../data/scope';
import { readCase, writeCase } from '../use-case';

export const linkHeldForMinutes = 20;

/**
 * Sends a link that signs in. The same answer whether or not the address is known, and no
 * account is ever made by asking.
 */
export const sendSignInLink = writeCase({
	name: 'send-sign-in-link',
	action: 'site:read',
	where: 'common',
	input: z.object({ email: z.email('Give your e-mail address.').max(254) }),
	subject: () => Promise.resolve({}),
	async run({ scope, house, input, at, mail }) {
		const account = await accountByEmail(scope, input.email);
		if (account) {
			const token = await makeToken(scope, house.chance(32), {
				purpose: 'sign-in',
				identifier: account.email,
				at,
				heldForMs: linkHeldForMinutes * 60_000
			});
			await mail({
				kind: 'sign-in-link',
				to: account.email,
				payload: { heldForMinutes: linkHeldForMinutes },
				links: { link: `${house.config.ORIGIN}/sign-in/link/${token}` }
			});
		}
		return { asked: true };
	}
});

/** Whose link it is, for the page whose button posts; nothing is used up. */
export const readSignInLink = readCase({
	name: 'read-sign-in-link',
	action: 'system:run',
	where: 'common',
	input: z.object({ token: z.string().max(100) }),
	subject: () => Promise.resolve({}),
	run: async ({ scope, input, at }) => ({
		email: (await readToken(scope, 'sign-in', input.token, at)) ?? null
	})
});

/** Uses a sign-in link up by one delete: of two that come at once, one gets in. */
export const useSignInLink = writeCase({
	name: 'use-sign-in-link',
	action: 'system:run',
	where: 'common',
	input: z.object({ tokenHash: z.string() }),
	subject: () => Promise.resolve({}),
	async run({ scope, input, at }) {
		const where = { tokenHash: input.tokenHash, purpose: 'sign-in' as const };
		const row = await find(acrossSchools(scope), tokens, where);
		const gone = await remove(acrossSchools(scope), tokens, where);
		if (!row || gone !== 1 || row.expiresAt <= at.toISOString()) return { account: null };
		const account = await accountByEmail(scope, row.identifier);
		return {
			account: account ? { id: account.id, email: account.email, name: account.name } : null
		};
	}
});
