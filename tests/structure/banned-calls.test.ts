import { expect, it } from 'vitest';
import { bannedCalls } from './banned-calls';
import { sourceFiles, sourceOf } from './source-files';

it('nobody calls what is banned where they are', () => {
	expect(sourceFiles().flatMap(bannedCalls)).toEqual([]);
});

it.each([
	['src/lib/kernel/a.ts', 'const now = Date.now();'],
	['src/lib/domain/a.ts', 'const now = new Date();'],
	['src/lib/domain/a.ts', 'const x = Math.random();'],
	['src/lib/domain/a.ts', 'await fetch("http://127.0.0.1")'],
	['src/lib/server/services/a.ts', 'const dir = process.env.DATA_DIR;'],
	['src/lib/server/services/a.ts', 'await this.sequelize.transaction(async () => {});'],
	['src/lib/server/data/migrations/a.ts', 'await queries.removeColumn("people", "name");'],
	['src/lib/server/data/queries/a.ts', 'await run(`PRAGMA foreign_keys = ${off}`);'],
	['src/lib/server/services/a.ts', 'import.meta.glob("/lessons/**");'],
	['src/routes/+page.svelte', '<script>const env = process.env;</script>']
])('sees %s: %s', (path, text) => {
	expect(bannedCalls(sourceOf(path, text))).toHaveLength(1);
});

it.each([
	['src/lib/domain/a.ts', 'const at = new Date(startedAtMs); const words = at.toISOString();'],
	['src/lib/server/config/env.ts', 'read(process.env)'],
	['src/lib/server/data/dialect/sqlite.ts', 'run("PRAGMA journal_mode = WAL")'],
	['src/lib/server/data/transaction.ts', 'sequelize.transaction(() => {})']
])('lets %s: %s', (path, text) => {
	expect(bannedCalls(sourceOf(path, text))).toEqual([]);
});
