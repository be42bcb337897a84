import { execFile, execFileSync } from 'node:child_process';
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import jsQR from 'jsqr';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
	certificateCaution,
	checkAddress,
	type CertificateFace
} from '$lib/domain/certificates/face';
import { makePdfPrinter } from '$lib/server/gateways/pdf';
import { face } from '../../domain/certificates/example';

const run = promisify(execFile);
const printer = makePdfPrinter();
const address = checkAddress('https://ringland.example', face.code);
let folder = '';
let path = '';

/** Debian's poppler-utils reads what we wrote. Where it is absent these checks are skipped by name. */
const has = (program: string) => {
	try {
		execFileSync('which', [program], { stdio: 'ignore' });
		return true;
	} catch {
		return false;
	}
};
const poppler = has('pdftotext') && has('pdffonts') && has('pdftoppm') && has('pdfinfo');

const long: CertificateFace = {
	...face,
	outcomes: Array.from({ length: 14 }, (_, i) => `Outcome ${i + 1}: ${face.outcomes[1]}`),
	tasks: Array.from({ length: 16 }, (_, i) => ({
		...face.tasks[1]!,
		title: `Task ${i + 1}, ${face.tasks[1]!.title}`
	}))
};

beforeAll(async () => {
	folder = await mkdtemp(join(tmpdir(), 'ringland-pdf-'));
	path = join(folder, 'certificate.pdf');
	await writeFile(path, await printer.printCertificate({ face, checkAddress: address }));
});
afterAll(async () => {
	await printer.close();
	await rm(folder, { recursive: true });
});

const words = (text: string) => text.replace(/\s+/g, ' ');

it('gives the same bytes for the same facts, and other bytes for others', async () => {
	const first = await readFile(path);
	expect(first.equals(await printer.printCertificate({ face, checkAddress: address }))).toBe(true);
	const other = { ...face, awardedOn: '2026-03-21' };
	expect(first.equals(await printer.printCertificate({ face: other, checkAddress: address }))).toBe(
		false
	);
});

it('refuses letters that it cannot print, and prints Greek and Cyrillic names', async () => {
	const named = (personName: string) =>
		printer.printCertificate({ face: { ...face, personName }, checkAddress: address });
	await expect(named('漢字 Name')).rejects.toMatchObject({
		code: 'refused',
		parameters: { letters: '漢 字' }
	});
	expect((await named('Λένα Жукова')).subarray(0, 8).toString()).toBe('%PDF-1.7');
});

describe.skipIf(!poppler)('as poppler reads it (skipped: install poppler-utils)', () => {
	it('says whose, what, where, how, and what was not assessed', async () => {
		const { stdout } = await run('pdftotext', ['-layout', path, '-']);
		const text = words(stdout);
		for (const part of [
			face.personName,
			face.course.title,
			'Averholm Trade School',
			'20 March 2026',
			'AV3-1150, stand 4',
			'12 h 30 min',
			'Halvard Quist',
			face.code,
			'Sheet'.toUpperCase(),
			...face.notAssessed,
			...face.outcomes
		])
			expect(text).toContain(part);
		const { stdout: reading } = await run('pdftotext', [path, '-']);
		for (const part of [...face.because, certificateCaution, 'in a pair (took the readings'])
			expect(words(reading)).toContain(part);
	});

	it('is tagged, titled, in English, on A4', async () => {
		const { stdout } = await run('pdfinfo', [path]);
		expect(stdout).toMatch(/Tagged:\s+yes/);
		expect(stdout).toMatch(/Page size:\s+595\.28 x 841\.89 pts \(A4\)/);
		expect(stdout).toContain(`Certificate: ${face.course.title}, ${face.personName}`);
		const { stdout: structure } = await run('pdfinfo', ['-struct-text', path]);
		for (const tag of [
			'Document',
			'H1',
			'H2',
			'P ',
			'Figure',
			'L ',
			'LI',
			'Table',
			'TR',
			'TH',
			'TD'
		])
			expect(structure).toContain(tag);
		expect(words(structure)).toMatch(new RegExp(`H1[^"]*"${face.personName}`));
	});

	it('embeds every font as a subset of its own', async () => {
		const { stdout } = await run('pdffonts', [path]);
		const fonts = stdout.trim().split('\n').slice(2);
		for (const family of ['BarlowCondensed', 'AtkinsonHyperlegibleNext', 'SplineSansMono'])
			expect(fonts.some((one) => one.includes(family))).toBe(true);
		for (const font of fonts) expect(font).toMatch(/\+.*\byes\s+yes\s+yes\b/);
	});

	it('carries a code that a phone reads', async () => {
		await run('pdftoppm', ['-r', '150', '-png', '-f', '1', '-l', '1', path, join(folder, 'page')]);
		const [page] = (await run('sh', ['-c', `ls ${join(folder, 'page')}*.png`])).stdout
			.trim()
			.split('\n');
		const { data, info } = await sharp(page)
			.ensureAlpha()
			.raw()
			.toBuffer({ resolveWithObject: true });
		expect(jsQR(new Uint8ClampedArray(data), info.width, info.height)?.data).toBe(address);
	});

	it('goes on over sheets when it is long, with the code on each', async () => {
		const longPath = join(folder, 'long.pdf');
		await writeFile(
			longPath,
			await printer.printCertificate({ face: long, checkAddress: address })
		);
		const { stdout } = await run('pdftotext', ['-layout', longPath, '-']);
		const sheets = stdout.split('\f').filter((one) => one.trim());
		expect(sheets.length).toBeGreaterThan(1);
		sheets.forEach((sheet, at) => {
			expect(sheet).toContain(`${at + 1} / ${sheets.length}`);
			expect(sheet).toContain(face.code);
		});
		for (const task of long.tasks) expect(words(stdout)).toContain(task.title.split(',')[0]);
	});

	it.skipIf(!has('qpdf'))('has no structural fault (skipped: install qpdf)', async () => {
		await expect(run('qpdf', ['--check', path])).resolves.toBeDefined();
	});
});
