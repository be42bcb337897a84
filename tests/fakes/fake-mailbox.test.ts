import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { makeMailer, type Letter } from '$lib/server/gateways/mail';
import { startFakeMailbox } from '../../src/fakes/smtp/fake-mailbox.js';

let folder: string;
let fake: Awaited<ReturnType<typeof startFakeMailbox>>;

beforeEach(async () => {
	folder = await mkdtemp(join(tmpdir(), 'mailbox-'));
	fake = await startFakeMailbox({ smtpPort: 0, pagePort: 0, folder });
});

afterEach(async () => {
	await fake.close();
	await rm(folder, { recursive: true });
});

const letter: Letter = {
	messageId: '<01j0000000000000000000mail@ringland.example>',
	from: 'Averholm Trade School <no-reply@ringland.example>',
	to: 'Student@averholm.example',
	subject: 'Märked: <crankpins> & shells',
	text: 'See your marks: http://127.0.0.1:4180/s/averholm/marks?a=1&b=2\nIt holds for a week.',
	html: '<html><head></head><body><script>bad()</script><p>See your marks</p></body></html>'
};

const send = (more: Partial<Letter> = {}) =>
	makeMailer({ smtpUrl: `smtp://127.0.0.1:${fake.smtpPort}` }).send({ ...letter, ...more });
const read = async (path: string) => fetch(`http://127.0.0.1:${fake.pagePort}${path}`);

it('keeps a letter as it came and gives it back as data', async () => {
	expect((await send()).kind).toBe('sent');
	const [mail, ...more] = await (await read('/messages?to=student@averholm.example')).json();
	expect(more).toEqual([]);
	expect(mail).toMatchObject({
		to: ['student@averholm.example'],
		subject: letter.subject,
		messageId: letter.messageId,
		html: letter.html,
		links: ['http://127.0.0.1:4180/s/averholm/marks?a=1&b=2']
	});
	expect(mail.text.trim()).toBe(letter.text);
	expect(await (await read('/messages?to=other@averholm.example')).json()).toEqual([]);
	expect(await (await read(`/messages/${mail.id}.eml`)).text()).toContain('Message-ID: <01j');
});

it('shows letters newest first, with their markup held off', async () => {
	await send();
	await send({ subject: 'Second', messageId: '<second@ringland.example>' });
	const list = await (await read('/')).text();
	expect(list.indexOf('Second')).toBeLessThan(list.indexOf('&lt;crankpins&gt;'));
	const [, first] = await (await read('/messages')).json();
	const shown = await (await read(`/messages/${first.id}`)).text();
	expect(shown).toContain('href="http://127.0.0.1:4180/s/averholm/marks?a=1&amp;b=2"');
	expect(shown).not.toContain('bad()');
	const asHtml = await read(`/messages/${first.id}/html`);
	expect(asHtml.headers.get('content-security-policy')).toMatch(/default-src 'none'.*sandbox/);
});

it('keeps letters over a restart', async () => {
	await send();
	await fake.close();
	fake = await startFakeMailbox({ smtpPort: 0, pagePort: 0, folder });
	expect(await (await read('/messages')).json()).toHaveLength(1);
});

it('refuses for good and for now as the world does', async () => {
	expect(await send({ to: 'a@refused.example' })).toMatchObject({ kind: 'refused' });
	expect(await send({ to: 'a@busy.example' })).toMatchObject({ kind: 'later' });
	expect(await (await read('/messages')).json()).toEqual([]);
});
