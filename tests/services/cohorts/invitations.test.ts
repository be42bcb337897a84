import { afterEach, beforeEach, expect, it } from 'vitest';
import type { Actor } from '$lib/domain/actor';
import { accounts, enrolments, people, tokens } from '$lib/server/data/models';
import { count, find, select } from '$lib/server/data/rows';
import { within } from '$lib/server/data/scope';
import { acceptInvitation } from '$lib/server/services/cohorts/accept-invitation';
import { recordPayment } from '$lib/server/services/cohorts/buy-places';
import { invitationHeldForDays } from '$lib/server/services/cohorts/invite-waiting';
import { applyCohortRoster } from '$lib/server/services/cohorts/plan-roster';
import { readInvitation } from '$lib/server/services/cohorts/read-invitation';
import { callerAs, type TestPerson } from '../../support/house';
import { openOffice, type Office } from './office';

let office: Office;
beforeEach(async () => {
	office = await openOffice();
});
afterEach(() => office.close());

const anna = 'anna@quay.example';
const password = 'a few plain words';
async function invite(email: string, name = 'Anna Strand'): Promise<string> {
	const caller = await office.admin.caller();
	const { cohortId } = office;
	const how = { method: 'bank-transfer', reference: 'BT-1' };
	await recordPayment(caller, { cohortId, quantity: 1, ...how });
	await applyCohortRoster(caller, { cohortId, list: `${name},${email},Q-1` });
	return office.tokenOf(email);
}
const nobody = () => callerAs(office.house);
/** On a page outside every school, signed in. */
async function signedIn(person: TestPerson) {
	const { actor } = await person.caller();
	return callerAs(office.house, actor as Actor);
}
const enrolled = () => count(office.house.look, enrolments);

it('a new person sets a password and is in, as a student, in the paid place', async () => {
	const token = await invite(anna);
	expect(await readInvitation(nobody(), { token })).toMatchObject({
		email: anna,
		schoolName: 'averholm',
		cohortTitle: 'Spring',
		next: 'new-password'
	});
	const answer = await acceptInvitation(nobody(), { token, password });
	expect(answer).toMatchObject({ isNew: true, schoolSlug: 'averholm' });
	const account = await find(office.house.look, accounts, { email: anna });
	expect(account).toMatchObject({ id: answer.accountId, name: 'Anna Strand' });
	expect(account?.emailVerifiedAt).not.toBeNull();
	expect(account?.passwordHash).not.toContain(password);
	expect(await office.roster()).toEqual([`${anna} enrolled`]);
	const person = await find(office.house.look, people, { accountId: answer.accountId });
	expect(person?.studentNumber).toBe('Q-1');
	const [enrolment] = await select(office.house.look, enrolments);
	expect(enrolment).toMatchObject({ personId: person?.id, cohortId: office.cohortId });
});

it('opening the page uses nothing up, and no password means no place', async () => {
	const token = await invite(anna);
	for (let n = 0; n < 3; n++) await readInvitation(nobody(), { token });
	await expect(acceptInvitation(nobody(), { token })).rejects.toMatchObject({
		fields: { password: ['Choose a password.'] }
	});
	await expect(acceptInvitation(nobody(), { token, password: 'short' })).rejects.toMatchObject({
		code: 'input'
	});
	expect(await count(office.house.look, accounts, { email: anna })).toBe(0);
	await acceptInvitation(nobody(), { token, password });
	expect(await enrolled()).toBe(1);
});

it('a link is used once, also by two presses at the same time', async () => {
	const token = await invite(anna);
	const both = await Promise.allSettled([
		acceptInvitation(nobody(), { token, password }),
		acceptInvitation(nobody(), { token, password: 'another few plain words' })
	]);
	expect(both.map((one) => one.status).toSorted()).toEqual(['fulfilled', 'rejected']);
	await expect(acceptInvitation(nobody(), { token, password })).rejects.toThrow();
	expect(await enrolled()).toBe(1);
	expect(await count(office.house.look, accounts, { email: anna })).toBe(1);
});

it('a link stands for two weeks, and then no more', async () => {
	const token = await invite(anna);
	const dayMs = 24 * 3600 * 1000;
	office.house.passMs(invitationHeldForDays * dayMs - 1);
	expect(await readInvitation(nobody(), { token })).toMatchObject({ email: anna });
	office.house.passMs(1);
	await expect(readInvitation(nobody(), { token })).rejects.toMatchObject({ code: 'signed-out' });
	await expect(acceptInvitation(nobody(), { token, password })).rejects.toThrow();
	expect(await enrolled()).toBe(0);
});

it('an account that exists is never changed by a link: its owner signs in and accepts', async () => {
	const holder = await office.house.addPerson(office.otherSchool, 'Ines Gallowan', ['student']);
	const before = await find(office.house.look, accounts, { id: holder.accountId });
	const token = await invite(holder.email, 'Somebody Else');
	expect(await readInvitation(nobody(), { token })).toMatchObject({ next: 'sign-in' });
	await expect(acceptInvitation(nobody(), { token, password })).rejects.toMatchObject({
		code: 'signed-out'
	});
	// Being signed in as somebody else is no better.
	await expect(
		acceptInvitation(await signedIn(office.instructor), { token, password })
	).rejects.toMatchObject({ code: 'signed-out' });
	expect(await enrolled()).toBe(0);

	const owner = await signedIn(holder);
	expect(await readInvitation(owner, { token })).toMatchObject({ next: 'accept' });
	const answer = await acceptInvitation(owner, { token });
	expect(answer).toMatchObject({ accountId: holder.accountId, isNew: false });
	expect(await find(office.house.look, accounts, { id: holder.accountId })).toEqual(before);
	expect(await enrolled()).toBe(1);
});

it('somebody who is in the school already stays one person, and keeps the roles', async () => {
	const { instructor } = office;
	const token = await invite(instructor.email, 'Marit Oyelaran');
	await acceptInvitation(await signedIn(instructor), { token });
	const inSchool = within(office.house.look, office.school);
	expect(await count(inSchool, people, { accountId: instructor.accountId })).toBe(1);
	const { actor } = await instructor.caller();
	const roles = actor.kind === 'account' ? actor.memberships[0]?.roles : undefined;
	expect(roles?.toSorted()).toEqual(['instructor', 'student']);
});

it('only a hash of the link is kept', async () => {
	const token = await invite(anna);
	const kept = await select(office.house.look, tokens);
	expect(kept).toHaveLength(1);
	expect(JSON.stringify(kept)).not.toContain(token);
	await expect(readInvitation(nobody(), { token: `${token}x` })).rejects.toThrow();
});
