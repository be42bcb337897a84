import { expect, it } from 'vitest';
import { arrowFaults } from './arrows';
import { circles } from './circles';
import { importsOf, sourceFiles, sourceOf } from './source-files';

it('every import follows the arrows of the house', () => {
	expect(sourceFiles().length).toBeGreaterThan(100);
	expect(sourceFiles().flatMap(arrowFaults)).toEqual([]);
});

it('no file imports itself by a circle, types included', () => {
	const graph = new Map(
		sourceFiles().map((file) => [
			file.path,
			importsOf(file).flatMap(({ target }) => (target === undefined ? [] : [target]))
		])
	);
	expect(circles(graph)).toEqual([]);
});

it.each([
	['src/lib/kernel/a.ts', `import { z } from 'zod'`],
	['src/lib/kernel/a.ts', `export { b } from '../domain/b'`],
	['src/lib/domain/a.ts', `import type { Config } from '$lib/server/config/env'`],
	['src/lib/domain/a.ts', `import { readFile } from 'node:fs/promises'`],
	['src/lib/ui/sheet/A.svelte', `<script>import { page } from '$app/state';</script>`],
	['src/lib/ui/sheet/A.svelte', `{#await import('$lib/client/send') then x}{x}{/await}`],
	['src/lib/server/services/quizzes/a.ts', `import { error } from '@sveltejs/kit'`],
	['src/lib/server/services/quizzes/a.ts', `import { b } from '../marking/b'`],
	['src/lib/server/services/use-case.ts', `import { b } from './marking/b'`],
	['src/lib/server/services/quizzes/a.ts', `const s = await import('sequelize')`],
	['src/lib/server/gateways/mail/a.ts', `type S = import('stripe').Stripe`],
	['src/lib/server/worker/a.ts', `import { house } from '../http/boot'`],
	['src/routes/+page.server.ts', `import { rows } from '$lib/server/data/rows'`],
	['src/routes/+page.server.ts', `import { DATA_DIR } from '$env/static/private'`],
	['src/lib/helpers/a.ts', '']
])('sees a wrong arrow in %s: %s', (path, text) => {
	expect(arrowFaults(sourceOf(path, text))).toHaveLength(1);
});

it('lets the right ones through', () => {
	const good = `import { z } from 'zod'; import { cannot } from '$lib/kernel/outcome'`;
	expect(arrowFaults(sourceOf('src/lib/domain/a.ts', good))).toEqual([]);
	const page = `<script lang="ts">import Sheet from '$lib/ui/sheet/Sheet.svelte';</script>`;
	expect(arrowFaults(sourceOf('src/routes/+page.svelte', page))).toEqual([]);
});

it('sees circles of two, of three and of one', () => {
	const graph = new Map([
		['a', ['b']],
		['b', ['c', 'd']],
		['c', ['a']],
		['d', ['d']],
		['e', ['a']]
	]);
	expect(circles(graph)).toEqual([['d'], ['a', 'b', 'c']]);
});
