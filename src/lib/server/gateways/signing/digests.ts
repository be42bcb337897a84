import { createHash, createHmac, timingSafeEqual } from 'node:crypto';

/** For tokens of 128 random bits and more: nothing to guess, so a plain hash is enough. */
export function sha256Hex(text: string | Uint8Array): string {
	return createHash('sha256').update(text).digest('hex');
}

/** For what could be guessed (an address, a device): useless without the key. */
export function hmacHex(key: Uint8Array, text: string | Uint8Array): string {
	return createHmac('sha256', key).update(text).digest('hex');
}

/** Takes as long for the first wrong digit as for the last. */
export function sameDigest(one: string, other: string): boolean {
	const [a, b] = [Buffer.from(one), Buffer.from(other)];
	return a.length === b.length && timingSafeEqual(a, b);
}
