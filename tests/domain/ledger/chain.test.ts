import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chainFault, firstHash, sealedText, type LedgerEntry } from '$lib/domain/ledger/entry';

const hash = (text: string) => createHash('sha256').update(text).digest('hex');

function chainOf(length: number): (LedgerEntry & { hash: string })[] {
	const chain: (LedgerEntry & { hash: string })[] = [];
	for (let number = 1; number <= length; number++) {
		const entry: LedgerEntry = {
			schoolId: 's',
			number,
			at: `2026-01-01T00:00:${String(number).padStart(2, '0')}Z`,
			actorId: 'p',
			kind: 'mark-signed',
			subject: `m${number}`,
			data: { level: number },
			previousHash: chain.at(-1)?.hash ?? firstHash
		};
		chain.push({ ...entry, hash: hash(sealedText(entry)) });
	}
	return chain;
}

describe('a ledger', () => {
	it('holds as it was written', () => {
		const chain = chainOf(9);
		const head = { number: 9, hash: chain[8]?.hash ?? '' };
		expect(chainFault(chain, hash, head)).toBeUndefined();
	});
	it('shows any change, at the entry that was changed', () => {
		fc.assert(
			fc.property(
				fc.integer({ min: 1, max: 9 }),
				fc.constantFrom('actorId', 'kind', 'subject', 'at'),
				(number, field) => {
					const chain = chainOf(9).map((one) =>
						one.number === number ? { ...one, [field]: 'forged' } : one
					);
					expect(chainFault(chain, hash)?.number).toBe(number);
				}
			)
		);
	});
	it('shows a change even when the changed entry is hashed anew', () => {
		const chain = chainOf(9);
		const forged = { ...(chain[3] as LedgerEntry & { hash: string }), data: { level: 99 } };
		chain[3] = { ...forged, hash: hash(sealedText(forged)) };
		expect(chainFault(chain, hash)?.number).toBe(5);
	});
	it('shows a missing entry, and an end cut off below the signed head', () => {
		const chain = chainOf(9);
		const head = { number: 9, hash: chain[8]?.hash ?? '' };
		expect(chainFault(chain.toSpliced(4, 1), hash)).toEqual({
			number: 5,
			because: 'A number is missing.'
		});
		expect(chainFault(chain.slice(0, 7), hash, head)?.because).toBe(
			'The end of the ledger was cut off.'
		);
	});
	it('is hashed over canonical JSON: the order of keys does not matter (RFC 8785)', () => {
		const [entry] = chainOf(1);
		if (!entry) throw new Error('a chain of one');
		const turned = Object.fromEntries(Object.entries(entry).reverse()) as LedgerEntry;
		expect(sealedText(turned)).toBe(sealedText(entry));
	});
});
