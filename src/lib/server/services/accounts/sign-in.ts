import { z } from 'zod';
import { addressBucket, forgottenAfterMs, waitMs } from '$lib/domain/accounts/wait';
import { Problem } from '$lib/domain/problem';
import {
	accountByEmail,
	attempts,
	forgetAttempts,
	isKnownDevice,
	keepAttempts
} from '../../data/queries/accounts';
import type { Scope } from '../../data/scope';
import { verifyPassword } from '../../gateways/passwords/passwords';
import { commonScope } from '../../data/scope';
import { isLoopback } from '../../config/env';
import { writeCase } from '../use-case';

export const demoPassword = 'averholm-demo';

const where = { address: z.string(), device: z.string().nullable() };
export type SignInFrom = { address: string; device: string | null };

/** Throws while an account or an address has to wait. A known device is not held up by strangers. */
export async function demandNoWait(
	scope: Scope,
	asked: { accountKey: string | null; address: string; knownDevice: boolean },
	at: Date
): Promise<void> {
	const buckets = [`address:${addressBucket(asked.address)}`];
	if (asked.accountKey && !asked.knownDevice) buckets.push(`account:${asked.accountKey}`);
	for (const bucket of buckets) {
		const held = await attempts(scope, bucket);
		if (held?.waitUntil && held.waitUntil > at.toISOString())
			throw new Problem('too-many', 'Too many tries that failed. Try again after {until}.', {
				until: new Date(held.waitUntil)
			});
	}
}

/** Counts one failure against the account and the address; each failure makes the next wait longer. */
export const countFailure = writeCase({
	name: 'count-failure',
	action: 'site:read',
	where: 'common',
	input: z.object({ accountKey: z.string().nullable(), address: z.string() }),
	subject: () => Promise.resolve({}),
	async run({ scope, input, at }) {
		const buckets: ['address' | 'account', string][] = [
			['address', `address:${addressBucket(input.address)}`]
		];
		if (input.accountKey) buckets.push(['account', `account:${input.accountKey}`]);
		for (const [kind, bucket] of buckets) {
			const held = await attempts(scope, bucket);
			const stale = held && at.getTime() - Date.parse(held.lastAt) > forgottenAfterMs;
			const failures = (held && !stale ? held.failures : 0) + 1;
			const wait = waitMs(failures, kind);
			const waitUntil = wait > 0 ? new Date(at.getTime() + wait).toISOString() : null;
			await keepAttempts(scope, { bucket, failures, lastAt: at.toISOString(), waitUntil });
		}
		return { counted: true };
	}
});

/**
 * Checks an address and a password. An unknown address takes as long and says the same as a
 * wrong password. A failure is counted in a transaction of its own by the caller.
 */
export const checkPassword = writeCase({
	name: 'check-password',
	action: 'site:read',
	where: 'common',
	input: z.object({
		email: z.string().trim().toLowerCase().max(254),
		password: z.string().max(200),
		...where
	}),
	async prepare({ house, input, at }) {
		const scope = commonScope(house.database, null);
		const account = await accountByEmail(scope, input.email);
		const knownDevice = Boolean(
			account && input.device && (await isKnownDevice(scope, account.id, input.device))
		);
		const asked = { accountKey: input.email, address: input.address, knownDevice };
		await demandNoWait(scope, asked, at);
		const right = await verifyPassword(account?.passwordHash ?? null, input.password);
		const demo = input.password === demoPassword && !isLoopback(house.config.ORIGIN);
		return { account, ok: right && !demo, demo: right && demo };
	},
	subject: () => Promise.resolve({}),
	async run({ scope, input, prepared }) {
		if (prepared.demo)
			throw new Problem('input', 'Demo passwords work on this machine only. Set one of your own.');
		if (!prepared.ok || !prepared.account) return { accountId: null };
		await forgetAttempts(scope, `account:${input.email}`);
		return { accountId: prepared.account.id };
	}
});
