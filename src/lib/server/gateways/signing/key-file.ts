import { randomBytes } from 'node:crypto';
import { chmod, link, open, readFile, unlink } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { makeFolder, syncFolder } from '../storage/durable';

/**
 * Reads a key, or makes it on the first start. Two processes that start together end with one
 * key: the whole file is written aside, and only the first `link` to its name succeeds.
 */
export async function keyFile(path: string, make: () => Buffer): Promise<Buffer> {
	const found = await readFile(path).catch(() => null);
	if (found) {
		await chmod(path, 0o600);
		return found;
	}
	const folder = dirname(path);
	await makeFolder(folder);
	const aside = join(folder, `.${randomBytes(8).toString('hex')}`);
	const file = await open(aside, 'wx', 0o600);
	await file.writeFile(make());
	await file.sync();
	await file.close();
	await link(aside, path).catch((error: unknown) => {
		if (!(error instanceof Error && 'code' in error && error.code === 'EEXIST')) throw error;
	});
	await unlink(aside);
	await syncFolder(folder);
	return readFile(path);
}
