import { createHash } from 'node:crypto';
import { firstHash, sealedText, type LedgerEntry } from '$lib/domain/ledger/entry';
import { ledgerEntries } from '../models';
import { find, insert, select } from '../rows';
import type { SchoolScope } from '../scope';

export type LedgerLine = Pick<LedgerEntry, 'kind' | 'subject' | 'data'>;

export function hashOf(text: string): string {
	return createHash('sha256').update(text).digest('hex');
}

/** Adds a line at the end of the school's chain. Only inside a transaction: the end must not move. */
export async function appendToLedger(
	scope: SchoolScope,
	line: LedgerLine & { actorId: string; at: string }
): Promise<void> {
	if (!scope.transaction) throw new Error('the ledger is written inside a transaction');
	const last = await lastEntry(scope);
	const entry: LedgerEntry = {
		schoolId: scope.schoolId,
		number: (last?.number ?? 0) + 1,
		at: line.at,
		actorId: line.actorId,
		kind: line.kind,
		subject: line.subject,
		data: line.data,
		previousHash: last?.hash ?? firstHash
	};
	await insert(scope, ledgerEntries, { ...entry, hash: hashOf(sealedText(entry)) });
}

export function lastEntry(scope: SchoolScope) {
	return find(scope, ledgerEntries, {}, { order: [['number', 'desc']] });
}

export function readLedger(scope: SchoolScope, page?: { limit: number; before?: number }) {
	return select(
		scope,
		ledgerEntries,
		page?.before === undefined ? {} : { number: { below: page.before } },
		page ? { order: [['number', 'desc']], limit: page.limit } : { order: [['number', 'asc']] }
	);
}
