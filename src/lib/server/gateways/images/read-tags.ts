import jsQR from 'jsqr';
import type { Sharp } from 'sharp';
import { readTagQr } from '$lib/domain/job-sheets/evidence-tag';

type Corner = { x: number; y: number };
type Pixels = { data: Uint8ClampedArray; width: number; height: number };

const spendAtMostMs = 3_000;
const tagsAtMost = 3;

/**
 * The evidence tags in a photograph. Finds none where none can be read: the marker is told so
 * and decides, the photograph is taken in all the same.
 * @param picture gives the same picture anew at each call
 */
export async function readTags(picture: () => Sharp): Promise<string[]> {
	const until = performance.now() + spendAtMostMs;
	const found = new Set<string>();
	for (const pixels of views(picture)) {
		for (const code of codesIn(await pixels)) found.add(code);
		if (found.size > 0 || performance.now() > until) break;
	}
	return [...found];
}

/** Cheapest and likeliest first: a near tag reads best small, a far one needs every pixel. */
function* views(picture: () => Sharp): Generator<Promise<Pixels>> {
	const sized = (longestPx: number) =>
		picture().resize(longestPx, longestPx, { fit: 'inside', withoutEnlargement: true }).greyscale();
	yield pixelsOf(sized(1000));
	yield pixelsOf(sized(1600));
	// Oil, shade and a curled corner: evening the light out over small tiles brings squares back.
	yield pixelsOf(sized(1000).clahe({ width: 96, height: 96, maxSlope: 4 }));
	yield pixelsOf(sized(2560));
	yield pixelsOf(sized(640).normalise());
	yield pixelsOf(sized(1600).sharpen({ sigma: 1.5 }));
	yield pixelsOf(sized(1600).clahe({ width: 96, height: 96, maxSlope: 4 }));
}

/** The reader wants four channels and looks at brightness alone. */
async function pixelsOf(picture: Sharp): Promise<Pixels> {
	const { data: grey, info } = await picture
		.removeAlpha()
		.toColourspace('b-w')
		.raw()
		.toBuffer({ resolveWithObject: true });
	const data = new Uint8ClampedArray(info.width * info.height * 4).fill(255);
	for (let i = 0; i < info.width * info.height; i++)
		data.fill(grey[i * info.channels] ?? 0, i * 4, i * 4 + 3);
	return { data, width: info.width, height: info.height };
}

/** The reader gives one code a look, so what was read is painted over and looked at again. */
function codesIn(pixels: Pixels): string[] {
	const codes: string[] = [];
	for (let look = 0; look < tagsAtMost; look++) {
		const seen = jsQR(pixels.data, pixels.width, pixels.height, {
			inversionAttempts: look === 0 ? 'attemptBoth' : 'dontInvert'
		});
		if (!seen) break;
		const code = readTagQr(seen.data);
		if (code) codes.push(code);
		const { topLeftCorner, topRightCorner, bottomRightCorner, bottomLeftCorner } = seen.location;
		paintOver(pixels, [topLeftCorner, topRightCorner, bottomRightCorner, bottomLeftCorner]);
	}
	return codes;
}

function paintOver({ data, width, height }: Pixels, corners: Corner[]): void {
	const clamp = (value: number, most: number) => Math.max(0, Math.min(most, Math.round(value)));
	const xs = corners.map((one) => clamp(one.x, width));
	const ys = corners.map((one) => clamp(one.y, height));
	for (let y = Math.min(...ys); y < Math.max(...ys); y++)
		data.fill(255, (y * width + Math.min(...xs)) * 4, (y * width + Math.max(...xs)) * 4);
}
