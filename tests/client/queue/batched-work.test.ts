import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { BatchedWork } from '$lib/client/queue/batched-work.svelte';

type Words = Record<string, string>;
type Write = { field: string; says: string };
type Batch = { requestKey: string; baseVersion: number; operations: Write[] };

const apply = (body: Words, one: Write): Words => ({ ...body, [one.field]: one.says });

/** A small server that keeps one thing as the house does: versions, and answers by their keys. */
function keeper() {
	const held = { version: 1, body: {} as Words };
	const answers = new Map<string, unknown>();
	const batches: Batch[] = [];
	const server: Server = createServer((request, response) => {
		let text = '';
		request.on('data', (part: Buffer) => (text += part.toString()));
		request.on('end', () => {
			const batch = JSON.parse(text) as Batch;
			batches.push(batch);
			const answer = take(batch);
			if (control.loseAnswers) return request.socket.destroy();
			response.writeHead(answer.status, { 'content-type': 'application/json' });
			response.end(JSON.stringify(answer.body));
		});
	});
	function take(batch: Batch): { status: number; body: unknown } {
		const kept = answers.get(batch.requestKey);
		if (kept) return { status: 200, body: kept };
		if (batch.baseVersion !== held.version)
			return { status: 409, body: { detail: 'older', conflict: { ...held, by: 'Otto' } } };
		held.body = batch.operations.reduce(apply, held.body);
		held.version += 1;
		const answer = { version: held.version };
		answers.set(batch.requestKey, answer);
		return { status: 200, body: answer };
	}
	const control = { held, batches, server, loseAnswers: false };
	return control;
}

let there: ReturnType<typeof keeper>;
let path: string;
let storage: Map<string, string>;
beforeEach(async () => {
	there = keeper();
	await new Promise<void>((resolve) => there.server.listen(0, '127.0.0.1', resolve));
	path = `http://127.0.0.1:${(there.server.address() as AddressInfo).port}/`;
	storage = new Map();
	vi.stubGlobal('localStorage', {
		getItem: (key: string) => storage.get(key) ?? null,
		setItem: (key: string, text: string) => void storage.set(key, text),
		removeItem: (key: string) => void storage.delete(key)
	});
});
afterEach(async () => {
	vi.unstubAllGlobals();
	await new Promise((resolve) => there.server.close(resolve));
});

/** The page as it is opened now: with what the server has, and what this browser kept. */
function open() {
	const followsOn = (earlier: Write, later: Write) => earlier.field === later.field;
	const on = { path, storageKey: 'work', apply, followsOn };
	const work = new BatchedWork<Words, Write>(on, structuredClone(there.held));
	work.resume();
	return work;
}
const type = (work: BatchedWork<Words, Write>, field: string, says: string) =>
	work.do({ field, says });

describe('work in batches', () => {
	it('sends what is typed in one field once, as it says last', async () => {
		const work = open();
		for (const says of ['c', 'cr', 'cra']) type(work, 'title', says);
		type(work, 'code', 'KT');
		expect(await work.settled()).toBe(true);
		expect(there.batches.map((one) => one.operations)).toEqual([
			[
				{ field: 'title', says: 'cra' },
				{ field: 'code', says: 'KT' }
			]
		]);
		expect(there.held.body).toEqual({ title: 'cra', code: 'KT' });
		expect(storage.size).toBe(0);
	});

	it('keeps what is typed while a batch is on its way, and sends it after', async () => {
		const work = open();
		type(work, 'title', 'first');
		const sent = work.settled();
		type(work, 'title', 'second');
		await sent;
		expect(await work.settled()).toBe(true);
		expect(there.held.body).toEqual({ title: 'second' });
		expect(work.version).toBe(there.held.version);
	});

	it('takes up after a lost answer without a conflict with itself', async () => {
		const work = open();
		there.loseAnswers = true;
		type(work, 'title', 'typed');
		expect(await work.settled()).toBe(false);
		expect(work.state).toBe('offline');
		expect(there.held.version).toBe(2);
		there.loseAnswers = false;
		const again = open();
		expect(again.body).toEqual({ title: 'typed' });
		expect(await again.settled()).toBe(true);
		expect(again.conflict).toBeNull();
		expect(there.held.version).toBe(2);
	});

	it('does not lay what an earlier visit typed over what somebody saved since', async () => {
		const work = open();
		there.loseAnswers = true;
		type(work, 'title', 'mine');
		there.held.version += 1; // before it arrives, somebody else saves
		there.held.body = { title: 'theirs', code: 'KT' };
		await work.settled();
		there.loseAnswers = false;
		const again = open();
		await again.settled();
		expect(again.state).toBe('conflict');
		expect(again.conflict).toMatchObject({ by: 'Otto', body: { title: 'theirs' } });
		expect(there.held.body.title).toBe('theirs');
		again.takeMine();
		expect(await again.settled()).toBe(true);
		expect(there.held.body).toEqual({ title: 'mine', code: 'KT' });
	});

	it('drops its own where the person says so', async () => {
		const work = open();
		there.held.version += 1;
		there.held.body = { title: 'theirs' };
		type(work, 'title', 'mine');
		await work.settled();
		work.takeTheirs();
		expect(work.body).toEqual({ title: 'theirs' });
		expect(await work.settled()).toBe(true);
		expect(there.held.body).toEqual({ title: 'theirs' });
		expect(storage.size).toBe(0);
	});
});
