import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { register } from '$lib/kernel/register';

const kernel = join(import.meta.dirname, '../../src/lib/kernel');

describe('the register of formulas', () => {
	it.each(register.map((one) => [one.id, one] as const))('%s: its example', (_, one) => {
		const { gives, wanted, within } = one.example;
		const found = gives();
		if (typeof found !== 'number' && !found.ok) throw new Error(found.because);
		const value = typeof found === 'number' ? found : found.value;
		expect(Math.abs(value - wanted)).toBeLessThanOrEqual(within);
		// An example that any result would pass shows nothing.
		expect(within).toBeLessThan(Math.abs(wanted) * 0.02);
		expect(one.source.length).toBeGreaterThan(5);
	});
	it('names each formula once', () => {
		expect(new Set(register.map(({ id }) => id)).size).toBe(register.length);
		expect(new Set(register.map(({ works }) => works)).size).toBe(register.length);
	});
	it('has every function whose docstring states a formula, and no other', () => {
		const stated = readdirSync(kernel, { recursive: true, encoding: 'utf8' })
			.filter((path) => path.endsWith('.ts'))
			.flatMap((path) =>
				statedIn(readFileSync(join(kernel, path), 'utf8'), `${path.split('/')[0]}/`)
			);
		const held = register.map(({ id, works }) => `${id.split('/')[0]}/${works.name}`);
		expect(stated.length).toBeGreaterThan(15);
		expect(held.toSorted()).toEqual(stated.toSorted());
	});
	it('finds a formula in a docstring', () => {
		expect(statedIn('/**\n * Formula: a.\n */\nexport function b(): 1 {', 'x/')).toEqual(['x/b']);
		expect(statedIn('/** None. */\nexport function b(): 1 {', 'x/')).toEqual([]);
	});
});

describe('docstrings of the kernel', () => {
	const files = readdirSync(kernel, { recursive: true, encoding: 'utf8' }).filter((path) =>
		path.endsWith('.ts')
	);
	it.each(files)('%s: a formula has a source and an example', (path) => {
		for (const doc of docs(readFileSync(join(kernel, path), 'utf8')))
			if (/Formula:/.test(doc)) {
				expect(doc).toMatch(/Source:/);
				expect(doc).toMatch(/@example/);
			}
	});
});

function docs(code: string): string[] {
	return code.match(/\/\*\*(?:(?!\*\/)[\s\S])*\*\/\s*export function \w+/g) ?? [];
}

function statedIn(code: string, folder: string): string[] {
	return docs(code)
		.filter((doc) => /Formula:/.test(doc))
		.map((doc) => folder + (/\w+$/.exec(doc)?.[0] ?? ''));
}
