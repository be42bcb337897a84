import { AsyncLocalStorage } from 'node:async_hooks';
import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';
import { Sequelize, type Model, type ModelStatic } from 'sequelize';
import { dialectModule } from './dialect/sqlite';
import { tables } from './models';
import { defineModel, type Plain, type Table } from './table';

/**
 * A query inside a transaction that forgot to name it would use the read handle and wait for
 * itself. Sequelize asks this store for the running transaction, so that it cannot happen.
 */
const running = new AsyncLocalStorage<Map<string, unknown>>();
Sequelize.useCLS({
	get: (name: string) => running.getStore()?.get(name),
	set: (name: string, value: unknown) => {
		running.getStore()?.set(name, value);
	},
	run: (work: (context: unknown) => unknown) =>
		running.run(new Map(), () => work(running.getStore())),
	bind: (work: unknown) => work
} as never);

export type Database = {
	file: string;
	sequelize: Sequelize;
	model: (table: Table) => ModelStatic<Model<Plain, Plain>>;
	close: () => Promise<void>;
};

/** Opens one database file. `:memory:` is refused: its one shared connection breaks transactions. */
export function openDatabase(file: string): Database {
	if (file.includes(':memory:')) throw new Error('Open a file: a memory database has one handle.');
	mkdirSync(dirname(file), { recursive: true });
	const sequelize = new Sequelize({
		dialect: 'sqlite',
		storage: file,
		dialectModule,
		logging: false,
		retry: { max: 1 } // waiting is the write queue's business, not the driver's
	});
	const models = new Map(tables.map((one) => [one.name, defineModel(sequelize, one)]));
	return {
		file,
		sequelize,
		model(table) {
			const found = models.get(table.name);
			if (!found) throw new Error(`${table.name} is missing from data/models/index.ts`);
			return found;
		},
		close: () => sequelize.close()
	};
}
