import { z } from 'zod';
import { addressBlock } from '$lib/domain/accounts/address-block';
import { deviceWords } from '$lib/domain/accounts/device-words';
import { lifetimes } from '$lib/domain/accounts/lifetimes';
import { Problem } from '$lib/domain/problem';
import { knownDevices, sessions } from '../../data/models';
import { accountById } from '../../data/queries/accounts';
import { tokenHash } from '../../data/queries/tokens';
import { find, insert, remove, update } from '../../data/rows';
import { acrossSchools, type CommonScope } from '../../data/scope';
import { writeCase } from '../use-case';

export const sessionHeldForMs = lifetimes.sessionDays * 24 * 3600 * 1000;

/**
 * Opens a session for somebody whom the edge has just recognised; only the server itself asks.
 * The cookie's token is new each time and kept as a hash; the session that the browser held
 * before, if any, ends.
 */
export const openSession = writeCase({
	name: 'open-session',
	action: 'session:open',
	where: 'common',
	input: z.object({
		accountId: z.string(),
		token: z.string().min(40),
		tokenBefore: z.string().max(500).nullable().default(null),
		userAgent: z.string().nullable(),
		address: z.string(),
		deviceHash: z.string().nullable()
	}),
	subject: () => Promise.resolve({}),
	async run({ scope, input, at, newId, house, mail }) {
		const { accountId, deviceHash } = input;
		const common = acrossSchools(scope);
		const account = await accountById(scope, accountId);
		if (!account) throw new Problem('absent', 'There is no such account.');
		const now = at.toISOString();
		await remove(common, sessions, { accountId, expiresAt: { atMost: now } });
		if (input.tokenBefore)
			await remove(common, sessions, { tokenHash: tokenHash(input.tokenBefore) });
		const device = deviceWords(input.userAgent);
		const sessionId = newId();
		const expiresAt = new Date(at.getTime() + sessionHeldForMs).toISOString();
		await insert(common, sessions, {
			id: sessionId,
			accountId,
			tokenHash: tokenHash(input.token),
			device,
			address: addressBlock(input.address),
			createdAt: now,
			seenAt: now,
			expiresAt
		});
		const isStranger =
			deviceHash !== null && (await meetDevice(common, accountId, deviceHash, now));
		if (isStranger)
			await mail({
				kind: 'new-sign-in',
				to: account.email,
				payload: {
					name: account.name,
					device,
					at: now,
					address: `${house.config.ORIGIN}/account`
				}
			});
		return { sessionId, expiresAt };
	}
});

/** @returns whether this is a new device of an account that was used on another before */
async function meetDevice(
	scope: CommonScope,
	accountId: string,
	deviceHash: string,
	seenAt: string
): Promise<boolean> {
	const met = await update(scope, knownDevices, { accountId, deviceHash }, { seenAt });
	if (met > 0) return false;
	const other = await find(scope, knownDevices, { accountId });
	await insert(scope, knownDevices, { accountId, deviceHash, seenAt });
	return other !== undefined;
}
