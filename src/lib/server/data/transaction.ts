import { Transaction } from 'sequelize';
import type { Database } from './database';

/**
 * The only caller of `sequelize.transaction`. Writers of this process wait in one line: SQLite
 * lets one write at a time, and a writer that waits inside the driver holds one of the few
 * threads that the holder of the lock needs to finish.
 */
const lines = new WeakMap<Database, Promise<unknown>>();

export function inTransaction<T>(
	database: Database,
	work: (transaction: Transaction) => Promise<T>
): Promise<T> {
	const before = lines.get(database) ?? Promise.resolve();
	const turn = before.then(() =>
		database.sequelize.transaction({ type: Transaction.TYPES.IMMEDIATE }, work)
	);
	lines.set(
		database,
		turn.catch(() => undefined)
	);
	return turn;
}

/** Resolves when every write that has joined the line is done: the last step before closing. */
export async function writesDone(database: Database): Promise<void> {
	await lines.get(database);
}
