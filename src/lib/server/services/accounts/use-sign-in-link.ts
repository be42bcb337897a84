import { z } from 'zod';
import { accounts } from '../../data/models';
import { accountByEmail } from '../../data/queries/accounts';
import { endTokenWithHash, readToken } from '../../data/queries/tokens';
import { update } from '../../data/rows';
import { acrossSchools } from '../../data/scope';
import { readCase, writeCase } from '../use-case';

/** Whether a link still stands, for the page with the button. Looking uses nothing up. */
export const readSignInLink = readCase({
	name: 'read-sign-in-link',
	action: 'session:ask',
	where: 'common',
	input: z.object({ token: z.string().max(200) }),
	subject: () => Promise.resolve({}),
	run: async ({ scope, input, at }) => ({
		stands: (await readToken(scope, 'sign-in', input.token, at)) !== undefined
	})
});

/** Uses a link up and says whose it is; of two that come at once, one gets it. */
export const useSignInLink = writeCase({
	name: 'use-sign-in-link',
	action: 'session:open',
	where: 'common',
	input: z.object({ tokenHash: z.string().length(64) }),
	subject: () => Promise.resolve({}),
	async run({ scope, input, at }) {
		const email = await endTokenWithHash(scope, 'sign-in', input.tokenHash, at);
		if (email === undefined) return null;
		const account = await accountByEmail(scope, email);
		if (!account) return null;
		const proven = { emailVerifiedAt: account.emailVerifiedAt ?? at.toISOString() };
		await update(acrossSchools(scope), accounts, { id: account.id }, proven);
		return { email };
	}
});
