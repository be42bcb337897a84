import { open } from 'node:fs/promises';

const headBytes = 4096;
/** A ZIP is found from its end: a record of 22 bytes and a comment of at most 65 535. */
const tailBytes = 22 + 65_535;

/**
 * What else a file would be taken for by a program that looks for it, or null. A picture that
 * is also an archive, a document or a page is no photograph from a bench. What phones hang on
 * behind (a moment of film, depth) is none of these.
 */
export async function alsoIs(path: string): Promise<'page' | 'document' | 'archive' | null> {
	const file = await open(path, 'r');
	try {
		const { size } = await file.stat();
		const head = await part(file, 0, Math.min(headBytes, size));
		const tail = await part(file, Math.max(0, size - tailBytes), Math.min(tailBytes, size));
		const text = head.toString('latin1');
		if (/<(!doctype|html|script|svg|iframe|body)[\s>/]/i.test(text)) return 'page';
		if (text.slice(0, 1029).includes('%PDF-')) return 'document';
		return endsAsArchive(tail) ? 'archive' : null;
	} finally {
		await file.close();
	}
}

async function part(file: Awaited<ReturnType<typeof open>>, position: number, length: number) {
	const buffer = Buffer.alloc(length);
	const { bytesRead } = await file.read(buffer, 0, length, position);
	return buffer.subarray(0, bytesRead);
}

/** The end record counts only where its comment ends the file: four bytes alone occur by chance. */
function endsAsArchive(tail: Buffer): boolean {
	const mark = Buffer.from('PK\x05\x06', 'latin1');
	for (let at = tail.indexOf(mark); at >= 0; at = tail.indexOf(mark, at + 1))
		if (at + 22 <= tail.length && at + 22 + tail.readUInt16LE(at + 20) === tail.length) return true;
	return false;
}
