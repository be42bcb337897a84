import type { Sharp } from 'sharp';

/**
 * A difference hash: of each of 8 rows of 9 grey cells, whether the next cell is brighter.
 * Saving a picture again, smaller or coarser, changes few of the 64 bits.
 */
export async function likenessOf(picture: Sharp): Promise<string> {
	const grey = await picture.greyscale().resize(9, 8, { fit: 'fill' }).raw().toBuffer();
	let hex = '';
	for (let row = 0; row < 8; row++) {
		let bits = 0;
		for (let column = 0; column < 8; column++) {
			const at = row * 9 + column;
			bits = (bits << 1) | ((grey[at + 1] ?? 0) > (grey[at] ?? 0) ? 1 : 0);
		}
		hex += bits.toString(16).padStart(2, '0');
	}
	return hex;
}

/** How many of the 64 bits differ. Unrelated pictures lie near 32; 8 and less is worth a look. */
export function likenessDistance(one: string, other: string): number {
	const different = BigInt(`0x${one}`) ^ BigInt(`0x${other}`);
	return [...different.toString(2)].filter((bit) => bit === '1').length;
}
