import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { chainFault } from '$lib/domain/ledger/entry';
import { hashOf, readLedger } from '$lib/server/data/queries/ledger';
import { allSchools } from '$lib/server/data/queries/schools';
import { certificates, enrolments, mails, photographs, submissions } from '$lib/server/data/models';
import { select } from '$lib/server/data/rows';
import { within } from '$lib/server/data/scope';
import { seedDemo } from '$lib/server/demo/seed-demo';
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
