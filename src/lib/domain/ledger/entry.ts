import canonicalize from 'canonicalize';

/** One line of a school's ledger. People stand in it by their pseudonymous id only. */
export type LedgerEntry = {
	schoolId: string;
	number: number;
	at: string;
	actorId: string;
	kind: string;
	subject: string;
	data: Record<string, unknown>;
	previousHash: string;
};

export const firstHash = '0'.repeat(64);

/** What is hashed: the entry as canonical JSON (RFC 8785), the hash before it included. */
export function sealedText(entry: LedgerEntry): string {
	const { schoolId, number, at, actorId, kind, subject, data, previousHash } = entry;
	const text = canonicalize({ schoolId, number, at, actorId, kind, subject, data, previousHash });
	if (text === undefined) throw new TypeError('a ledger entry is plain data');
	return text;
}

/**
 * An entry as one line of a file (JSON Lines): take `hash` out again, and what is left, as
 * canonical JSON, is the text that was hashed. An auditor needs nothing of ours to check it.
 */
export function fileLine(entry: LedgerEntry & { hash: string }): string {
	return canonicalize({ ...(JSON.parse(sealedText(entry)) as object), hash: entry.hash }) + '\n';
}

export type ChainFault = { number: number; because: string };

/**
 * Walks a whole chain, oldest first, and names the first thing that does not fit: a gap, a
 * changed line, or an end that was cut off (when a signed head from outside is given).
 * @param hash SHA-256 as lower-case hex, passed in because this layer does no crypto
 */
export function chainFault(
	entries: readonly (LedgerEntry & { hash: string })[],
	hash: (text: string) => string,
	head?: { number: number; hash: string }
): ChainFault | undefined {
	let previousHash = firstHash;
	for (const [index, entry] of entries.entries()) {
		const number = index + 1;
		if (entry.number !== number) return { number, because: 'A number is missing.' };
		if (entry.previousHash !== previousHash)
			return { number, because: 'It does not follow the entry before it.' };
		if (hash(sealedText(entry)) !== entry.hash)
			return { number, because: 'It was changed after it was written.' };
		previousHash = entry.hash;
	}
	if (!head) return undefined;
	const standing = entries[head.number - 1];
	if (!standing) return { number: head.number, because: 'The end of the ledger was cut off.' };
	return standing.hash === head.hash
		? undefined
		: { number: head.number, because: 'It is not the entry that the signed head names.' };
}
