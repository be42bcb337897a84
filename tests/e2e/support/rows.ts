import sqlite3 from 'sqlite3';
import { join } from 'node:path';

/** Looks into a site's file while it runs: reading beside a writer is what WAL is for. */
export function rowsOf<Row>(dataDir: string, statement: string): Promise<Row[]> {
	return new Promise((resolve, reject) => {
		const file = join(dataDir, 'ringland.sqlite');
		const database = new sqlite3.Database(file, sqlite3.OPEN_READONLY, (fault) => {
			if (fault) return reject(fault);
			database.all(statement, (error: Error | null, rows: Row[]) => {
				database.close();
				if (error) reject(error);
				else resolve(rows);
			});
		});
	});
}
