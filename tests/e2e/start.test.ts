import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { cp, mkdtemp, rm } from 'node:fs/promises';
import { request } from 'node:http';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { expect, test } from '@playwright/test';
import { tryPort } from '../../src/bin/steps/ports.js';
import { project } from '../../src/bin/steps/project.js';

/** `npm start` as somebody types it, on a copy of the seeded data. */
test.describe.configure({ mode: 'serial' });

let dataDir: string;
let port: number;
const started: Started[] = [];

type Started = { npm: ChildProcess; said: () => string; ended: Promise<unknown[]> };

test.beforeAll(async () => {
	dataDir = await mkdtemp(join(tmpdir(), 'ringland-start-'));
	await cp(process.env.RINGLAND_TEMPLATE ?? '', dataDir, { recursive: true });
	port = await fourFreePorts();
});
test.afterAll(async () => {
	for (const { npm, ended } of started) {
		npm.kill('SIGTERM');
		await ended;
	}
	await rm(dataDir, { recursive: true, force: true });
});

test('says where everything is, and is up again in seconds', async () => {
	const startedAtMs = Date.now();
	const { said, ended, npm } = start();
	await expect.poll(said, { timeout: 20_000 }).toContain('Ctrl-C ends it.');
	expect(Date.now() - startedAtMs).toBeLessThan(15_000);
	expect(said()).toContain(`http://127.0.0.1:${port}`);
	expect(said()).toContain('student@averholm.example');
	expect((await fetch(`http://127.0.0.1:${port}/healthz`)).status).toBe(200);
	expect((await fetch(`http://127.0.0.1:${port + 2}/`)).status).toBe(200);
	expect((await fetch(`http://127.0.0.1:${port + 3}/`)).status).toBe(200);

	const second = start();
	expect((await second.ended)[0]).toBe(1);
	expect(second.said()).toContain(`Port ${port} is in use.`);

	npm.kill('SIGTERM');
	await ended;
});

test('SIGTERM to npm alone ends all of it within seconds, an open request first', async () => {
	const { said, ended, npm } = start();
	await expect.poll(said, { timeout: 20_000 }).toContain('Ctrl-C ends it.');
	const finish = await halfASignIn();
	const askedAtMs = Date.now();
	npm.kill('SIGTERM');
	await expect.poll(() => tryPort('127.0.0.1', port), { timeout: 5000 }).toBe(port);
	expect(await finish()).toBeLessThan(500);
	await ended;
	expect(Date.now() - askedAtMs).toBeLessThan(10_000);
	await expectPortsFree();
});

test('the death of npm ends all of it too', async () => {
	const { said, npm } = start();
	await expect.poll(said, { timeout: 20_000 }).toContain('Ctrl-C ends it.');
	npm.kill('SIGKILL');
	await expectPortsFree();
});

test('a port of a stand-in that is taken is one clear line', async () => {
	const other = createServer().listen(port + 2, '127.0.0.1');
	await once(other, 'listening');
	const { said, ended } = start();
	expect((await ended)[0]).toBe(1);
	expect(said()).toContain(`Port ${port + 2} is in use`);
	await new Promise((closed) => other.close(closed));
});

function start(): Started {
	const { PATH = '', HOME = '' } = process.env;
	const npm = spawn('npm', ['start'], {
		cwd: project,
		env: { PATH, HOME, PORT: String(port), DATA_DIR: dataDir }
	});
	let words = '';
	for (const stream of [npm.stdout, npm.stderr])
		stream.on('data', (bytes) => (words += String(bytes)));
	const one = { npm, said: () => words, ended: once(npm, 'close') };
	started.push(one);
	return one;
}

/** A request whose body is still on its way: the server has begun it and cannot have answered. */
async function halfASignIn(): Promise<() => Promise<number | undefined>> {
	const body = new URLSearchParams({ email: 'student@averholm.example', password: 'wrong' });
	const origin = `http://127.0.0.1:${port}`;
	const sent = request(`${origin}/sign-in`, {
		method: 'POST',
		headers: {
			origin,
			'content-type': 'application/x-www-form-urlencoded',
			'content-length': body.toString().length
		}
	});
	sent.write(body.toString().slice(0, 10));
	const answered = once(sent, 'response');
	await new Promise((begun) => setTimeout(begun, 300));
	return async () => {
		sent.end(body.toString().slice(10));
		const [response] = await answered;
		response.resume();
		return response.statusCode;
	};
}

async function expectPortsFree(): Promise<void> {
	await expect
		.poll(() => Promise.all([0, 1, 2, 3].map((more) => tryPort('127.0.0.1', port + more))), {
			timeout: 10_000
		})
		.toEqual([0, 1, 2, 3].map((more) => port + more));
}

async function fourFreePorts(): Promise<number> {
	for (let base = 21_000 + (process.pid % 20_000); ; base += 7) {
		const tried = await Promise.all([0, 1, 2, 3].map((more) => tryPort('127.0.0.1', base + more)));
		if (tried.every((one) => typeof one === 'number')) return base;
	}
}
