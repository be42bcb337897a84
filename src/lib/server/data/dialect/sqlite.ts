import sqlite3 from 'sqlite3';

/**
 * Every handle that Sequelize opens (one for reads, one for each transaction) gets these
 * settings the moment it exists. They are set here because this dialect never calls
 * `afterConnect`, and a PRAGMA sent through `sequelize.query` reaches one handle only.
 * FULL, because what the page calls saved must survive the power going in the next instant.
 */
const settings = [
	'PRAGMA journal_mode = WAL',
	'PRAGMA synchronous = FULL',
	'PRAGMA foreign_keys = ON',
	'PRAGMA busy_timeout = 5000',
	'PRAGMA trusted_schema = OFF'
].join(';');

class RinglandDatabase extends sqlite3.Database {
	constructor(file: string, mode?: number, opened?: (error: Error | null) => void) {
		super(file, mode ?? sqlite3.OPEN_READWRITE | sqlite3.OPEN_CREATE, (error) => {
			if (error) return opened?.(error);
			this.exec(settings, (problem) => opened?.(problem));
		});
	}
}

export const dialectModule = { ...sqlite3, Database: RinglandDatabase };

/** What the driver says when a constraint of the database refused a row. */
export function isConstraintFault(error: unknown): boolean {
	return error instanceof Error && /SQLITE_CONSTRAINT|constraint failed/i.test(error.message);
}
