const alphabet = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';

/** `RL-XXXX-XXXX-XXXX`: 55 random bits and a check character, in Crockford's base 32. */
export type CertificateCode = string;

/** @param chance seven random bytes; the caller takes them from getRandomValues */
export function certificateCode(chance: Uint8Array): CertificateCode {
	if (chance.length !== 7) throw new RangeError('chance must be seven bytes');
	let bits = [...chance].reduce((sum, byte) => (sum << 8n) | BigInt(byte), 0n) >> 1n;
	const values: number[] = [];
	for (let i = 0; i < 11; i++, bits >>= 5n) values.unshift(Number(bits & 31n));
	return written([...values, checkOf(values)]);
}

/**
 * What a person typed, as it stands on the certificate; null where no certificate can have it.
 * Small letters, spaces and dashes do not matter, nor whether `RL` is there; O is read as 0,
 * I and L as 1. One wrong character, or two that changed places, are noticed.
 */
export function readCertificateCode(typed: string): CertificateCode | null {
	const plain = typed
		.toUpperCase()
		.replace(/[\s\-–]/g, '')
		.replace(/O/g, '0')
		.replace(/[IL]/g, '1');
	const body = plain.length === 14 ? plain.replace(/^R1/, '') : plain;
	if (!/^[0-9A-HJKMNP-TV-Z]{12}$/.test(body)) return null;
	const values = [...body].map((one) => alphabet.indexOf(one));
	return checkOf(values.slice(0, 11)) === values[11] ? written(values) : null;
}

function written(values: number[]): CertificateCode {
	const text = values.map((one) => alphabet.charAt(one)).join('');
	return `RL-${text.slice(0, 4)}-${text.slice(4, 8)}-${text.slice(8)}`;
}

/**
 * In the field of 32 elements (x^5 + x^2 + 1) the sum of each character times its own power of x
 * comes to the check: different powers are what notices that two characters changed places.
 */
function checkOf(values: number[]): number {
	return values.reduceRight((sum, one) => timesX(sum ^ one), 0);
}

function timesX(element: number): number {
	const shifted = element << 1;
	return shifted & 32 ? shifted ^ 0b100101 : shifted;
}
