import { z } from 'zod';
import { newPassword } from '$lib/domain/accounts/password';
import { inputProblem, Problem } from '$lib/domain/problem';
import {
	accountByEmail,
	accountById,
	endOtherSessions,
	setPassword
} from '../../data/queries/accounts';
import { makeToken, readToken, useToken } from '../../data/queries/tokens';
import { commonScope } from '../../data/scope';
import { hashPassword, verifyPassword } from '../../gateways/passwords/passwords';
import { readCase, writeCase } from '../use-case';

const linkHeldForMinutes = 60;
const token = z.string().min(20).max(100);

/** The same answer whether or not the address is known. */
export const askForPasswordLink = writeCase({
	name: 'ask-for-password-link',
	action: 'site:read',
	where: 'common',
	input: z.object({ email: z.email('Give your e-mail address.').max(254) }),
	subject: () => Promise.resolve({}),
	async run({ scope, house, input, at, mail }) {
		const account = await accountByEmail(scope, input.email);
		if (account) {
			const made = await makeToken(scope, house.chance(32), {
				purpose: 'password',
				identifier: account.id,
				at,
				heldForMs: linkHeldForMinutes * 60_000
			});
			await mail({
				kind: 'password-reset',
				to: account.email,
				payload: { heldForMinutes: linkHeldForMinutes },
				links: { link: `${house.config.ORIGIN}/password/${made}` }
			});
		}
		return { asked: true };
	}
});

export const readPasswordLink = readCase({
	name: 'read-password-link',
	action: 'site:read',
	where: 'common',
	input: z.object({ token }),
	subject: () => Promise.resolve({}),
	async run({ scope, input, at }) {
		const accountId = await readToken(scope, 'password', input.token, at);
		return { stands: accountId !== undefined };
	}
});

/** Sets a password by a mailed link. Every session ends: whoever had one signs in anew. */
export const setPasswordByLink = writeCase({
	name: 'set-password-by-link',
	action: 'site:read',
	where: 'common',
	input: z.object({ token, password: newPassword }),
	prepare: ({ input }) => hashPassword(input.password),
	subject: () => Promise.resolve({}),
	async run({ scope, house, input, prepared, at, mail }) {
		const accountId = await useToken(scope, 'password', input.token, at);
		const account = accountId && (await accountById(scope, accountId));
		if (!account)
			throw new Problem('closed', 'This link was used or has run out. Ask for a new one.');
		await setPassword(scope, account.id, prepared, at);
		await endOtherSessions(scope, account.id);
		await mail({
			kind: 'password-changed',
			to: account.email,
			payload: { name: account.name, address: `${house.config.ORIGIN}/password/forgotten` }
		});
		return { accountId: account.id };
	}
});

export const changePassword = writeCase({
	name: 'change-password',
	action: 'account:own',
	where: 'common',
	input: z.object({ present: z.string().max(200), password: newPassword }),
	async prepare({ house, actor, input }) {
		if (actor.kind !== 'account') return null;
		const account = await accountById(commonScope(house.database, null), actor.accountId);
		const right = await verifyPassword(account?.passwordHash ?? null, input.present);
		return right ? hashPassword(input.password) : null;
	},
	subject: ({ actor }) =>
		Promise.resolve(actor.kind === 'account' ? { accountId: actor.accountId, actor } : undefined),
	async run({ scope, house, subject: { actor }, prepared, at, mail }) {
		if (prepared === null) throw inputProblem({ present: ['This is not your present password.'] });
		await setPassword(scope, actor.accountId, prepared, at);
		const ended = await endOtherSessions(scope, actor.accountId, actor.sessionId);
		await mail({
			kind: 'password-changed',
			to: actor.email,
			payload: { name: actor.name, address: `${house.config.ORIGIN}/password/forgotten` }
		});
		return { ended };
	}
});
