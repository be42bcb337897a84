import { z } from 'zod';
import { addressBlock } from '$lib/domain/accounts/address-block';
import { waitRules, waitWords, type WaitRule } from '$lib/domain/accounts/sign-in-waits';
import { Problem } from '$lib/domain/problem';
import { knownDevices } from '../../data/models';
import { takeTurn } from '../../data/queries/sign-in-tries';
import { accountByEmail } from '../../data/queries/accounts';
import { find } from '../../data/rows';
import { acrossSchools, type Scope } from '../../data/scope';
import { hmacHex } from '../../gateways/signing';
import type { House } from '../house';

/** Where a try comes from, as the edge knows it. */
export const tryOrigin = {
	address: z.string().max(100),
	/** Of a device mark that this server signed; never taken from a form. */
	deviceHash: z.string().max(100).nullable().default(null)
};
export type TryOrigin = { address: string; deviceHash: string | null };

export type Bucket = { name: string; rule: WaitRule; words: string };

const accountWords = 'There were too many tries for this account. Wait {wait}, then try again.';
const addressWords = 'There were too many tries from this network. Wait {wait}, then try again.';

/**
 * What a try is counted in: the account, or the device instead where the account knows it, and
 * the network. Names are keyed hashes: the table tells nobody which addresses were tried, and
 * an address without an account waits like one with.
 */
export async function bucketsOf(
	scope: Scope,
	house: House,
	email: string,
	origin: TryOrigin,
	of: 'password' | 'letter'
): Promise<Bucket[]> {
	const key = house.gateways.signing.keyFor('sign-in-waits');
	const name = (kind: string, text: string) => `${of}:${kind}:${hmacHex(key, text)}`;
	const known = await isKnownDevice(scope, email, origin.deviceHash);
	const own = of === 'letter' ? waitRules.letter : waitRules[known ? 'device' : 'account'];
	return [
		addressBucket(house, origin.address, of),
		known
			? { name: name('device', `${email} ${origin.deviceHash}`), rule: own, words: accountWords }
			: { name: name('account', email), rule: own, words: accountWords }
	];
}

export function addressBucket(house: House, address: string, of: string): Bucket {
	const key = house.gateways.signing.keyFor('sign-in-waits');
	const name = `${of}:address:${hmacHex(key, addressBlock(address))}`;
	return { name, rule: waitRules.address, words: addressWords };
}

/** @throws Problem 'too-many' with the wait in words; then nothing was counted */
export async function countTry(scope: Scope, buckets: readonly Bucket[], at: Date): Promise<void> {
	for (const bucket of buckets) {
		const turn = await takeTurn(scope, bucket.name, bucket.rule, at);
		if (turn.kind === 'wait') {
			const wait = waitWords(turn.until.getTime() - at.getTime());
			throw new Problem('too-many', bucket.words, { wait, until: turn.until });
		}
	}
}

export async function isKnownDevice(
	scope: Scope,
	email: string,
	deviceHash: string | null
): Promise<boolean> {
	if (deviceHash === null) return false;
	const account = await accountByEmail(scope, email);
	if (!account) return false;
	const held = { accountId: account.id, deviceHash };
	return (await find(acrossSchools(scope), knownDevices, held)) !== undefined;
}
