import { createHash } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { mkdtemp, open, rm, rmdir, stat, utimes } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { Problem } from '$lib/domain/problem';
import { makeFolder, moveDurably, syncFile, syncFolder } from './durable';
import { receiveInto } from './receive';
import { isStorageKey, storageKey, type Storage } from './storage';
import { sweepDisk } from './sweep-disk';

/** Files in folders under the data directory. All of it lies on one file system: moves are renames. */
export async function openDiskStorage(dataDir: string): Promise<Storage> {
	const quarantine = join(dataDir, 'quarantine');
	const files = join(dataDir, 'files');
	await makeFolder(quarantine);
	await makeFolder(files);

	const pathOf = (key: string) => {
		if (!isStorageKey(key)) throw new Error('not a storage key');
		return join(files, key);
	};
	const place = async (path: string, key: string) => {
		const now = new Date();
		try {
			await utimes(path, now, now); // the sweep counts from here
			await moveDurably(path, pathOf(key));
		} catch (error) {
			// A use case that is run again keeps what its first run has moved already.
			if (!isMissing(error) || !(await stat(pathOf(key)).catch(() => null))) throw error;
		}
	};

	return {
		pathOf,
		receive: (incoming, allowed) => receiveInto(quarantine, incoming, allowed),
		async keep({ path, bytes, sha256, mediaType }, schoolId) {
			const key = storageKey(schoolId, sha256);
			await place(path, key);
			return { key, bytes, sha256, mediaType };
		},
		async keepMade(path, schoolId, mediaType) {
			const hash = createHash('sha256');
			let bytes = 0;
			for await (const chunk of createReadStream(path) as AsyncIterable<Buffer>) {
				hash.update(chunk);
				bytes += chunk.byteLength;
			}
			const sha256 = hash.digest('hex');
			const key = storageKey(schoolId, sha256);
			await syncFile(path);
			await place(path, key);
			// The work folder goes with the last file that is taken out of it.
			await rmdir(dirname(path)).catch(() => undefined);
			return { key, bytes, sha256, mediaType };
		},
		discard: (received) => rm(received.path, { force: true }),
		workFolder: () => mkdtemp(join(quarantine, 'work-')),
		async open(key, wanted = {}) {
			const file = await open(pathOf(key), 'r').catch(absent);
			const { size } = await file.stat();
			const part = { start: wanted.start ?? 0, end: Math.min(wanted.end ?? size - 1, size - 1) };
			if (part.start < 0 || part.start > part.end) {
				await file.close();
				throw new Problem('input', 'This part lies outside the file of {size} bytes.', { size });
			}
			return { stream: file.createReadStream({ ...part, autoClose: true }), bytes: size, part };
		},
		async remove(key) {
			const path = pathOf(key);
			if (!(await stat(path).catch(() => null))) return;
			await rm(path, { force: true });
			await syncFolder(dirname(path));
		},
		sweep: (isKnown, untouchedSinceMs) =>
			sweepDisk({ files, quarantine, isKnown, untouchedSinceMs })
	};
}

function absent(error: unknown): never {
	if (isMissing(error)) throw new Problem('absent', 'This file is not there.');
	throw error;
}

function isMissing(error: unknown): boolean {
	return error instanceof Error && 'code' in error && error.code === 'ENOENT';
}
