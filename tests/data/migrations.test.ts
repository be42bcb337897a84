import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { QueryTypes } from 'sequelize';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { openDatabase, type Database } from '$lib/server/data/database';
import { migrate, migrations } from '$lib/server/data/migrations';
import { tables } from '$lib/server/data/models';

let folder: string;
let database: Database;
beforeEach(() => {
	folder = mkdtempSync(join(tmpdir(), 'ringland-'));
	database = openDatabase(join(folder, 'ringland.sqlite'));
});
afterEach(async () => {
	await database.close();
	rmSync(folder, { recursive: true });
});
const read = <R extends object>(text: string) =>
	database.sequelize.query<R>(text, { type: QueryTypes.SELECT });

describe('migrations', () => {
	it.each(migrations.map((one) => one.name))(
		'bring a file that stands at %s to the newest',
		async (name) => {
			await migrate(database, name);
			await migrate(database);
			expect(await read('PRAGMA foreign_key_check')).toEqual([]);
			expect(await read('PRAGMA integrity_check')).toEqual([{ integrity_check: 'ok' }]);
			expect(await migrate(database)).toEqual([]);
		}
	);

	it('make exactly the tables and columns that the models declare', async () => {
		await migrate(database);
		const found = await read<{ name: string }>(
			"SELECT name FROM sqlite_master WHERE type = 'table' AND name NOT LIKE 'sqlite_%' AND name <> 'migrations' ORDER BY name"
		);
		expect(found.map((one) => one.name)).toEqual(tables.map((one) => one.name).sort());
		for (const table of tables) {
			const columns = await read<{ name: string; notnull: number; pk: number; type: string }>(
				`PRAGMA table_info(${table.name})`
			);
			const inFile = columns
				.map((one) => `${one.name} ${one.type} ${one.pk > 0 ? 'key' : ''}`)
				.sort();
			const declared = Object.entries(table.columns)
				.map(
					([name, one]) =>
						`${name} ${one.kind === 'json' ? 'TEXT' : one.kind.toUpperCase()} ${one.key ? 'key' : ''}`
				)
				.sort();
			expect(declared, table.name).toEqual(inFile);
			for (const one of columns)
				if (one.pk === 0)
					expect(table.columns[one.name]?.nullable, `${table.name}.${one.name}`).toBe(
						one.notnull === 0
					);
		}
	});

	it('refuse a row that would join two schools', async () => {
		await migrate(database);
		const run = (text: string) => database.sequelize.query(text);
		for (const id of ['A', 'B'])
			await run(
				`INSERT INTO schools VALUES ('${id}', '${id}', '${id}', 'x', 'en-GB', 'UTC', 'EUR', '2026')`
			);
		await run(`INSERT INTO accounts VALUES ('a', 'a@x.example', 'A', NULL, NULL, '2026')`);
		await run(`INSERT INTO people VALUES ('A', 'p', 'a', 'A', NULL, 0, '2026')`);
		await expect(
			run(`INSERT INTO person_roles VALUES ('B', 'p', 'admin', '2026')`)
		).rejects.toThrow(/FOREIGN KEY/);
		await run(`INSERT INTO person_roles VALUES ('A', 'p', 'admin', '2026')`);
	});
});
