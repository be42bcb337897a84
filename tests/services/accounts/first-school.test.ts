import { afterEach, beforeEach, expect, it } from 'vitest';
import { ledgerEntries, schools } from '$lib/server/data/models';
import { membershipsOf } from '$lib/server/data/queries/schools';
import { count, select } from '$lib/server/data/rows';
import { firstSchoolLink, foundSchool } from '$lib/server/services/accounts/first-school';
import { tryPassword } from '$lib/server/services/accounts/sign-in';
import { callerAs, makeHouse, type TestHouse } from '../../support/house';

let house: TestHouse;
beforeEach(async () => {
	house = await makeHouse({ environment: { DEMO: 'off' } });
});
afterEach(() => house.close());

const wanted = {
	schoolName: 'Averholm Trade School',
	town: 'Averholm',
	slug: 'averholm',
	locale: 'en-GB',
	timeZone: 'Europe/Oslo',
	currency: 'EUR',
	name: 'Ragna Holt',
	email: 'Office@averholm.example',
	password: 'a long office password'
};
const tokenOf = (link: string | null) => link?.split('/').at(-1) ?? '';

it('the first link makes the school and its admin, once', async () => {
	const link = await firstSchoolLink(house);
	expect(link).toMatch(/^http:\/\/127\.0\.0\.1:4180\/first-school\/[\w-]{43}$/);
	const made = await foundSchool(callerAs(house), { ...wanted, token: tokenOf(link) });
	expect(await membershipsOf(house.look, made.accountId)).toMatchObject([
		{ schoolSlug: 'averholm', roles: ['admin'] }
	]);
	expect(await select(house.look, ledgerEntries)).toMatchObject([
		{ number: 1, kind: 'school-founded' }
	]);
	const from = { address: '192.0.2.1', deviceHash: null };
	const given = { email: 'office@averholm.example', password: wanted.password, ...from };
	expect(await tryPassword(callerAs(house), given)).toMatchObject({ accountId: made.accountId });
	expect(await firstSchoolLink(house), 'no second link').toBeNull();
});

it('a link of an earlier start, or an invented one, makes nothing', async () => {
	const earlier = await firstSchoolLink(house);
	await firstSchoolLink(house);
	for (const token of [tokenOf(earlier), 'x'.repeat(43)])
		await expect(foundSchool(callerAs(house), { ...wanted, token })).rejects.toMatchObject({
			code: 'closed'
		});
	expect(await count(house.look, schools)).toBe(0);
});

it('two at once make one school', async () => {
	const token = tokenOf(await firstSchoolLink(house));
	const both = await Promise.allSettled(
		['averholm', 'korrig'].map((slug) => foundSchool(callerAs(house), { ...wanted, slug, token }))
	);
	expect(both.map((one) => one.status).sort()).toEqual(['fulfilled', 'rejected']);
	expect(await count(house.look, schools)).toBe(1);
});
