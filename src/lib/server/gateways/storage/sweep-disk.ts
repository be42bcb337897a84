import { readdir, rm, stat } from 'node:fs/promises';
import { join } from 'node:path';
import { isStorageKey, type StorageKey, type Swept } from './storage';

type Sweep = {
	files: string;
	quarantine: string;
	isKnown: (key: StorageKey) => Promise<boolean>;
	untouchedSinceMs: number;
};

/**
 * A file without a row is what an upload leaves when its transaction fails. Age is looked at
 * first and again just before removing: the same content may be coming in at this moment.
 */
export async function sweepDisk(sweep: Sweep): Promise<Swept> {
	const swept: Swept = { kept: 0, removed: [], quarantineRemoved: 0 };
	for await (const key of keysIn(sweep.files)) {
		const path = join(sweep.files, key);
		const orphan =
			(await isOld(path, sweep)) && !(await sweep.isKnown(key)) && (await isOld(path, sweep));
		if (!orphan) swept.kept++;
		else {
			await rm(path, { force: true });
			swept.removed.push(key);
		}
	}
	for (const name of await readdir(sweep.quarantine)) {
		const path = join(sweep.quarantine, name);
		if (!(await isOld(path, sweep))) continue;
		await rm(path, { force: true, recursive: true });
		swept.quarantineRemoved++;
	}
	return swept;
}

async function* keysIn(files: string): AsyncGenerator<StorageKey> {
	for (const schoolId of await readdir(files))
		for (const shelf of await readdir(join(files, schoolId)))
			for (const sha256 of await readdir(join(files, schoolId, shelf))) {
				const key = `${schoolId}/${shelf}/${sha256}`;
				if (isStorageKey(key)) yield key;
			}
}

async function isOld(path: string, { untouchedSinceMs }: Sweep): Promise<boolean> {
	const found = await stat(path).catch(() => null);
	return found !== null && found.mtimeMs < untouchedSinceMs;
}
