import { appendFile, mkdir, open } from 'node:fs/promises';
import { join } from 'node:path';
import canonicalize from 'canonicalize';
import { lastEntry } from '../../data/queries/ledger';
import { allSchools } from '../../data/queries/schools';
import { commonScope, within } from '../../data/scope';
import type { House } from '../../services/house';

/**
 * Writes each school's newest ledger number and hash, signed, to a file outside the database:
 * whoever cuts the ledger's end off would have to reach this file too. One line a day is enough;
 * the same head twice does no harm, so the job may run again.
 */
export async function signLedgerHeads(house: House): Promise<void> {
	const scope = commonScope(house.database, null);
	const folder = join(house.config.DATA_DIR, 'ledger-heads');
	await mkdir(folder, { recursive: true });
	for (const school of await allSchools(scope)) {
		const last = await lastEntry(within(scope, school.id));
		if (!last) continue;
		const head = {
			schoolId: school.id,
			number: last.number,
			hash: last.hash,
			at: house.now().toISOString()
		};
		const signed = house.gateways.signing.sign(Buffer.from(canonicalize(head) ?? ''));
		const file = join(folder, `${school.id}.jsonl`);
		await appendFile(file, JSON.stringify({ ...head, ...signed }) + '\n');
		await toDisk(file);
	}
}

async function toDisk(file: string): Promise<void> {
	const handle = await open(file, 'r');
	try {
		await handle.sync();
	} finally {
		await handle.close();
	}
}
