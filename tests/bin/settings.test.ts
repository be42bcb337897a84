import { mkdtempSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { settingsFrom } from '../../src/bin/steps/settings.js';
import { welcome } from '../../src/bin/steps/welcome.js';
import { readEnvironment } from '$lib/server/config/env';

let DATA_DIR: string;
beforeEach(() => {
	DATA_DIR = mkdtempSync(join(tmpdir(), 'settings-'));
});
afterEach(() => rmSync(DATA_DIR, { recursive: true }));

it('gives the server what its own reader accepts, with stand-ins on the next ports', () => {
	const { serverEnv, mailbox, till, origin } = settingsFrom({ DATA_DIR });
	const config = readEnvironment(serverEnv);
	expect(origin).toBe('http://127.0.0.1:4180');
	expect(config).toMatchObject({
		HOST: '127.0.0.1',
		PORT: 4180,
		ORIGIN: origin,
		DATA_DIR,
		SMTP_URL: 'smtp://127.0.0.1:4181',
		MAILBOX_URL: 'http://127.0.0.1:4182',
		STRIPE_API_BASE: 'http://127.0.0.1:4183',
		TILL_ORIGIN: 'http://127.0.0.1:4183',
		STRIPE_SECRET_KEY: till?.secretKey,
		STRIPE_WEBHOOK_SECRET: till?.webhookSecret
	});
	expect(config.AUTH_SECRET).toHaveLength(43);
	expect(mailbox).toMatchObject({ smtpPort: 4181, pagePort: 4182 });
	expect(till?.webhookUrl).toBe('http://127.0.0.1:4180/api/v1/stripe/webhook');
});

it('keeps the secrets of the first start, for their owner only', () => {
	const first = settingsFrom({ DATA_DIR });
	expect(settingsFrom({ DATA_DIR }).till).toEqual(first.till);
	expect(statSync(join(DATA_DIR, 'secrets.json')).mode & 0o777).toBe(0o600);
});

it('starts no stand-in where the real service is set', () => {
	const real = { SMTP_URL: 'smtps://mail.example', STRIPE_SECRET_KEY: 'sk_live_1' };
	const { mailbox, till, serverEnv } = settingsFrom({ DATA_DIR, ...real });
	expect([mailbox, till]).toEqual([null, null]);
	expect(serverEnv).toMatchObject(real);
	expect(serverEnv).not.toHaveProperty('STRIPE_API_BASE');
	expect(serverEnv).not.toHaveProperty('MAILBOX_URL');
});

it('says plainly what is wrong with a setting', () => {
	for (const PORT of ['x', '0', '65533', '1.5'])
		expect(() => settingsFrom({ DATA_DIR, PORT })).toThrow(/^PORT must be/);
	expect(() => settingsFrom({ DATA_DIR, ORIGIN: 'ringland' })).toThrow(/^ORIGIN must be/);
});

it('reaches a server that listens everywhere, and asks for the address that people type', () => {
	const settings = settingsFrom({ DATA_DIR, HOST: '0.0.0.0', PORT: '5000' });
	expect(settings.till?.webhookUrl).toMatch(/^http:\/\/127\.0\.0\.1:5000\//);
	expect(welcome(settings).join('\n')).toContain('set ORIGIN');
	const named = settingsFrom({ DATA_DIR, HOST: '0.0.0.0', ORIGIN: 'https://ringland.example/x' });
	expect(named.origin).toBe('https://ringland.example');
	expect(named.till?.webhookHost).toBe('ringland.example');
	expect(settingsFrom({ DATA_DIR, HOST: '::1' }).origin).toBe('http://[::1]:4180');
});

it('names the demo accounts only where there is a demo', () => {
	const words = (DEMO: string, ORIGIN?: string) =>
		welcome(settingsFrom({ DATA_DIR, DEMO, ORIGIN })).join('\n');
	expect(words('on')).toContain('averholm-demo');
	expect(words('on', 'https://ringland.example')).toContain('Demo passwords are refused');
	expect(words('off')).not.toContain('averholm-demo');
});
