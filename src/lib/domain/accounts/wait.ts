const secondMs = 1000;

/** Free tries, then a wait that doubles: 30 s, 1 min, 2 min … up to half an hour. */
export const freeTries = { account: 5, address: 20 } as const;
const firstWaitMs = 30 * secondMs;
const longestWaitMs = 30 * 60 * secondMs;
/** After a quiet day the count begins anew. */
export const forgottenAfterMs = 24 * 3600 * secondMs;

/** How long nobody may try again after this many failures in a row. */
export function waitMs(failures: number, kind: keyof typeof freeTries): number {
	const beyond = failures - freeTries[kind];
	return beyond < 0 ? 0 : Math.min(longestWaitMs, firstWaitMs * 2 ** Math.min(beyond, 10));
}

/** One bucket an address; for IPv6 one a /64, which is what one household or attacker holds. */
export function addressBucket(address: string): string {
	const plain = address.replace(/^::ffff:(?=\d+\.)/i, '').replace(/%.*$/, '');
	return plain.includes(':') ? `${first64(plain)}::/64` : plain;
}

function first64(address: string): string {
	const [left = '', right] = address.toLowerCase().split('::');
	const head = left === '' ? [] : left.split(':');
	const tail = right === undefined || right === '' ? [] : right.split(':');
	const zeros = right === undefined ? 0 : 8 - head.length - tail.length;
	const groups = [...head, ...Array<string>(Math.max(0, zeros)).fill('0'), ...tail];
	return groups
		.slice(0, 4)
		.map((group) => (parseInt(group, 16) || 0).toString(16))
		.join(':');
}
