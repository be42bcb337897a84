import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import { environmentKeys } from '$lib/server/config/env';
import { isThere, pathsNamedIn, tableUnder } from './documents';
import { policyRows } from './printed-policy';
import { root } from './source-files';

const read = (name: string) =>
	existsSync(join(root, name)) ? readFileSync(join(root, name), 'utf8') : '';
const unquoted = (cell: string | undefined) => (cell ?? '').replaceAll('`', '');

it.each(['README.md', 'DEVELOPERS.md'])('every path that %s names exists', (name) => {
	const named = pathsNamedIn(read(name));
	expect(named.length).toBeGreaterThan(2);
	expect(named.filter((path) => !isThere(path))).toEqual([]);
});

it('the environment table in DEVELOPERS.md has the keys of config/env.ts', () => {
	const rows = tableUnder(read('DEVELOPERS.md'), /environment/i);
	const printed = rows.map(([key]) => unquoted(key)).filter((key) => /^[A-Z][A-Z0-9_]+$/.test(key));
	expect(printed.toSorted()).toEqual(environmentKeys.toSorted());
});

it('the roles table in DEVELOPERS.md is the policy', () => {
	const rows = tableUnder(read('DEVELOPERS.md'), /roles/i).map((row) => row.map(unquoted));
	expect(rows.slice(1)).toEqual(policyRows());
});

it('tells paths from other words, and what is there from what is not', () => {
	const text =
		'See `src/lib/kernel/outcome.ts`, `domain/problem.ts`, `lessons/`, `npm start`, `application/json`, `/api/v1`, `not/there.ts`, [x](docs/x.png) and `kernel/*`.';
	const named = pathsNamedIn(text);
	expect(named).toEqual([
		'src/lib/kernel/outcome.ts',
		'domain/problem.ts',
		'lessons/',
		'not/there.ts',
		'kernel/*',
		'docs/x.png'
	]);
	expect(named.filter((path) => !isThere(path))).toEqual(['not/there.ts', 'docs/x.png']);
});

it('reads the tables of one section only', () => {
	const text = '# A\n| x | y |\n|---|:-:|\n| `K` | 1 \\| 2 |\n## Below\n| B |\n# C\n| Z |\n';
	expect(tableUnder(text, /^# A/)).toEqual([['x', 'y'], ['`K`', '1 \\| 2'], ['B']]);
});
