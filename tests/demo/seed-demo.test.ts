import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import type { Actor } from '$lib/domain/actor';
import { chainFault } from '$lib/domain/ledger/entry';
import { markersOf } from '$lib/server/data/queries/awards';
import { hashOf, readLedger } from '$lib/server/data/queries/ledger';
import { allSchools, membershipsOf } from '$lib/server/data/queries/schools';
import {
	accounts,
	awards,
	certificates,
	cohorts,
	enrolments,
	mails,
	orders,
	people,
	photographs,
	places,
	submissions
} from '$lib/server/data/models';
import { select } from '$lib/server/data/rows';
import { within } from '$lib/server/data/scope';
import { seedDemo } from '$lib/server/demo/seed-demo';
import { decideAward } from '$lib/server/services/awards/decide-award';
import { recordPayment } from '$lib/server/services/cohorts/buy-places';
import { makeHouse, type TestHouse } from '../support/house';

let house: TestHouse;
beforeAll(async () => {
	house = await makeHouse({ now: '2026-11-30T09:00:00Z', catalogue: catalogue() });
	await seedDemo(house);
}, 120_000);
afterAll(() => house.close());

describe('the demo', () => {
	it('fills both schools through the use cases, with a ledger whose chain holds', async () => {
		const schools = await allSchools(house.look);
		expect(schools.map((one) => one.slug)).toEqual(['averholm', 'korrig']);
		for (const { id } of schools) {
			const ledger = await readLedger(within(house.look, id));
			expect(ledger.length).toBeGreaterThan(15);
			expect(chainFault(ledger, hashOf)).toBeUndefined();
		}
		expect((await select(house.look, enrolments)).length).toBe(14);
		expect((await select(house.look, photographs)).length).toBeGreaterThan(20);
		const states = new Set((await select(house.look, submissions)).map((one) => one.state));
		expect(states).toEqual(new Set(['open', 'handed-in', 'decided']));
		const issued = await select(house.look, certificates);
		expect(issued.map((one) => one.withdrawnAt !== null).sort()).toEqual([false, true]);
	});

	it('leaves no letter to be sent about the past, and no link behind', async () => {
		const all = await select(house.look, mails);
		expect(all.every((one) => one.state === 'sent' && one.sealed === null)).toBe(true);
	});

	it('played again plays nothing twice', async () => {
		const before = (await select(house.look, submissions)).length;
		await seedDemo(house);
		expect((await select(house.look, submissions)).length).toBe(before);
	});
});

describe('on the demo', () => {
	const inSchool = async (email: string) => {
		const [account] = await select(house.look, accounts, { email });
		const schools = await allSchools(house.look);
		const schoolId = schools.find((one) => one.slug === 'averholm')?.id ?? '';
		const memberships = await membershipsOf(house.look, account?.id ?? '');
		const actor: Actor = {
			kind: 'account',
			accountId: account?.id ?? '',
			sessionId: 'none',
			email,
			name: account?.name ?? '',
			memberships
		};
		return { house, actor, schoolId };
	};
	/** What the file itself says; the library in between words it anew. */
	const refusal = (statement: string) =>
		house.database.sequelize.query(statement).catch((error: { parent?: Error }) => {
			throw error.parent ?? error;
		});
	const waiting = async () => (await select(house.look, awards, { state: 'waiting' }))[0];

	it('whoever marked the work cannot decide its award, not even as a verifier', async () => {
		const award = await waiting();
		const inAverholm = within(house.look, award?.schoolId ?? '');
		const [markerId = ''] = await markersOf(inAverholm, award?.enrolmentId ?? '');
		const [marker] = await select(house.look, people, { id: markerId });
		const [account] = await select(house.look, accounts, { id: marker?.accountId ?? '' });
		const caller = await inSchool(account?.email ?? '');
		const membership = caller.actor.kind === 'account' ? caller.actor.memberships[0] : undefined;
		if (!membership) throw new Error('a marker is in the school');
		const promoted: Actor = {
			...caller.actor,
			memberships: [{ ...membership, roles: ['instructor', 'verifier'] }]
		} as Actor;
		const decide = decideAward(
			{ ...caller, actor: promoted },
			{ awardId: award?.id, decision: 'award' }
		);
		await expect(decide).rejects.toMatchObject({ code: 'absent' });
	});

	it('a verifier of another school finds nothing', async () => {
		const award = await waiting();
		const caller = await inSchool('verifier@korrig.example');
		await expect(
			decideAward(caller, { awardId: award?.id, decision: 'award' })
		).rejects.toMatchObject({ code: 'absent' });
	});

	it('a decided award stands, and its certificate’s face cannot be changed in the file', async () => {
		const award = await waiting();
		const caller = await inSchool('verifier@averholm.example');
		await decideAward(caller, { awardId: award?.id, decision: 'award' });
		await expect(
			decideAward(caller, { awardId: award?.id, decision: 'award' })
		).rejects.toMatchObject({ code: 'conflict' });
		const run = refusal;
		await expect(run("UPDATE certificates SET face = '{}'")).rejects.toThrow(/never changed/);
		await expect(run('DELETE FROM certificates')).rejects.toThrow(/never deleted/);
		await expect(run("UPDATE ledger_entries SET kind = 'x'")).rejects.toThrow(/never changed/);
		await expect(run('DELETE FROM ledger_entries')).rejects.toThrow(/never changed or deleted/);
		await expect(run("UPDATE revisions SET title = 'x'")).rejects.toThrow(/never changed/);
		await expect(run("UPDATE marks SET words = 'x'")).rejects.toThrow(/never changed/);
	});

	it('places never exceed what was paid: the file itself refuses more', async () => {
		const [order] = await select(house.look, orders);
		const [place] = await select(house.look, places);
		if (!order || !place) throw new Error('the demo has paid places');
		const add = (id: string, number: number) =>
			refusal(
				`INSERT INTO places VALUES ('${order.schoolId}', '${id}', '${order.cohortId}', '${order.id}', ${number}, '2026')`
			);
		await expect(add('more', order.quantity + 1)).rejects.toThrow(/paid order/);
		await expect(add('again', 1)).rejects.toThrow(/UNIQUE/);
	});

	it('the same request under the same key is done once, and with other content refused', async () => {
		const caller = await inSchool('office@averholm.example');
		const [cohort] = await select(within(house.look, caller.schoolId), cohorts);
		const asked = {
			cohortId: cohort?.id,
			quantity: 1,
			method: 'purchase-order',
			reference: 'PO-1'
		};
		const keyed = { ...caller, requestKey: '01ARZ3NDEKTSV4RRFFQ69G5FAV' };
		const first = await recordPayment(keyed, asked);
		expect(await recordPayment(keyed, asked)).toEqual(first);
		await expect(recordPayment(keyed, { ...asked, quantity: 2 })).rejects.toMatchObject({
			code: 'conflict'
		});
		expect(await select(house.look, orders, { reference: 'PO-1' })).toHaveLength(1);
	});
});
