import { existsSync, readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { firstPage, railOf } from '$lib/domain/accounts/rail';
import { roles } from '$lib/domain/actor';

const inSchool = 'src/routes/s/[school]';
const isPage = (path: string) =>
	['.', ...readdirSync(inSchool)].some((group) =>
		existsSync(`${inSchool}/${group}/${path}/+page.svelte`)
	);

describe('the rail', () => {
	it.each(roles)('of a %s leads to pages that exist, in six words at most', (role) => {
		const links = railOf([role]);
		expect(links.length).toBeLessThanOrEqual(4); // two public ones stand beside them
		for (const { path } of links) expect(isPage(path), path).toBe(true);
		expect(firstPage([role])).toBe(links[0]?.path);
	});

	it('of somebody with several roles has each link once, in the order of a day', () => {
		const words = railOf(['admin', 'verifier', 'student']).map((one) => one.words);
		expect(words).toEqual([...new Set(words)]);
		expect(words[0]).toBe('Bench');
		expect(firstPage(['student', 'instructor'])).toBe('marking');
		expect(railOf([])).toEqual([]);
		expect(firstPage([])).toBeUndefined();
	});
});
