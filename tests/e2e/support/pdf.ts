import { execFile } from 'node:child_process';
import { mkdtemp, readdir, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import jsQR from 'jsqr';
import sharp from 'sharp';

const run = promisify(execFile);

export type ReadPdf = {
	/** In one line, spaces single. */
	text: string;
	fonts: { name: string; embedded: boolean }[];
	/** What the code on the first sheet says, as a phone reads it from the printed page. */
	qr: string | null;
};

/** A PDF as poppler reads it, which is nobody's idea of ours. */
export async function readPdf(bytes: Buffer): Promise<ReadPdf> {
	const folder = await mkdtemp(join(tmpdir(), 'ringland-pdf-'));
	try {
		const path = join(folder, 'it.pdf');
		await writeFile(path, bytes);
		const { stdout: text } = await run('pdftotext', [path, '-']);
		const { stdout: fonts } = await run('pdffonts', [path]);
		await run('pdftoppm', ['-r', '150', '-png', '-f', '1', '-l', '1', path, join(folder, 'sheet')]);
		const sheet = (await readdir(folder)).find((name) => name.startsWith('sheet'));
		return {
			text: text.replace(/\s+/g, ' ').trim(),
			fonts: fonts.trim().split('\n').slice(2).map(fontIn),
			qr: sheet ? await qrIn(join(folder, sheet)) : null
		};
	} finally {
		await rm(folder, { recursive: true });
	}
}

/** A row of `pdffonts`: name, type, encoding, then whether embedded, subset and with Unicode. */
function fontIn(row: string): { name: string; embedded: boolean } {
	const [name = ''] = row.split(/\s/);
	return { name, embedded: /\s(yes|no)\s+(yes|no)\s+(yes|no)\s/.exec(row)?.[1] === 'yes' };
}

/** What the code in a picture says. */
export async function qrIn(picture: string | Buffer): Promise<string | null> {
	const { data, info } = await sharp(picture)
		.ensureAlpha()
		.raw()
		.toBuffer({ resolveWithObject: true });
	return jsQR(new Uint8ClampedArray(data), info.width, info.height)?.data ?? null;
}
