/**
 * What counts as one address: an IPv4 address as it is, an IPv6 address by its first 64 bits,
 * since one subscriber has all of the rest to choose from. Anything else is kept as it came.
 */
export function addressBlock(address: string): string {
	const plain = (address.trim().toLowerCase().split('%')[0] ?? '').replace(/^\[|\]$/g, '');
	const mapped = /^::ffff:(\d{1,3}(?:\.\d{1,3}){3})$/.exec(plain);
	if (mapped?.[1]) return mapped[1];
	const groups = plain.includes(':') ? expand(plain) : undefined;
	return groups ? `${groups.slice(0, 4).join(':')}::/64` : plain;
}

/** The eight groups of an IPv6 address without leading zeros; undefined where it is none. */
function expand(address: string): string[] | undefined {
	const [left = '', right, ...more] = address.split('::');
	if (more.length > 0) return undefined;
	const head = groupsOf(left);
	const tail = right === undefined ? [] : groupsOf(right);
	const missing = 8 - head.length - tail.length;
	if (right === undefined ? missing !== 0 : missing < 1) return undefined;
	const groups = [...head, ...Array<string>(missing).fill('0'), ...tail];
	return groups.every((one) => /^[0-9a-f]{1,4}$/.test(one))
		? groups.map((one) => Number.parseInt(one, 16).toString(16))
		: undefined;
}

/** A dotted end (as in `64:ff9b::192.0.2.1`) stands for two groups. */
function groupsOf(text: string): string[] {
	if (text === '') return [];
	return text.split(':').flatMap((one) => {
		const bytes = one.split('.').map(Number);
		const [a = 0, b = 0, c = 0, d = 0] = bytes;
		return bytes.length === 4 ? [(a * 256 + b).toString(16), (c * 256 + d).toString(16)] : [one];
	});
}
