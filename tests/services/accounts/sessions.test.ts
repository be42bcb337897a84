import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { Actor } from '$lib/domain/actor';
import { mails, sessions, tokens } from '$lib/server/data/models';
import { count, insert, select } from '$lib/server/data/rows';
import {
	endOneSession,
	endOtherSessions,
	endSessionWithToken
} from '$lib/server/services/accounts/end-sessions';
import { forgetExpired } from '$lib/server/services/accounts/forget-expired';
import { openSession, sessionHeldForMs } from '$lib/server/services/accounts/open-session';
import { readAccount } from '$lib/server/services/accounts/read-account';
import { noteSessionSeen, whoHoldsSession } from '$lib/server/services/accounts/who-asks';
import {
	asSystem,
	callerAs,
	makeHouse,
	type TestHouse,
	type TestPerson
} from '../../support/house';

let house: TestHouse;
let ines: TestPerson;
beforeEach(async () => {
	house = await makeHouse();
	const school = await house.addSchool('averholm');
	ines = await house.addPerson(school, 'Ines Vartdal', ['student', 'verifier']);
});
afterEach(() => house.close());

const token = (name: string) => name.padEnd(43, '0');
const open = (name: string, more: Record<string, unknown> = {}) =>
	openSession(asSystem(house), {
		accountId: ines.accountId,
		token: token(name),
		userAgent: 'Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Gecko/20100101 Firefox/140.0',
		address: '2001:db8::17',
		deviceHash: null,
		...more
	});
async function who(name: string): Promise<Actor> {
	return (await whoHoldsSession(callerAs(house), { token: token(name) })).actor;
}
const as = async (name: string) => callerAs(house, await who(name));

describe('a session', () => {
	it('says who asks, with every role in every school', async () => {
		const korrig = await house.addSchool('korrig');
		await house.addPerson(korrig, 'Ines Vartdal', ['instructor']);
		await open('phone');
		const actor = await who('phone');
		if (actor.kind !== 'account') throw new Error('nobody');
		expect(actor).toMatchObject({ accountId: ines.accountId, email: ines.email });
		expect(actor.memberships.map((one) => [one.schoolSlug, [...one.roles].sort()])).toEqual([
			['averholm', ['student', 'verifier']],
			['korrig', ['instructor']]
		]);
	});

	it('is kept without its token', async () => {
		await open('phone');
		const rows = await select(house.look, sessions);
		expect(JSON.stringify(rows)).not.toContain(token('phone'));
		expect(rows).toMatchObject([{ device: 'Firefox on Linux', address: '2001:db8:0:0::/64' }]);
	});

	it('ends after thirty days', async () => {
		await open('phone');
		house.passMs(sessionHeldForMs - 1);
		expect((await who('phone')).kind).toBe('account');
		house.passMs(1);
		expect((await who('phone')).kind).toBe('anyone');
	});

	it('ends when the same browser signs in again', async () => {
		await open('first');
		await open('second', { tokenBefore: token('first') });
		expect((await who('first')).kind).toBe('anyone');
		expect((await who('second')).kind).toBe('account');
	});

	it('ends at once when it is signed out, by itself or from another device', async () => {
		await open('phone');
		await open('desk');
		await endSessionWithToken(callerAs(house), { token: token('phone') });
		expect((await who('phone')).kind).toBe('anyone');
		await open('phone-again');
		const { sessions: listed } = await readAccount(await as('desk'), {});
		expect(listed.map((one) => one.isThis).sort()).toEqual([false, true]);
		const other = listed.find((one) => !one.isThis);
		await endOneSession(await as('desk'), { sessionId: other?.id });
		expect((await who('phone-again')).kind).toBe('anyone');
		expect((await who('desk')).kind).toBe('account');
	});

	it('that has ended is cleared away, one that stands is not', async () => {
		await open('phone');
		house.passMs(sessionHeldForMs);
		await open('desk');
		await house.lay((scope) => {
			const row = { purpose: 'sign-in' as const, identifier: 'x', createdAt: '2026' };
			return insert(scope, tokens, { ...row, tokenHash: 'x', expiresAt: '2026-03-03' });
		});
		await forgetExpired(asSystem(house), {});
		expect(await count(house.look, sessions)).toBe(1);
		expect(await count(house.look, tokens)).toBe(0);
		expect((await who('desk')).kind).toBe('account');
	});

	it('of somebody else cannot be ended', async () => {
		const school = await house.addSchool('korrig');
		const other = await house.addPerson(school, 'Otso Brandt', ['admin']);
		await open('phone');
		await open('desk', { accountId: other.accountId });
		const [hers] = await select(house.look, sessions, { accountId: ines.accountId });
		await expect(endOneSession(await as('desk'), { sessionId: hers?.id })).rejects.toMatchObject({
			code: 'absent'
		});
		expect((await who('phone')).kind).toBe('account');
	});

	it('ends with all others but this one when asked', async () => {
		for (const name of ['phone', 'tablet', 'desk']) await open(name);
		expect(await endOtherSessions(await as('desk'), {})).toEqual({ ended: 2 });
		expect((await who('phone')).kind).toBe('anyone');
		expect((await who('desk')).kind).toBe('account');
	});

	it('shows when it was used last, and nothing that opens it', async () => {
		await open('phone');
		house.passMs(3_600_000);
		await noteSessionSeen(await as('phone'), {});
		const account = await readAccount(await as('phone'), {});
		expect(account.sessions).toMatchObject([
			{ seenAt: '2026-03-02T09:00:00.000Z', createdAt: '2026-03-02T08:00:00.000Z' }
		]);
		expect(JSON.stringify(account)).not.toMatch(/hash|argon2/i);
	});

	it('is opened by the server only', async () => {
		const wanted = { accountId: ines.accountId, token: token('x') };
		const rest = { userAgent: null, address: '192.0.2.1', deviceHash: null };
		for (const caller of [callerAs(house), await ines.caller()])
			await expect(openSession(caller, { ...wanted, ...rest })).rejects.toMatchObject({
				name: 'Problem'
			});
		expect(await count(house.look, sessions)).toBe(0);
	});
});

describe('a device', () => {
	it('that is the first is no news; another one is told by letter', async () => {
		await open('phone', { deviceHash: 'phone' });
		await open('phone-again', { deviceHash: 'phone' });
		expect(await count(house.look, mails)).toBe(0);
		await open('desk', { deviceHash: 'desk' });
		expect(await select(house.look, mails)).toMatchObject([
			{ kind: 'new-sign-in', recipient: ines.email, payload: { device: 'Firefox on Linux' } }
		]);
	});
});
