import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { jobs, mails, sessions, tokens } from '$lib/server/data/models';
import { tokenHash } from '$lib/server/data/queries/tokens';
import { count, select } from '$lib/server/data/rows';
import { askForLink } from '$lib/server/services/accounts/ask-for-link';
import { openSession } from '$lib/server/services/accounts/open-session';
import { sendAccountLink } from '$lib/server/services/accounts/send-account-link';
import {
	changePassword,
	readPasswordLink,
	resetPassword
} from '$lib/server/services/accounts/set-password';
import { tryPassword } from '$lib/server/services/accounts/sign-in';
import { readSignInLink, useSignInLink } from '$lib/server/services/accounts/use-sign-in-link';
import {
	asSystem,
	callerAs,
	makeHouse,
	password,
	type TestHouse,
	type TestPerson
} from '../../support/house';

let house: TestHouse;
let ines: TestPerson;
beforeEach(async () => {
	house = await makeHouse();
	ines = await house.addPerson(await house.addSchool('averholm'), 'Ines Vartdal', ['student']);
});
afterEach(() => house.close());

const from = { address: '192.0.2.1', deviceHash: null };
const ask = (purpose: 'sign-in' | 'password', email = ines.email) =>
	askForLink(callerAs(house), { email, purpose, ...from });
/** The token in the newest link, made by the job as the worker would make it. */
async function linkFor(purpose: 'sign-in' | 'password'): Promise<string> {
	await sendAccountLink(asSystem(house), { email: ines.email, purpose });
	const { links } = await house.linksOfLetter(ines.email);
	return links.link?.split('/').at(-1) ?? '';
}
const use = (token: string) => useSignInLink(asSystem(house), { tokenHash: tokenHash(token) });

describe('asking for a link', () => {
	it('leaves the same rows and answer for an address that nobody has', async () => {
		const answers = [await ask('sign-in'), await ask('sign-in', 'nobody@school.example')];
		expect(answers).toEqual([undefined, undefined]);
		const queued = await select(house.look, jobs);
		expect(queued.map((one) => [one.kind, one.state])).toEqual([
			['send-account-link', 'waiting'],
			['send-account-link', 'waiting']
		]);
		expect(await count(house.look, mails)).toBe(0);
	});

	it('sends a letter to who has an account, and makes none for who has not', async () => {
		await sendAccountLink(asSystem(house), { email: 'nobody@school.example', purpose: 'sign-in' });
		expect(await count(house.look, mails)).toBe(0);
		await sendAccountLink(asSystem(house), { email: ines.email, purpose: 'sign-in' });
		const { kind, links } = await house.linksOfLetter(ines.email);
		expect(kind).toBe('sign-in-link');
		expect(links.link).toMatch(/^http:\/\/127\.0\.0\.1:4180\/sign-in\/link\/[\w-]{43}$/);
	});

	it('is done by the worker that runs the jobs', async () => {
		await ask('password');
		await house.work();
		expect(await select(house.look, mails)).toMatchObject([
			{ kind: 'password-reset', recipient: ines.email }
		]);
	});

	it('keeps the token out of every table', async () => {
		const token = await linkFor('sign-in');
		const [tables] = await house.database.sequelize.query(
			"SELECT name FROM sqlite_master WHERE type = 'table'"
		);
		for (const { name } of tables as { name: string }[]) {
			const [rows] = await house.database.sequelize.query(`SELECT * FROM ${name}`);
			expect(JSON.stringify(rows), name).not.toContain(token);
		}
	});

	it('waits after three letters to one mailbox, known or not', async () => {
		for (const email of [ines.email, 'nobody@school.example']) {
			for (let i = 0; i < 3; i++) await ask('sign-in', email);
			await expect(ask('sign-in', email)).rejects.toMatchObject({
				code: 'too-many',
				parameters: { wait: '60 seconds' }
			});
		}
	});
});

describe('a link that signs in', () => {
	it('is looked at without being used, then used once', async () => {
		const token = await linkFor('sign-in');
		for (let i = 0; i < 3; i++)
			expect(await readSignInLink(callerAs(house), { token })).toEqual({ stands: true });
		expect(await use(token)).toEqual({ email: ines.email });
		expect(await use(token)).toBeNull();
		expect(await readSignInLink(callerAs(house), { token })).toEqual({ stands: false });
	});

	it('is used once also when many come at once', async () => {
		const token = await linkFor('sign-in');
		const answers = await Promise.all(Array.from({ length: 10 }, () => use(token)));
		expect(answers.filter(Boolean)).toHaveLength(1);
	});

	it('is too old after a quarter of an hour', async () => {
		const token = await linkFor('sign-in');
		house.passMs(15 * 60_000);
		expect(await use(token)).toBeNull();
	});

	it('ends when another is asked for, and cannot set a password', async () => {
		const first = await linkFor('sign-in');
		house.passMs(1);
		const second = await linkFor('sign-in');
		expect(await use(first)).toBeNull();
		const wanted = { token: second, password: 'another long password' };
		await expect(resetPassword(callerAs(house), wanted)).rejects.toMatchObject({ code: 'closed' });
		expect(await use(second)).toEqual({ email: ines.email });
	});
});

const open = (token: string) =>
	openSession(asSystem(house), {
		accountId: ines.accountId,
		token: token.padEnd(43, '0'),
		userAgent: null,
		...from
	});
const signIn = (given: string) =>
	tryPassword(callerAs(house), { email: ines.email, password: given, ...from });

describe('a password set by link', () => {
	it('replaces the old one, ends every session and every link, and is told by letter', async () => {
		await open('phone');
		await open('desk');
		await linkFor('sign-in');
		house.passMs(1);
		const token = await linkFor('password');
		expect(await readPasswordLink(callerAs(house), { token })).toEqual({ email: ines.email });
		house.passMs(1);
		await resetPassword(callerAs(house), { token, password: 'another long password' });
		expect(await count(house.look, sessions)).toBe(0);
		expect(await count(house.look, tokens)).toBe(0);
		await expect(signIn(password)).rejects.toMatchObject({ code: 'input' });
		expect(await signIn('another long password')).toMatchObject({ accountId: ines.accountId });
		const told = await select(house.look, mails, { kind: 'password-changed' });
		expect(told).toMatchObject([{ recipient: ines.email }]);
	});

	it('works once, also when two come at once', async () => {
		const token = await linkFor('password');
		const both = await Promise.allSettled(
			['the first long password', 'the second long password'].map((one) =>
				resetPassword(callerAs(house), { token, password: one })
			)
		);
		expect(both.map((one) => one.status).sort()).toEqual(['fulfilled', 'rejected']);
	});

	it('is refused when short or too late, and then changes nothing', async () => {
		const token = await linkFor('password');
		await expect(
			resetPassword(callerAs(house), { token, password: 'short' })
		).rejects.toMatchObject({
			code: 'input',
			fields: { password: [expect.stringContaining('12')] }
		});
		house.passMs(60 * 60_000);
		await expect(
			resetPassword(callerAs(house), { token, password: 'another long password' })
		).rejects.toMatchObject({ code: 'closed' });
		expect(await signIn(password)).toBeTruthy();
	});
});

describe('a password changed on the account page', () => {
	async function asInes(sessionId: string) {
		const caller = await ines.caller();
		if (caller.actor.kind !== 'account') throw new Error('nobody');
		return { ...caller, actor: { ...caller.actor, sessionId } };
	}

	it('wants the present one, keeps this session and ends the others', async () => {
		await open('phone');
		const { sessionId } = await open('desk');
		const wanted = { current: password, password: 'another long password' };
		expect(await changePassword(await asInes(sessionId), wanted, from)).toEqual({ ended: 1 });
		expect(await select(house.look, sessions)).toMatchObject([{ id: sessionId }]);
		expect(await signIn('another long password')).toBeTruthy();
	});

	it('cannot be guessed at faster than at sign-in', async () => {
		const wanted = { current: 'a wrong guess', password: 'another long password' };
		const caller = await asInes('desk');
		for (let i = 0; i < 5; i++)
			await expect(changePassword(caller, wanted, from)).rejects.toMatchObject({
				code: 'input',
				fields: { current: ['This is not your present password.'] }
			});
		await expect(changePassword(caller, wanted, from)).rejects.toMatchObject({ code: 'too-many' });
	});
});
