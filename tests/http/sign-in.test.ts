import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { sessions } from '$lib/server/data/models';
import { count, select } from '$lib/server/data/rows';
import {
	askForSignInLink,
	signInWithLink,
	signInWithPassword,
	signOut
} from '$lib/server/http/auth/ask-auth';
import { authHandle } from '$lib/server/http/auth/auth-handle';
import { readDeviceMark } from '$lib/server/http/auth/device-mark';
import { sendAccountLink } from '$lib/server/services/accounts/send-account-link';
import { makeEvent, type Asked, type Jar } from '../support/event';
import { asSystem, makeHouse, password, type TestHouse, type TestPerson } from '../support/house';

let house: TestHouse;
let ines: TestPerson;
let jar: Jar;
beforeEach(async () => {
	// Auth.js looks at the machine's clock for the cookie's end.
	house = await makeHouse({ now: new Date().toISOString() });
	ines = await house.addPerson(await house.addSchool('averholm'), 'Ines Vartdal', ['student']);
	jar = new Map();
});
afterEach(() => house.close());

const at = (path: string, more: Asked = {}) => makeEvent(house, path, { jar, ...more });
const whoIsHere = async () => {
	const actor = await (await at('/')).locals.actor();
	return actor.kind === 'account' ? actor.name : actor.kind;
};

describe('through our own pages', () => {
	it('a password opens a session under a new token each time', async () => {
		await signInWithPassword(await at('/sign-in'), ines.email, password);
		expect(await whoIsHere()).toBe('Ines Vartdal');
		const first = jar.get('ringland-session');
		await signInWithPassword(await at('/sign-in'), ines.email, password);
		expect(jar.get('ringland-session')).not.toBe(first);
		expect(await count(house.look, sessions), 'the browser holds one session').toBe(1);
	});

	it('a wrong one opens nothing, and says so in words', async () => {
		const wrong = signInWithPassword(await at('/sign-in'), ines.email, 'wrong wrong wrong');
		await expect(wrong).rejects.toMatchObject({ code: 'input', name: 'Problem' });
		expect(await whoIsHere()).toBe('anyone');
		expect(jar.has('ringland-session')).toBe(false);
	});

	it('a link signs in once', async () => {
		await askForSignInLink(await at('/sign-in/link'), ines.email);
		await sendAccountLink(asSystem(house), { email: ines.email, purpose: 'sign-in' });
		const token = (await house.linksOfLetter(ines.email)).links.link?.split('/').at(-1) ?? '';
		await signInWithLink(await at('/sign-in/link/x'), token);
		expect(await whoIsHere()).toBe('Ines Vartdal');
		const again = signInWithLink(await at('/sign-in/link/x', { jar: new Map() }), token);
		await expect(again).rejects.toMatchObject({ code: 'closed' });
	});

	it('an address that nobody has is answered like one with an account', async () => {
		await askForSignInLink(await at('/sign-in/link'), 'nobody@school.example');
		const [rows] = await house.database.sequelize.query('SELECT email FROM accounts');
		expect(rows).toEqual([{ email: ines.email }]);
	});

	it('signing out ends the session in the database as well', async () => {
		await signInWithPassword(await at('/sign-in'), ines.email, password);
		await signOut(await at('/account'));
		expect(await whoIsHere()).toBe('anyone');
		expect(await count(house.look, sessions)).toBe(0);
	});

	it('marks the device, and takes no mark that it has not signed', async () => {
		expect(readDeviceMark(await at('/'))).toBeNull();
		await signInWithPassword(await at('/sign-in'), ines.email, password);
		expect(readDeviceMark(await at('/'))).toMatch(/^[0-9a-f]{64}$/);
		const [id] = (jar.get('ringland-device') ?? '').split('.');
		jar.set('ringland-device', `${id}.${'0'.repeat(64)}`);
		expect(readDeviceMark(await at('/'))).toBeNull();
	});

	it('spares a known device the wait that strangers caused', async () => {
		await signInWithPassword(await at('/sign-in'), ines.email, password);
		jar.delete('ringland-session');
		const stranger = { jar: new Map<string, string>(), address: '198.51.100.7' };
		for (let i = 0; i < 5; i++)
			await signInWithPassword(await at('/sign-in', stranger), ines.email, 'guess').catch(() => 0);
		const held = signInWithPassword(await at('/sign-in', stranger), ines.email, password);
		await expect(held).rejects.toMatchObject({ code: 'too-many' });
		await signInWithPassword(await at('/sign-in'), ines.email, password);
		expect(await whoIsHere()).toBe('Ines Vartdal');
	});
});

describe("through Auth.js's own routes", () => {
	const form = { 'content-type': 'application/x-www-form-urlencoded' };
	const ask = async (path: string, more: Asked = {}) =>
		authHandle({ event: await at(path, more), resolve: () => new Response('past it') });
	const post = (path: string, fields: Record<string, string>, origin = house.config.ORIGIN) =>
		ask(path, { method: 'POST', headers: { ...form, origin }, body: new URLSearchParams(fields) });
	const given = () => ({ email: ines.email, password });

	it('a password is taken, with the session and the mark of the device as cookies', async () => {
		const answer = await post('/auth/callback/password', given());
		const set = answer.headers.getSetCookie().join('\n');
		expect(set).toMatch(/ringland-session=[\w-]{43}; .*HttpOnly/);
		expect(set).toMatch(/ringland-device=/);
		expect(await select(house.look, sessions)).toHaveLength(1);
	});

	it('the same waits hold', async () => {
		for (let i = 0; i < 5; i++)
			await post('/auth/callback/password', { ...given(), password: 'guess' });
		const answer = await post('/auth/callback/password', given());
		expect(answer.headers.get('location')).toContain('/sign-in?error=CredentialsSignin');
		expect(answer.headers.get('location')).toContain('code=too-many');
		expect(await count(house.look, sessions)).toBe(0);
	});

	it('a write from another site is refused, whatever its content type', async () => {
		for (const type of ['application/x-www-form-urlencoded', 'application/json', 'text/plain']) {
			const answer = await ask('/auth/callback/password', {
				method: 'POST',
				headers: { 'content-type': type, origin: 'https://elsewhere.example' },
				body: JSON.stringify(given())
			});
			expect(answer.status, type).toBe(403);
		}
		const none = await ask('/auth/callback/password', { method: 'POST', headers: form, body: '' });
		expect(none.status).toBe(403);
	});

	it('opening a link signs nobody in: mail scanners open links', async () => {
		await sendAccountLink(asSystem(house), { email: ines.email, purpose: 'sign-in' });
		const token = (await house.linksOfLetter(ines.email)).links.link?.split('/').at(-1) ?? '';
		const answer = await ask(`/auth/callback/link?token=${token}`);
		expect(answer.status).toBe(405);
		expect(await count(house.look, sessions)).toBe(0);
	});

	it('the session that it tells a page of holds no token', async () => {
		await signInWithPassword(await at('/sign-in'), ines.email, password);
		const answer = await ask('/auth/session');
		const text = await answer.text();
		expect(JSON.parse(text)).toMatchObject({ user: { email: ines.email } });
		expect(text).not.toContain(jar.get('ringland-session'));
	});

	it('other addresses go past it', async () => {
		expect(await (await ask('/prospectus')).text()).toBe('past it');
	});
});
