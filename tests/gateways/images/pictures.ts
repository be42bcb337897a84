import { mkdtemp, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp, { type Sharp } from 'sharp';
import { tagQrText } from '$lib/domain/job-sheets/evidence-tag';
import { qrSvg } from '$lib/server/gateways/qr/qr';

export async function folder(): Promise<string> {
	return mkdtemp(join(tmpdir(), 'ringland-images-'));
}

export async function saved(at: string, name: string, bytes: Uint8Array): Promise<string> {
	const path = join(at, name);
	await writeFile(path, bytes);
	return path;
}

/** A bench seen from above: uneven light, grain, and things of every shade. Same bytes each time. */
export function bench(width: number, height: number): Sharp {
	const grain = Buffer.alloc(width * height * 3);
	let state = 7;
	for (let i = 0; i < grain.length; i++) {
		state = (Math.imul(state, 1103515245) + 12345) >>> 0;
		grain[i] = 96 + ((state >>> 24) % 48);
	}
	const scene = `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}">
		<defs><linearGradient id="l"><stop stop-color="#000" stop-opacity=".55"/><stop offset="1" stop-color="#fff" stop-opacity=".35"/></linearGradient></defs>
		<rect x="${width * 0.1}" y="${height * 0.15}" width="${width * 0.5}" height="${height * 0.2}" fill="#c3c8cc"/>
		<circle cx="${width * 0.7}" cy="${height * 0.35}" r="${height * 0.12}" fill="#5b4630"/>
		<rect width="${width}" height="${height}" fill="url(#l)"/></svg>`;
	return sharp(grain, { raw: { width, height, channels: 3 } }).composite([
		{ input: Buffer.from(scene) }
	]);
}

export async function printedTag(code: string, sidePx: number, turned = 0): Promise<Buffer> {
	const svg = qrSvg(tagQrText(code), 'evidence tag', 'Q');
	return sharp(Buffer.from(svg), { density: 300 })
		.resize(sidePx, sidePx, { kernel: 'nearest' })
		.flatten({ background: '#ffffff' })
		.rotate(turned, { background: { r: 0, g: 0, b: 0, alpha: 0 } })
		.png()
		.toBuffer();
}

export async function laid(on: Sharp, tags: { input: Buffer; left: number; top: number }[]) {
	return sharp(await on.png().toBuffer()).composite(tags);
}
