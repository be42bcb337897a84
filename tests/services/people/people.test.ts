import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { lifetimes } from '$lib/domain/accounts/lifetimes';
import { scopesInPolicy, scriptScopes } from '$lib/domain/access/script-scopes';
import { accounts, ledgerEntries, mails, people, sessions } from '$lib/server/data/models';
import { membershipsOf } from '$lib/server/data/queries/schools';
import { count, insert, select } from '$lib/server/data/rows';
import { whoHoldsApiToken } from '$lib/server/services/accounts/who-asks';
import { acceptRole, readRoleInvitation } from '$lib/server/services/people/accept-role';
import { createApiToken, withdrawApiToken } from '$lib/server/services/people/api-tokens';
import { changeRoles } from '$lib/server/services/people/change-roles';
import { inviteToRole, withdrawRoleInvitation } from '$lib/server/services/people/invite-to-role';
import { readPeople } from '$lib/server/services/people/read-people';
import { setExtraTime } from '$lib/server/services/people/set-extra-time';
import { callerAs, makeHouse, type TestHouse, type TestPerson } from '../../support/house';

let house: TestHouse;
let school: string;
let admin: TestPerson;
let marit: TestPerson;
beforeEach(async () => {
	house = await makeHouse();
	school = await house.addSchool('averholm');
	admin = await house.addPerson(school, 'Ragna Holt', ['admin']);
	marit = await house.addPerson(school, 'Marit Oyelaran', ['instructor']);
});
afterEach(() => house.close());

const rolesOf = async (person: TestPerson) =>
	(await membershipsOf(house.look, person.accountId)).flatMap((one) => [...one.roles]).sort();
const openSession = (person: TestPerson, id: string) =>
	house.lay((scope) =>
		insert(scope, sessions, {
			id,
			accountId: person.accountId,
			tokenHash: id,
			device: '',
			address: '',
			createdAt: '2026',
			seenAt: '2026',
			expiresAt: '2027'
		})
	);

describe('roles', () => {
	it('are given and withdrawn as ticked, stand in the ledger, and end the sessions', async () => {
		await openSession(marit, 'desk');
		const wanted = { personId: marit.personId, roles: ['verifier', 'student'] };
		await changeRoles(await admin.caller(), wanted);
		expect(await rolesOf(marit)).toEqual(['student', 'verifier']);
		expect(await count(house.look, sessions)).toBe(0);
		expect(await select(house.look, ledgerEntries)).toMatchObject([
			{
				kind: 'roles-changed',
				actorId: admin.personId,
				subject: marit.personId,
				data: { given: ['verifier', 'student'], taken: ['instructor'] }
			}
		]);
	});

	it('that stay as they are end nothing', async () => {
		await openSession(marit, 'desk');
		await changeRoles(await admin.caller(), { personId: marit.personId, roles: ['instructor'] });
		expect(await count(house.look, sessions)).toBe(1);
		expect(await count(house.look, ledgerEntries)).toBe(0);
	});

	it('of the last admin stay', async () => {
		const off = async () =>
			changeRoles(await admin.caller(), { personId: admin.personId, roles: ['verifier'] });
		await expect(off()).rejects.toMatchObject({ code: 'conflict' });
		expect(await rolesOf(admin)).toEqual(['admin']);
		await changeRoles(await admin.caller(), { personId: marit.personId, roles: ['admin'] });
		await off();
		expect(await rolesOf(admin)).toEqual(['verifier']);
	});

	it('of two last admins who step back at once, one stays', async () => {
		await changeRoles(await admin.caller(), { personId: marit.personId, roles: ['admin'] });
		const both = await Promise.allSettled([
			changeRoles(await admin.caller(), { personId: admin.personId, roles: [] }),
			changeRoles(await marit.caller(), { personId: marit.personId, roles: [] })
		]);
		expect(both.filter((one) => one.status === 'fulfilled')).toHaveLength(1);
	});

	it('are changed by an admin of that school only', async () => {
		const korrig = await house.addSchool('korrig');
		const stranger = await house.addPerson(korrig, 'Otso Brandt', ['admin']);
		const wanted = { personId: marit.personId, roles: ['admin'] };
		const elsewhere = { ...(await stranger.caller()), schoolId: school };
		for (const caller of [await marit.caller(), await stranger.caller(), elsewhere])
			await expect(changeRoles(caller, wanted)).rejects.toMatchObject({ code: 'absent' });
		expect(await rolesOf(marit)).toEqual(['instructor']);
	});
});

describe('the page of people', () => {
	it('lists everybody of this school with roles and extra time, and nobody else', async () => {
		const korrig = await house.addSchool('korrig');
		await house.addPerson(korrig, 'Otso Brandt', ['admin']);
		await setExtraTime(await admin.caller(), { personId: marit.personId, extraTimePercent: '25' });
		const page = await readPeople(await admin.caller(), {});
		expect(page.people).toMatchObject([
			{ name: 'Marit Oyelaran', roles: ['instructor'], extraTimePercent: 25, isMe: false },
			{ name: 'Ragna Holt', roles: ['admin'], extraTimePercent: 0, isMe: true }
		]);
	});

	it.each(['-1', '301', '12.5', 'a lot'])('refuses %s percent', async (extraTimePercent) => {
		const wanted = { personId: marit.personId, extraTimePercent };
		await expect(setExtraTime(await admin.caller(), wanted)).rejects.toMatchObject({
			code: 'input',
			fields: { extraTimePercent: [expect.any(String)] }
		});
	});
});

describe('a token for scripts', () => {
	it('opens what it was made for until it is withdrawn, and is kept as a hash', async () => {
		const wanted = { name: 'Register export', scopes: ['progress'] };
		const { id, bearer } = await createApiToken(await admin.caller(), wanted);
		expect(await whoHoldsApiToken(callerAs(house), { token: bearer })).toEqual({
			actor: { kind: 'script', tokenId: id, schoolId: school, scopes: ['progress'] },
			lastUsedAt: null
		});
		const [rows] = await house.database.sequelize.query('SELECT * FROM api_tokens');
		expect(JSON.stringify(rows)).not.toContain(bearer);
		expect(JSON.stringify(await readPeople(await admin.caller(), {}))).not.toContain(bearer);
		await withdrawApiToken(await admin.caller(), { id });
		await expect(whoHoldsApiToken(callerAs(house), { token: bearer })).rejects.toMatchObject({
			code: 'signed-out'
		});
	});

	it('can be allowed exactly what the policy knows', () => {
		expect([...scriptScopes].sort()).toEqual(scopesInPolicy());
	});
});

describe('an invitation to work in the school', () => {
	const invite = async (email: string) =>
		inviteToRole(await admin.caller(), {
			email,
			name: 'Teodor Lunde',
			roles: ['instructor', 'verifier']
		});
	const linkFor = async (email: string) =>
		(await house.linksOfLetter(email)).links.link?.split('/').at(-1) ?? '';

	it('makes nothing until it is accepted, then account, person and roles', async () => {
		await invite('Teodor@school.example');
		const email = 'teodor@school.example';
		expect(await count(house.look, accounts)).toBe(2);
		const token = await linkFor(email);
		expect(await readRoleInvitation(callerAs(house), { token })).toMatchObject({
			email,
			roleWords: 'instructor and verifier',
			next: 'new-password'
		});
		await expect(acceptRole(callerAs(house), { token })).rejects.toMatchObject({ code: 'input' });
		const password = 'a long bench password';
		const made = await acceptRole(callerAs(house), { token, password });
		expect(made).toMatchObject({ isNew: true, schoolSlug: 'averholm' });
		const [membership] = await membershipsOf(house.look, made.accountId);
		expect([...(membership?.roles ?? [])].sort()).toEqual(['instructor', 'verifier']);
		await expect(acceptRole(callerAs(house), { token, password })).rejects.toMatchObject({
			name: 'Problem'
		});
	});

	it('never changes an account that exists: its owner signs in and accepts', async () => {
		const korrig = await house.addSchool('korrig');
		const otso = await house.addPerson(korrig, 'Otso Brandt', ['admin']);
		await invite(otso.email);
		const token = await linkFor(otso.email);
		const before = await select(house.look, accounts);
		const password = 'a password of a thief';
		for (const caller of [callerAs(house), await marit.caller()])
			await expect(acceptRole(caller, { token, password })).rejects.toMatchObject({
				code: 'signed-out'
			});
		await acceptRole(await otso.caller(), { token });
		expect(await select(house.look, accounts)).toEqual(before);
		expect(await rolesOf(otso)).toEqual(['admin', 'instructor', 'verifier']);
	});

	it('is accepted once when two come at once', async () => {
		await invite('teodor@school.example');
		const wanted = { token: await linkFor('teodor@school.example'), password: 'a long password' };
		const both = await Promise.allSettled([
			acceptRole(callerAs(house), wanted),
			acceptRole(callerAs(house), wanted)
		]);
		expect(both.map((one) => one.status).sort()).toEqual(['fulfilled', 'rejected']);
		expect(await count(house.look, people)).toBe(3);
	});

	it('ends when withdrawn, when sent again, and after two weeks', async () => {
		const email = 'teodor@school.example';
		const { id } = await invite(email);
		const first = await linkFor(email);
		house.passMs(1);
		await invite(email);
		const second = await linkFor(email);
		expect(second).not.toBe(first);
		const stands = async (token: string) =>
			(await readRoleInvitation(callerAs(house), { token }).catch(() => null)) !== null;
		expect([await stands(first), await stands(second)]).toEqual([false, true]);
		await withdrawRoleInvitation(await admin.caller(), { id });
		expect(await stands(second)).toBe(false);
		house.passMs(1);
		await invite(email);
		const third = await linkFor(email);
		house.passMs(lifetimes.roleInvitationDays * 24 * 3600 * 1000);
		expect(await stands(third)).toBe(false);
		expect(await count(house.look, mails)).toBe(3);
	});

	it('is not for somebody who is here already', async () => {
		await expect(invite(marit.email)).rejects.toMatchObject({
			code: 'input',
			fields: { email: [expect.any(String)] }
		});
	});
});
