const alphabet = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';

/** A ULID (26 characters, sorts by time), as described at github.com/ulid/spec. */
export type Ulid = string;

/**
 * @param nowMs milliseconds since 1970, 0 to 2^48 - 1
 * @param chance ten random bytes; the caller takes them from getRandomValues
 */
export function ulid(nowMs: number, chance: Uint8Array): Ulid {
	if (!Number.isInteger(nowMs) || nowMs < 0 || nowMs >= 2 ** 48) throw new RangeError('nowMs');
	if (chance.length !== 10) throw new RangeError('chance must be ten bytes');
	let time = '';
	for (let rest = nowMs, i = 0; i < 10; i++, rest = Math.floor(rest / 32))
		time = alphabet.charAt(rest % 32) + time;
	return time + base32(chance);
}

/** Crockford's base 32 without padding; 5 bytes give 8 characters. */
export function base32(bytes: Uint8Array): string {
	let out = '';
	let held = 0;
	let bits = 0;
	for (const byte of bytes) {
		held = (held << 8) | byte;
		bits += 8;
		while (bits >= 5) {
			bits -= 5;
			out += alphabet.charAt((held >>> bits) & 31);
		}
		held &= (1 << bits) - 1;
	}
	return bits > 0 ? out + alphabet.charAt((held << (5 - bits)) & 31) : out;
}

export function isUlid(text: string): boolean {
	return /^[0-7][0-9A-HJKMNP-TV-Z]{25}$/.test(text);
}
