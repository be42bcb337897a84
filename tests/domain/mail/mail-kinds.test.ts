import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { mailKindNamed, mailKinds, renderMail } from '$lib/domain/mail/registry';

const school = { name: 'Averholm Trade School', locale: 'en-GB', timeZone: 'Europe/Oslo' };
const kinds = mailKinds.map((kind) => [kind.name, mailKindNamed(kind.name)] as const);

it('has a line for every file', () => {
	const files = readdirSync('src/lib/domain/mail/kinds').map((file) => file.replace(/\.ts$/, ''));
	expect([...mailKinds.map((kind) => kind.name)].sort()).toEqual(files.sort());
});

describe.each(kinds)('%s', (name, kind) => {
	const message = renderMail(name, kind.example, school);

	it('says the same in text and in HTML', () => {
		const shown = message.html
			.replace(/<title>.*?<\/title>/, '')
			.replace(/&#(\d+);/g, (_all, code: string) => String.fromCharCode(Number(code)));
		for (const line of message.text.split('\n').filter((one) => one && one !== '-- '))
			expect(shown).toContain(line.replace(/^- /, '').replace(/:$/, '').split(': ').at(-1));
	});

	it('has a short subject of one line, and no shouting', () => {
		expect(message.subject).toMatch(/^\S.{3,110}$/);
		expect(message.subject + message.text).not.toMatch(/!|undefined|null|\[object/);
	});

	it('escapes what people typed, and keeps it to one line', () => {
		const hostile = Object.fromEntries(
			Object.entries(kind.example).map(([field, value]) => {
				const free =
					typeof value === 'string' &&
					!/^(https?:|RL-|\d{4}-|[A-Z]{3}$|competent|not-yet|awarded|declined)/.test(value);
				return [field, free ? '<img src=x onerror=alert(1)>"\r\nBcc: a@b.example' : value];
			})
		);
		const { subject, html } = renderMail(name, hostile, school);
		expect(html).not.toContain('<img');
		expect(subject).not.toMatch(/[\r\n]/);
	});

	it('names each one-time link as a secret, and takes no other address scheme', () => {
		const fields = Object.keys(kind.payload.shape);
		expect(kind.secret).toEqual(fields.filter((field) => /link|token/i.test(field)));
		for (const field of fields.filter((one) => /link|address/i.test(one)))
			expect(() => renderMail(name, { ...kind.example, [field]: 'javascript:alert(1)' })).toThrow(
				field
			);
	});

	it('can be sent without a school', () => {
		expect(renderMail(name, kind.example).html).toContain('Ringland');
	});

	it('fetches nothing when it is opened', () => {
		expect(message.html).not.toMatch(/<(img|script|link|iframe|style|table)|url\(|src=/i);
	});
});

it('says what is wrong with a payload without repeating it', () => {
	const link = 'not-an-address-but-a-token';
	expect(() => renderMail('sign-in-link', { heldForMinutes: 15, link })).toThrow(
		'Mail sign-in-link lacks a usable link.'
	);
	expect(() => renderMail('birthday', {})).toThrow('no mail kind birthday');
});

it('writes money and time as the school does', () => {
	const paid = mailKindNamed('payment-received').example;
	expect(renderMail('payment-received', paid, school).text).toContain('€3,600.00');
	const signedIn = mailKindNamed('new-sign-in').example;
	expect(renderMail('new-sign-in', signedIn, school).text).toContain(
		'4 March 2026 at 09:15:00 CET'
	);
});
