import { z } from 'zod';
import { demoPassword } from '$lib/domain/accounts/demo-password';
import { emailAddress } from '$lib/domain/accounts/email';
import { Problem } from '$lib/domain/problem';
import { isLoopback } from '../../config/env';
import { accountByEmail } from '../../data/queries/accounts';
import { forgetTries, giveTurnBack } from '../../data/queries/sign-in-tries';
import { verifyPassword } from '../../gateways/passwords/passwords';
import type { Caller } from '../use-case';
import { readCase, writeCase } from '../use-case';
import { bucketsOf, countTry, tryOrigin, type TryOrigin } from './wait-buckets';

const password = z.string().min(1, 'Give your password.').max(200, 'This is too long.');

/** Counts the try before the password is looked at: tries sent at once are all counted. */
const beginTry = writeCase({
	name: 'begin-sign-in',
	action: 'session:ask',
	where: 'common',
	input: z.object({ email: emailAddress, ...tryOrigin }),
	subject: () => Promise.resolve({}),
	async run({ scope, house, input, at }) {
		await countTry(scope, await bucketsOf(scope, house, input.email, input, 'password'), at);
	}
});

/** Looks at the password; as slow for an address without an account as for one with. */
const checkPassword = readCase({
	name: 'check-password',
	action: 'session:ask',
	where: 'common',
	input: z.object({ email: emailAddress, password }),
	subject: () => Promise.resolve({}),
	async run({ scope, house, input }) {
		if (input.password === demoPassword && !isLoopback(house.config.ORIGIN)) return null;
		const account = await accountByEmail(scope, input.email);
		const right = await verifyPassword(account?.passwordHash ?? null, input.password);
		return account && right ? { accountId: account.id, name: account.name } : null;
	}
});

const tryWasRight = writeCase({
	name: 'sign-in-was-right',
	action: 'session:ask',
	where: 'common',
	input: z.object({ email: emailAddress, ...tryOrigin }),
	subject: () => Promise.resolve({}),
	async run({ scope, house, input }) {
		const [address, own] = await bucketsOf(scope, house, input.email, input, 'password');
		if (address) await giveTurnBack(scope, address.name, address.rule);
		if (own) await forgetTries(scope, own.name);
	}
});

/**
 * One try with a password, whichever page it comes from.
 * @returns the account, whose session the edge then opens
 * @throws Problem 'too-many' during a wait; 'input' where address or password is wrong, in the
 * same words for both
 */
export async function tryPassword(
	caller: Caller,
	given: { email: string; password: string } & TryOrigin
): Promise<{ accountId: string; name: string }> {
	const { email, address, deviceHash } = given;
	await beginTry(caller, { email, address, deviceHash });
	const found = await checkPassword(caller, { email, password: given.password });
	if (!found) throw new Problem('input', 'The e-mail address or the password is not right.');
	await tryWasRight(caller, { email, address, deviceHash });
	return found;
}
