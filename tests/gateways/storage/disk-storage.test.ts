import { createHash, randomBytes } from 'node:crypto';
import { mkdtemp, readdir, rm, stat, utimes, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { buffer } from 'node:stream/consumers';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { openDiskStorage } from '$lib/server/gateways/storage/disk-storage';
import { mediaTypeOf, photographTypes } from '$lib/server/gateways/storage/media-type';
import type { Storage } from '$lib/server/gateways/storage/storage';

const schoolId = '01J0000000000000000000AVER';
let dataDir = '';
let storage: Storage;

beforeAll(async () => {
	dataDir = await mkdtemp(join(tmpdir(), 'ringland-storage-'));
	storage = await openDiskStorage(dataDir);
});
afterAll(() => rm(dataDir, { recursive: true }));

async function* chunks(bytes: Buffer, size = 1000) {
	for (let at = 0; at < bytes.length; at += size) yield bytes.subarray(at, at + size);
}
const jpegLike = (bytes: number) =>
	Buffer.concat([Buffer.from([0xff, 0xd8, 0xff, 0xe0]), randomBytes(bytes)]);
const photographs = { bytesAtMost: 50_000, mediaTypes: photographTypes };
const inQuarantine = () => readdir(join(dataDir, 'quarantine'));
const keepPhotograph = async (bytes: Buffer, school = schoolId) =>
	storage.keep(await storage.receive(chunks(bytes), photographs), school);

it('keeps the bytes under their hash, readable by this account alone', async () => {
	const bytes = jpegLike(20_000);
	const kept = await keepPhotograph(bytes);
	const sha256 = createHash('sha256').update(bytes).digest('hex');
	expect(kept).toEqual({
		key: `${schoolId}/${sha256.slice(0, 2)}/${sha256}`,
		bytes: bytes.length,
		sha256,
		mediaType: 'image/jpeg'
	});
	expect(await inQuarantine()).toEqual([]);
	const path = storage.pathOf(kept.key);
	expect((await stat(path)).mode & 0o777).toBe(0o600);
	const opened = await storage.open(kept.key);
	expect((await buffer(opened.stream)).equals(bytes)).toBe(true);
});

it('gives parts as Range counts them, and refuses one outside', async () => {
	const bytes = jpegLike(5000);
	const { key } = await keepPhotograph(bytes);
	const middle = await storage.open(key, { start: 10, end: 19 });
	expect(middle.part).toEqual({ start: 10, end: 19 });
	expect((await buffer(middle.stream)).equals(bytes.subarray(10, 20))).toBe(true);
	const rest = await storage.open(key, { start: 5000, end: 9_999_999 });
	expect(rest.part).toEqual({ start: 5000, end: 5003 });
	rest.stream.destroy();
	await expect(storage.open(key, { start: 5004 })).rejects.toMatchObject({ code: 'input' });
});

it('stops at the limit and leaves nothing behind', async () => {
	const refused = storage.receive(chunks(jpegLike(60_000)), photographs);
	await expect(refused).rejects.toMatchObject({ code: 'too-large' });
	async function* broken() {
		yield jpegLike(2000);
		throw new Error('the line went dead');
	}
	await expect(storage.receive(broken(), photographs)).rejects.toThrow('the line went dead');
	expect(await inQuarantine()).toEqual([]);
});

it.each([
	['nothing', Buffer.alloc(0), /empty/],
	[
		'a drawing that runs programs',
		Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>'),
		/not one of/
	],
	['a page', Buffer.from('<!doctype html><script>1</script>'), /not one of/],
	['a document', Buffer.from('%PDF-1.7\n'), /not one of/],
	[
		'a phone format that browsers do not show',
		Buffer.from('\0\0\0\x18ftypheic\0\0\0\0mif1heic', 'latin1'),
		/HEIC/
	]
])('refuses %s by what it is', async (_name, bytes, words) => {
	await expect(storage.receive(chunks(bytes), photographs)).rejects.toThrow(words);
});

it('sees the type across chunks of one byte', async () => {
	const avif = Buffer.from('\0\0\0\x1cftypmif1\0\0\0\0mif1avifmiaf', 'latin1');
	expect(mediaTypeOf(avif)).toBe('image/avif');
	const received = await storage.receive(chunks(avif, 1), photographs);
	expect(received.mediaType).toBe('image/avif');
	await storage.discard(received);
	expect(await inQuarantine()).toEqual([]);
});

it('keeps schools apart, and the same content in one school once', async () => {
	const bytes = jpegLike(900);
	const here = await keepPhotograph(bytes);
	expect(await keepPhotograph(bytes)).toEqual(here);
	const there = await keepPhotograph(bytes, '01J0000000000000000000K0RR');
	await storage.remove(here.key);
	await storage.remove(here.key);
	await expect(storage.open(here.key)).rejects.toMatchObject({ code: 'absent' });
	(await storage.open(there.key)).stream.destroy();
	expect(() => storage.pathOf('../../etc/passwd')).toThrow();
	await expect(
		storage.keep(await storage.receive(chunks(bytes), photographs), '../x')
	).rejects.toThrow();
});

it('may be told to keep the same again, as a transaction that is run again does', async () => {
	const received = await storage.receive(chunks(jpegLike(700)), photographs);
	const kept = await storage.keep(received, schoolId);
	expect(await storage.keep(received, schoolId)).toEqual(kept);
	await storage.remove(kept.key);
	await expect(storage.keep(received, schoolId)).rejects.toThrow('ENOENT');
});

it('takes files made here', async () => {
	const folder = await storage.workFolder();
	await writeFile(join(folder, 'small'), 'made');
	await writeFile(join(folder, 'large'), 'larger');
	const kept = await storage.keepMade(join(folder, 'small'), schoolId, 'image/webp');
	expect(kept.bytes).toBe(4);
	expect(await readdir(folder)).toEqual(['large']);
	await storage.keepMade(join(folder, 'large'), schoolId, 'image/jpeg');
	await expect(readdir(folder)).rejects.toThrow('ENOENT');
});

it('sweeps orphans and old quarantine, and nothing that is known or fresh', async () => {
	const known = await keepPhotograph(jpegLike(100));
	const orphan = await keepPhotograph(jpegLike(101));
	const fresh = await keepPhotograph(jpegLike(102));
	const left = await storage.receive(chunks(jpegLike(103)), photographs);
	const long = new Date(Date.now() - 3 * 86_400_000);
	for (const path of [storage.pathOf(known.key), storage.pathOf(orphan.key), left.path])
		await utimes(path, long, long);
	const swept = await storage.sweep(async (key) => key === known.key, Date.now() - 86_400_000);
	expect(swept.removed).toEqual([orphan.key]);
	expect(swept.quarantineRemoved).toBe(1);
	(await storage.open(known.key)).stream.destroy();
	(await storage.open(fresh.key)).stream.destroy();
});
