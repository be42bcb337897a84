import { z } from 'zod';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { ulid } from '$lib/domain/ids';
import { Problem } from '$lib/domain/problem';
import { bodyBytesAtMost, bodyLimitHandle } from '$lib/server/http/handles/body-limit';
import { formAction } from '$lib/server/http/form';
import { jsonRead, jsonWrite } from '$lib/server/http/json';
import { pageLoad } from '$lib/server/http/page';
import { returnPath } from '$lib/server/http/return-path';
import { signInAs } from '$lib/server/http/auth/start-session';
import { accounts, requestKeys } from '$lib/server/data/models';
import { count, update } from '$lib/server/data/rows';
import { acrossSchools } from '$lib/server/data/scope';
import { createApiToken } from '$lib/server/services/people/api-tokens';
import { readPeople } from '$lib/server/services/people/read-people';
import { readCase, writeCase } from '$lib/server/services/use-case';
import { makeEvent, thrown, type Asked, type Jar } from '../support/event';
import { makeHouse, type TestHouse, type TestPerson } from '../support/house';

let house: TestHouse;
let admin: TestPerson;
let jar: Jar;
beforeEach(async () => {
	house = await makeHouse();
	const school = await house.addSchool('averholm', { timeZone: 'Europe/Helsinki' });
	admin = await house.addPerson(school, 'Ragna Holt', ['admin']);
	jar = new Map();
	await signInAs(await makeEvent(house, '/sign-in', { jar }), admin.accountId);
});
afterEach(() => house.close());

const params = { school: 'averholm' };
const at = (more: Asked = {}) =>
	makeEvent(house, '/s/averholm/people', { jar, params, route: '/s/[school]/people', ...more });
const here = ({ scope }: { scope: { schoolId: string } }) =>
	Promise.resolve({ schoolId: scope.schoolId });

/** A write that counts how often it was really done. */
const rename = writeCase({
	name: 'rename-for-the-test',
	action: 'people:edit',
	input: z.object({
		name: z.string().min(2, 'Give two letters at least.'),
		password: z.string().optional(),
		rows: z.array(z.object({ level: z.string() })).optional()
	}),
	subject: here,
	async run({ scope, input, actor, at: when }) {
		if (input.name === 'closed')
			throw new Problem('closed', 'It closed on {at}.', { at: when }, {}, undefined);
		if (actor.kind === 'account')
			await update(acrossSchools(scope), accounts, { id: actor.accountId }, { name: input.name });
		return { name: input.name, levels: input.rows?.map((row) => row.level) ?? [] };
	}
});
const look = readCase({
	name: 'look-for-the-test',
	action: 'people:read',
	input: z.object({}).default({}),
	subject: here,
	run: () => Promise.resolve({ seen: true })
});
const key = () => ulid(house.now().getTime(), house.chance(10));
function form(fields: [string, string][], more: Asked = {}) {
	const body = new FormData();
	for (const [name, value] of fields) body.append(name, value);
	return at({ method: 'POST', body, ...more });
}

describe('a form', () => {
	it('becomes nested input, and its answer data for the page', async () => {
		const action = formAction(rename, { done: (answer) => ({ levels: answer.levels }) });
		const event = await form([
			['name', 'Ragna'],
			['rows[0].level', 'sound'],
			['rows[1].level', 'not yet']
		]);
		expect(await action(event)).toEqual({
			form: 'rename-for-the-test',
			saved: true,
			levels: ['sound', 'not yet']
		});
	});

	it('comes back after an error with what was typed, secrets excepted', async () => {
		const fields: [string, string][] = [
			['name', 'R'],
			['password', 'do not echo me']
		];
		expect(await formAction(rename)(await form(fields))).toMatchObject({
			status: 400,
			data: {
				form: 'rename-for-the-test',
				values: { name: 'R' },
				fields: { name: ['Give two letters at least.'] }
			}
		});
		const answer = await formAction(rename)(await form(fields));
		expect(JSON.stringify(answer)).not.toContain('do not echo me');
	});

	it('words instants in the school’s own time zone', async () => {
		const answer = await formAction(rename)(await form([['name', 'closed']]));
		expect(answer).toMatchObject({
			status: 410,
			data: { words: 'It closed on 2 Mar 2026, 10:00.' }
		});
	});

	it('sent twice under one key is done once; with other content it is refused', async () => {
		const requestKey = key();
		const send = async (name: string) =>
			formAction(rename)(
				await form([
					['name', name],
					['requestKey', requestKey]
				])
			);
		await send('Ragna');
		await send('Ragna');
		expect(await count(house.look, requestKeys)).toBe(1);
		expect(await send('Otherwise')).toMatchObject({ status: 409 });
	});

	it('with a password leaves no quick hash of it behind', async () => {
		const fields: [string, string][] = [
			['name', 'Ragna'],
			['password', 'four plain words'],
			['requestKey', key()]
		];
		await formAction(rename)(await form(fields));
		expect(await count(house.look, requestKeys)).toBe(0);
	});

	it('whose answer is a secret is not kept either', async () => {
		const action = formAction(createApiToken, { keyed: false, done: ({ bearer }) => ({ bearer }) });
		const answer = await action(
			await form([
				['name', 'Export'],
				['scopes[]', 'progress'],
				['requestKey', key()]
			])
		);
		const { bearer } = answer as unknown as { bearer: string };
		expect(bearer).toMatch(/^rl_[\w-]{43}$/);
		const [rows] = await house.database.sequelize.query('SELECT * FROM request_keys');
		expect(JSON.stringify(rows)).not.toContain(bearer);
	});

	it('that grows too large while it is read says so', async () => {
		const event = await form([['name', 'x'.repeat(bodyBytesAtMost + 1)]]);
		await bodyLimitHandle({ event, resolve: () => new Response() });
		expect(await formAction(rename)(event)).toMatchObject({ status: 413 });
	});

	it('of somebody who was signed out leads to the sign-in and back', async () => {
		const event = await form([['name', 'Ragna']], { jar: new Map() });
		expect(await thrown(formAction(rename)(event))).toMatchObject({
			status: 303,
			location: '/sign-in?to=%2Fs%2Faverholm%2Fpeople'
		});
	});

	it('cannot reach into prototypes', async () => {
		await formAction(rename)(
			await form([
				['name', 'Ragna'],
				['__proto__.polluted', 'yes'],
				['constructor.prototype.polluted', 'yes']
			])
		);
		expect(({} as { polluted?: string }).polluted).toBeUndefined();
	});
});

describe('a page', () => {
	it('loads what its use case gives', async () => {
		expect(await pageLoad(look)(await at())).toEqual({ seen: true });
	});

	it('sends who is signed out to the sign-in', async () => {
		const event = await at({ jar: new Map() });
		expect(await thrown(pageLoad(look)(event))).toMatchObject({ status: 303 });
	});

	it('is not there for somebody without the right, or in a school that is none', async () => {
		const school = await house.addSchool('korrig');
		const other = await house.addPerson(school, 'Otso Brandt', ['admin']);
		const theirs: Jar = new Map();
		await signInAs(await makeEvent(house, '/sign-in', { jar: theirs }), other.accountId);
		for (const asked of [{ jar: theirs }, { params: { school: 'nowhere' } }])
			expect(await thrown(pageLoad(look)(await at(asked)))).toMatchObject({ status: 404 });
	});
});

describe('the JSON interface', () => {
	const json = { 'content-type': 'application/json' };
	const path = '/api/v1/schools/averholm/people';
	const call = (more: Asked = {}) => makeEvent(house, path, { jar, params, ...more });
	const own = () => ({ ...json, origin: house.config.ORIGIN });
	const write = async (headers: Record<string, string>, body: unknown, more: Asked = {}) => {
		const asked = { method: 'POST', headers, body: JSON.stringify(body), ...more };
		return jsonWrite(rename)(await call(asked));
	};
	const good = () => ({ name: 'Ragna', requestKey: key() });

	it('takes a write in JSON from the own origin', async () => {
		const answer = await write(own(), good());
		expect(answer.status).toBe(200);
		expect(await answer.json()).toMatchObject({ name: 'Ragna' });
	});

	it('takes no other content type', async () => {
		for (const type of ['text/plain', 'application/x-www-form-urlencoded', 'application/jsonp']) {
			const answer = await write({ ...own(), 'content-type': type }, good());
			expect(answer.status, type).toBe(400);
			expect(answer.headers.get('content-type')).toContain('application/problem+json');
		}
	});

	it('takes a cookie from no other origin, and from none that is not named', async () => {
		expect((await write({ ...json, origin: 'https://elsewhere.example' }, good())).status).toBe(
			400
		);
		expect((await write(json, good())).status).toBe(400);
	});

	it('wants a request key and one object', async () => {
		const answer = await write(own(), { name: 'Ragna' });
		expect(await answer.json()).toMatchObject({
			status: 400,
			fields: { requestKey: [expect.any(String)] }
		});
		expect((await write(own(), [good()])).status).toBe(400);
		const broken = { method: 'POST', headers: own(), body: '{' };
		expect((await jsonWrite(rename)(await call(broken))).status).toBe(400);
	});

	it('answers with problem details, with the wait as a header', async () => {
		const answer = await write(own(), { name: 'R', requestKey: key() });
		expect(await answer.json()).toMatchObject({
			type: 'http://127.0.0.1:4180/problems/input',
			status: 400,
			detail: expect.any(String),
			fields: { name: ['Give two letters at least.'] }
		});
		const waiting = () => {
			const until = new Date(house.now().getTime() + 30_000);
			return Promise.reject(new Problem('too-many', 'Wait.', { until }));
		};
		const held = await jsonRead(waiting)(await call());
		expect([held.status, held.headers.get('retry-after')]).toEqual([429, '30']);
	});

	it('answers what nobody expected with a number, and tells nothing of it', async () => {
		const broken = () => Promise.reject(new Error('the secret insides'));
		const answer = await jsonRead(broken)(await call());
		const text = await answer.text();
		expect(answer.status).toBe(500);
		expect(JSON.parse(text)).toMatchObject({ title: 'unexpected', id: expect.any(String) });
		expect(text).not.toContain('insides');
	});

	it('takes a script by its token: within its scopes, without a cookie or an origin', async () => {
		const caller = await admin.caller();
		const { bearer } = await createApiToken(caller, { name: 'Export', scopes: ['progress'] });
		const authorization = `Bearer ${bearer}`;
		const event = await call({ jar: new Map(), headers: { authorization } });
		expect(await event.locals.actor()).toMatchObject({ kind: 'script', scopes: ['progress'] });
		const { tokens } = await readPeople(caller, {});
		expect(tokens).toMatchObject([{ lastUsedAt: house.now().toISOString() }]);
		const answer = await write({ ...json, authorization }, good(), { jar: new Map() });
		expect(answer.status, 'its scope does not reach so far').toBe(404);
		const invented = await call({ headers: { authorization: `Bearer rl_${'x'.repeat(43)}` } });
		expect((await jsonRead(look)(invented)).status).toBe(401);
	});

	it('takes a token nowhere else', async () => {
		const caller = await admin.caller();
		const { bearer } = await createApiToken(caller, { name: 'Export', scopes: ['progress'] });
		const headers = { authorization: `Bearer ${bearer}` };
		const event = await at({ jar: new Map(), headers });
		expect(await event.locals.actor()).toEqual({ kind: 'anyone' });
	});
});

describe('the way back after a sign-in', () => {
	const origin = 'https://ringland.school.example';
	it.each([
		['/s/averholm/bench?week=2', '/s/averholm/bench?week=2'],
		['//elsewhere.example/', undefined],
		['/\\elsewhere.example/', undefined],
		['/\t/elsewhere.example/', undefined],
		['https://elsewhere.example/', undefined],
		['javascript:alert(1)', undefined],
		['/sign-in?to=/sign-in', undefined],
		['/auth/signout', undefined],
		[null, undefined]
	])('from %j is %j', (wanted, path) => expect(returnPath(wanted, origin)).toBe(path));
});
