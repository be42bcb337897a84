import { afterEach, beforeEach, expect, it } from 'vitest';
import { mails, rosterEntries } from '$lib/server/data/models';
import { count, find } from '$lib/server/data/rows';
import { within } from '$lib/server/data/scope';
import { recordPayment } from '$lib/server/services/cohorts/buy-places';
import { inviteAgain, withdrawFromRoster } from '$lib/server/services/cohorts/change-roster';
import { applyCohortRoster, planCohortRoster } from '$lib/server/services/cohorts/plan-roster';
import { readInvitation } from '$lib/server/services/cohorts/read-invitation';
import { callerAs } from '../../support/house';
import { openOffice, type Office } from './office';

let office: Office;
beforeEach(async () => {
	office = await openOffice();
});
afterEach(() => office.close());

const three =
	'Anna Strand,anna@quay.example,Q-1\nPer Dalby,per@quay.example\nTeo Aas,teo@quay.example';
const as = async () => office.admin.caller();
const plan = async (list: string) =>
	planCohortRoster(await as(), { cohortId: office.cohortId, list });
const apply = async (list: string) =>
	applyCohortRoster(await as(), { cohortId: office.cohortId, list });
const pay = async (quantity: number) =>
	recordPayment(await as(), {
		cohortId: office.cohortId,
		quantity,
		method: 'bank-transfer',
		reference: 'BT-1'
	});
const entryOf = async (email: string) =>
	(await find(within(office.house.look, office.school), rosterEntries, { email }))?.id;
const invitations = () => count(office.house.look, mails, { kind: 'invitation' });

it('a dry run names every fault of every row and writes nothing', async () => {
	await pay(1);
	const { rows, counts } = await plan(
		'name,e-mail\nAnna Strand,anna@quay.example\n,per@quay\nTwice,ANNA@quay.example\nTeo,'
	);
	expect(rows.map((row) => [row.line, row.outcome, row.faults])).toEqual([
		[2, 'invite', []],
		[3, 'fault', ['The name is missing.', '“per@quay” is not an e-mail address.']],
		[4, 'fault', ['The same e-mail address stands in line 2.']],
		[5, 'fault', ['The e-mail address is missing.']]
	]);
	expect(counts).toEqual({ invite: 1, wait: 0, already: 0, fault: 3 });
	expect(await office.roster()).toEqual([]);
	expect(await invitations()).toBe(0);
});

it('a list with a fault is not written at all, whatever the page showed', async () => {
	await pay(3);
	await expect(apply(`${three}\nNo Mail,`)).rejects.toMatchObject({
		fields: { list: ['Line 4: The e-mail address is missing.'] }
	});
	expect(await office.roster()).toEqual([]);
});

it('a list longer than the paid places invites up to them, in its order; the rest wait', async () => {
	await pay(2);
	expect((await plan(three)).counts).toEqual({ invite: 2, wait: 1, already: 0, fault: 0 });
	expect(await apply(three)).toEqual({ added: 3, invited: 2, waiting: 1 });
	expect(await office.roster()).toEqual([
		'anna@quay.example invited',
		'per@quay.example invited',
		'teo@quay.example waiting'
	]);
	expect(await invitations()).toBe(2);
	// The next place goes to who waits, without another list.
	await pay(1);
	expect((await office.roster())[2]).toBe('teo@quay.example invited');
});

it('places go by the order of a long list', async () => {
	await pay(7);
	const emails = Array.from({ length: 40 }, (_, n) => `s${String(n).padStart(2, '0')}@q.example`);
	await apply(emails.map((email) => `Somebody,${email}`).join('\n'));
	expect(await office.roster()).toEqual(
		emails.map((email, n) => `${email} ${n < 7 ? 'invited' : 'waiting'}`)
	);
});

it('the same list again adds nobody and mails nobody', async () => {
	await pay(3);
	await apply(three);
	expect((await plan(three)).counts.already).toBe(3);
	expect(await apply(three)).toEqual({ added: 0, invited: 0, waiting: 0 });
	expect(await invitations()).toBe(3);
});

it('sent twice under one key it is written once', async () => {
	await pay(3);
	const caller = await office.admin.caller('01ARZ3NDEKTSV4RRFFQ69G5FAV');
	const asked = { cohortId: office.cohortId, list: three };
	const first = await applyCohortRoster(caller, asked);
	expect(await applyCohortRoster(caller, asked)).toEqual(first);
	expect(await invitations()).toBe(3);
});

it('who is taken off frees the place for who waits; the link ends; a later list may add them', async () => {
	await pay(2);
	await apply(three);
	const token = await office.tokenOf('anna@quay.example');
	const entryId = await entryOf('anna@quay.example');
	expect(await withdrawFromRoster(await as(), { entryId })).toEqual({ invited: 1 });
	expect(await office.roster()).toEqual([
		'anna@quay.example withdrawn',
		'per@quay.example invited',
		'teo@quay.example invited'
	]);
	const opened = readInvitation(callerAs(office.house), { token });
	await expect(opened).rejects.toMatchObject({ code: 'signed-out' });
	office.house.passMs(1000);
	expect(await apply('Anna Strand,anna@quay.example')).toEqual({
		added: 1,
		invited: 0,
		waiting: 1
	});
	expect((await office.roster()).at(-1)).toBe('anna@quay.example waiting');
});

it('an invitation sent again has a new link, and the old one ends', async () => {
	await pay(1);
	await apply('Anna Strand,anna@quay.example');
	const old = await office.tokenOf('anna@quay.example');
	office.house.passMs(60_000);
	await inviteAgain(await as(), { entryId: await entryOf('anna@quay.example') });
	const fresh = await office.tokenOf('anna@quay.example');
	expect(fresh).not.toBe(old);
	const nobody = callerAs(office.house);
	await expect(readInvitation(nobody, { token: old })).rejects.toThrow();
	expect(await readInvitation(nobody, { token: fresh })).toMatchObject({ next: 'new-password' });
});

it('an instructor, and the office of another school, find no roster to write', async () => {
	const elsewhere = await office.house.addPerson(office.otherSchool, 'Odd Vik', ['admin']);
	for (const caller of [await office.instructor.caller(), await elsewhere.caller()])
		await expect(
			applyCohortRoster(caller, { cohortId: office.cohortId, list: three })
		).rejects.toMatchObject({ code: 'absent' });
	expect(await office.roster()).toEqual([]);
});
