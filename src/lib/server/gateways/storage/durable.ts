import { constants } from 'node:fs';
import { mkdir, open, rename } from 'node:fs/promises';
import { dirname } from 'node:path';

/** A name in a folder survives a power cut only once the folder itself was written out. */
export async function syncFolder(path: string): Promise<void> {
	const folder = await open(path, constants.O_RDONLY);
	try {
		await folder.sync();
	} finally {
		await folder.close();
	}
}

export async function syncFile(path: string): Promise<void> {
	const file = await open(path, 'r+');
	try {
		await file.sync();
	} finally {
		await file.close();
	}
}

/** Makes the folders that are missing, and writes out the parent of each that it made. */
export async function makeFolder(path: string): Promise<void> {
	const first = await mkdir(path, { recursive: true, mode: 0o700 });
	if (first === undefined) return;
	for (let made = path; ; made = dirname(made)) {
		await syncFolder(dirname(made));
		if (made === first) return;
	}
}

/** An already synced file gets its lasting name; the name is on disk when this returns. */
export async function moveDurably(from: string, to: string): Promise<void> {
	await makeFolder(dirname(to));
	await rename(from, to);
	await syncFolder(dirname(to));
}
