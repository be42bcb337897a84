import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { demoPassword } from '$lib/domain/accounts/demo-password';
import { knownDevices, mails, signInAttempts } from '$lib/server/data/models';
import { count, insert } from '$lib/server/data/rows';
import { tryPassword } from '$lib/server/services/accounts/sign-in';
import {
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

const from = { address: '192.0.2.1', deviceHash: null as string | null };
const tryIt = (given: Partial<Parameters<typeof tryPassword>[1]> = {}) =>
	tryPassword(callerAs(house), { email: ines.email, password, ...from, ...given });
const tryWrong = (given: Parameters<typeof tryIt>[0] = {}) =>
	tryIt({ password: 'not this one at all', ...given }).then(
		() => 'in',
		(problem: { code: string; words: string; parameters: { wait?: string } }) =>
			`${problem.code} ${problem.parameters.wait ?? ''}`.trim()
	);

describe('a sign-in with a password', () => {
	it('takes the right one, however the address is written', async () => {
		expect(await tryIt({ email: ` ${ines.email.toUpperCase()} ` })).toEqual({
			accountId: ines.accountId,
			name: 'Ines Vartdal'
		});
	});

	it('says the same of a wrong password and of an address that nobody has', async () => {
		const wrong = await tryIt({ password: 'not this one at all' }).catch((one: unknown) => one);
		const nobody = await tryIt({ email: 'nobody@school.example' }).catch((one: unknown) => one);
		expect(wrong).toMatchObject({ code: 'input' });
		expect(nobody).toEqual(wrong);
	});

	it('waits longer each time after five wrong ones, and says how long', async () => {
		for (let i = 0; i < 5; i++) expect(await tryWrong()).toBe('input');
		expect(await tryWrong()).toBe('too-many 30 seconds');
		await expect(tryIt()).rejects.toMatchObject({ code: 'too-many' });
		house.passMs(30_000);
		expect(await tryWrong()).toBe('input');
		expect(await tryWrong()).toBe('too-many 60 seconds');
		house.passMs(60_000);
		expect(await tryIt()).toMatchObject({ accountId: ines.accountId });
		expect(await tryWrong(), 'a right one begins the count anew').toBe('input');
	});

	it('holds up an address without an account just the same', async () => {
		const email = 'nobody@school.example';
		for (let i = 0; i < 5; i++) expect(await tryWrong({ email })).toBe('input');
		expect(await tryWrong({ email })).toBe('too-many 30 seconds');
		expect(await tryIt(), 'others are not held up').toBeTruthy();
	});

	it('counts tries that come at once like tries in turn', async () => {
		const answers = await Promise.all(Array.from({ length: 12 }, () => tryWrong()));
		expect(answers.filter((one) => one === 'input')).toHaveLength(5);
		expect(answers.filter((one) => one === 'too-many 30 seconds')).toHaveLength(7);
	});

	it('counts a network over all accounts, an IPv6 one by its first 64 bits', async () => {
		const address = (i: number) => `2001:db8:0:7::${(i + 1).toString(16)}`;
		const answers: string[] = [];
		for (let i = 0; i < 61; i++)
			answers.push(await tryWrong({ email: `x${i}@school.example`, address: address(i) }));
		expect(answers.slice(0, 60).every((one) => one === 'input')).toBe(true);
		expect(answers[60]).toBe('too-many 10 seconds');
		expect(await tryWrong({ email: 'y@school.example', address: '2001:db8:0:8::1' })).toBe('input');
	}, 30_000);

	it('gives right tries back to the network: a class may sign in from one room', async () => {
		for (let i = 0; i < 65; i++) await tryIt();
		expect(await tryWrong()).toBe('input');
	}, 30_000);

	it('does not hold a known device up for what strangers tried', async () => {
		const deviceHash = 'a device of hers';
		await house.lay((scope) =>
			insert(scope, knownDevices, {
				accountId: ines.accountId,
				deviceHash,
				seenAt: house.now().toISOString()
			})
		);
		for (let i = 0; i < 6; i++) await tryWrong();
		expect(await tryWrong()).toBe('too-many 30 seconds');
		expect(await tryWrong({ deviceHash: 'a device of a stranger' })).toBe('too-many 30 seconds');
		expect(await tryIt({ deviceHash })).toMatchObject({ accountId: ines.accountId });
		for (let i = 0; i < 5; i++) expect(await tryWrong({ deviceHash })).toBe('input');
		expect(await tryWrong({ deviceHash }), 'the device waits for its own').toMatch('too-many');
	});

	it('keeps no address in the list of tries', async () => {
		await tryWrong({ email: 'nobody@school.example' });
		const [rows] = await house.database.sequelize.query('SELECT * FROM sign_in_attempts');
		expect(JSON.stringify(rows)).not.toMatch(/nobody|192\.0\.2/);
		expect(await count(house.look, signInAttempts)).toBe(2);
		expect(await count(house.look, mails)).toBe(0);
	});
});

describe('the demo password', () => {
	it.each([
		['http://127.0.0.1:4180', true],
		['http://localhost:4180', true],
		['https://ringland.school.example', false]
	])('under %s opens: %s', async (ORIGIN, opens) => {
		const other = await makeHouse({ environment: { ORIGIN } });
		try {
			const { hashPassword } = await import('$lib/server/gateways/passwords/passwords');
			const person = await other.addPerson(await other.addSchool('averholm'), 'Demo', ['student']);
			const passwordHash = await hashPassword(demoPassword);
			await other.database.sequelize.query('UPDATE accounts SET passwordHash = :passwordHash', {
				replacements: { passwordHash }
			});
			const given = { email: person.email, password: demoPassword, ...from };
			const answer = await tryPassword(callerAs(other), given).catch(() => null);
			expect(answer !== null).toBe(opens);
		} finally {
			await other.close();
		}
	});
});
