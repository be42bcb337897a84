import { base32 } from '../ids';

/** Sixteen characters of Crockford's base 32: 80 random bits, stored without the dashes. */
export type TagCode = string;

/** Ours, with a version: any other QR code in a photograph (a parts box, a poster) is not a tag. */
export const tagPrefix = 'RLT1:';

/** @param chance ten random bytes; the caller takes them from getRandomValues */
export function tagCode(chance: Uint8Array): TagCode {
	if (chance.length !== 10) throw new RangeError('chance must be ten bytes');
	return base32(chance);
}

/** As people read it aloud and type it: `9FQ4-7K2M-X0AB-3DZW`. */
export function tagWords(code: TagCode): string {
	return code.replace(/(.{4})(?=.)/g, '$1-');
}

/** What the printed or shown QR code says. Capitals and digits only, so that it stays coarse. */
export function tagQrText(code: TagCode): string {
	return tagPrefix + code;
}

/** The tag code in what a QR code says, or null where it is not one of ours. */
export function readTagQr(text: string): TagCode | null {
	return text.startsWith(tagPrefix) ? readTag(text.slice(tagPrefix.length)) : null;
}

/** A typed code: small letters, dashes, spaces, and O, I, L taken for what they look like. */
export function readTag(typed: string): TagCode | null {
	const code = typed.toUpperCase().replace(/[\s-]/g, '').replace(/O/g, '0').replace(/[IL]/g, '1');
	return /^[0-9A-HJKMNP-TV-Z]{16}$/.test(code) ? code : null;
}

export type TagFound = 'this-attempt' | 'another' | 'none';

/**
 * @param wanted the attempt's own tag
 * @param seen every tag that was read from the photograph: partners may lay two beside a part
 */
export function tagFound(wanted: TagCode, seen: readonly TagCode[]): TagFound {
	if (seen.includes(wanted)) return 'this-attempt';
	return seen.length > 0 ? 'another' : 'none';
}
