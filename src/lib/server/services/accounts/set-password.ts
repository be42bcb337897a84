import { z } from 'zod';
import { demoPassword } from '$lib/domain/accounts/demo-password';
import { newPassword } from '$lib/domain/accounts/password';
import { inputProblem, Problem } from '$lib/domain/problem';
import { isLoopback } from '../../config/env';
import { accounts } from '../../data/models';
import { accountByEmail } from '../../data/queries/accounts';
import { endSessions } from '../../data/queries/sessions';
import { endTokens, readToken, useToken } from '../../data/queries/tokens';
import { update } from '../../data/rows';
import { acrossSchools, type Scope } from '../../data/scope';
import { hashPassword } from '../../gateways/passwords/passwords';
import type { House } from '../house';
import { readCase, writeCase, type Caller, type Written } from '../use-case';
import { ownAccount } from './own-account';
import { tryPassword } from './sign-in';
import type { TryOrigin } from './wait-buckets';

const token = z.string().min(20).max(200);

/** Whether a link to set a password still stands. Looking uses nothing up. */
export const readPasswordLink = readCase({
	name: 'read-password-link',
	action: 'password:reset',
	where: 'common',
	input: z.object({ token: z.string().max(200) }),
	subject: () => Promise.resolve({}),
	async run({ scope, input, at }) {
		const email = await readToken(scope, 'password', input.token, at);
		return { email: email ?? null };
	}
});

/** Sets a password by the link from a letter, and signs every device out. */
export const resetPassword = writeCase({
	name: 'reset-password',
	action: 'password:reset',
	where: 'common',
	input: z.object({ token, password: newPassword }),
	prepare: ({ input, house }) => hashNew(house, input.password),
	subject: () => Promise.resolve({}),
	async run({ scope, house, input, prepared: passwordHash, at, mail }) {
		const email = await useToken(scope, 'password', input.token, at);
		const account = email === undefined ? undefined : await accountByEmail(scope, email);
		if (!account)
			throw new Problem('closed', 'This link was used already or is too old. Ask for a new one.');
		const emailVerifiedAt = account.emailVerifiedAt ?? at.toISOString();
		await changeTo(scope, account, { passwordHash, emailVerifiedAt });
		await endSessions(scope, account.id);
		await tell(house, account, mail);
	}
});

const changeOwnPassword = writeCase({
	name: 'change-password',
	action: 'account:own',
	where: 'common',
	input: z.object({ password: newPassword }),
	prepare: ({ input, house }) => hashNew(house, input.password),
	subject: ownAccount,
	async run({ scope, house, subject, prepared: passwordHash, mail }) {
		await changeTo(scope, { ...subject, id: subject.accountId }, { passwordHash });
		const ended = await endSessions(scope, subject.accountId, subject.sessionId);
		await tell(house, subject, mail);
		return { ended };
	}
});

const form = z.object({
	current: z.string().min(1, 'Give your present password.').max(200),
	password: newPassword
});

/**
 * Changes the password of somebody who is signed in. The present one is asked for, and guessing
 * it is limited like a sign-in.
 */
export async function changePassword(caller: Caller, raw: unknown, origin: TryOrigin) {
	const { actor } = caller;
	if (actor.kind !== 'account') throw new Problem('signed-out', 'Sign in to go on.');
	const parsed = form.safeParse(raw);
	if (!parsed.success) throw inputProblem(z.flattenError(parsed.error).fieldErrors);
	const { current, password } = parsed.data;
	await tryPassword(caller, { email: actor.email, password: current, ...origin }).catch(
		(problem: unknown) => {
			if (problem instanceof Problem && problem.code === 'input')
				throw inputProblem({ current: ['This is not your present password.'] });
			throw problem;
		}
	);
	return changeOwnPassword(caller, { password });
}

function hashNew(house: House, password: string): Promise<string> {
	if (password === demoPassword && !isLoopback(house.config.ORIGIN))
		throw inputProblem({ password: ['This password is printed in the README. Choose another.'] });
	return hashPassword(password);
}

type Changed = { passwordHash: string; emailVerifiedAt?: string };

/** Links that would still open the account end with the old password. */
async function changeTo(scope: Scope, who: { id: string; email: string }, to: Changed) {
	await update(acrossSchools(scope), accounts, { id: who.id }, to);
	await endTokens(scope, 'sign-in', who.email);
	await endTokens(scope, 'password', who.email);
}

function tell(house: House, who: { email: string; name: string }, mail: Written['mail']) {
	return mail({
		kind: 'password-changed',
		to: who.email,
		payload: { name: who.name, address: `${house.config.ORIGIN}/password/forgotten` }
	});
}
