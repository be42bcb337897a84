export const photographTypes = ['image/jpeg', 'image/png', 'image/webp', 'image/avif'] as const;
export type MediaType = (typeof photographTypes)[number] | 'application/pdf';

/** How many first bytes `mediaTypeOf` needs to see. */
export const sniffBytes = 64;

/** What the bytes themselves say. A name or a header sent along counts for nothing. */
export function mediaTypeOf(head: Buffer): MediaType | 'image/heic' | null {
	const at = (offset: number, bytes: string) =>
		head.subarray(offset, offset + bytes.length).toString('latin1') === bytes;
	if (at(0, '\xff\xd8\xff')) return 'image/jpeg';
	if (at(0, '\x89PNG\r\n\x1a\n')) return 'image/png';
	if (at(0, 'RIFF') && at(8, 'WEBP')) return 'image/webp';
	if (at(0, '%PDF-')) return 'application/pdf';
	if (at(4, 'ftyp')) return brandOf(head);
	return null;
}

/** ISO base media: a major brand, a version, then compatible brands of four letters each. */
function brandOf(head: Buffer): 'image/avif' | 'image/heic' | null {
	const boxBytes = Math.min(head.readUInt32BE(0), head.length);
	const brands: string[] = [];
	for (let offset = 8; offset + 4 <= boxBytes; offset += offset === 8 ? 8 : 4)
		brands.push(head.subarray(offset, offset + 4).toString('latin1'));
	if (brands.includes('avif')) return 'image/avif';
	return brands.some((one) => /^(hei[cxms]|hev[cxms]|mif1)$/.test(one)) ? 'image/heic' : null;
}
