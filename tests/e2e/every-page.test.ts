import type { Page } from '@playwright/test';
import { expect, expectAccessible, test } from './support/test';
import { isTooWide, screenshots } from './support/screenshots';

const people = [
	'edda@averholm.example',
	'tomasz@averholm.example',
	'ines@averholm.example',
	'instructor@averholm.example',
	'verifier@averholm.example',
	'office@averholm.example',
	'student@korrig.example',
	'instructor2@korrig.example'
];
/** A list may lead to a hundred pages alike: a few of each shape are walked. */
const ofEachShape = 2;
const shapeOf = (path: string) =>
	path
		.replace(/[0-9A-HJKMNP-TV-Z]{26}/g, ':id')
		.replace(/(lessons|job-sheets|quizzes)\/.*/, '$1/:step')
		// Each calculator is walked by the crib's own test.
		.replace(/\/crib\/.+/, '/crib/:calculator')
		.replace(/(data-sheets\/)(?:\w+\/)?[a-z]+\d[\w-]*/, '$1:sheet');

const linksOf = (page: Page) =>
	page.locator('a[href]').evaluateAll((all) =>
		all
			.map((one) => new URL(one.getAttribute('href') ?? '', location.href))
			.filter((url) => url.origin === location.origin)
			.map((url) => url.pathname)
			.filter((path) => !/\/(files?|readme|api|pdf|download)(\/|$)|\.\w+$/.test(path))
	);

for (const who of people)
	test(`every page that ${who} is led to fits a phone and can be used by all`, async ({ as }) => {
		test.setTimeout(180_000);
		const page = await as(who);
		await page.setViewportSize({ width: 360, height: 800 });
		await page.goto('/');
		const waiting = ['/account', ...(await linksOf(page))];
		const counts = new Map<string, number>();
		const walked = new Set<string>();
		const faults: string[] = []; // all of them at the end: each page is looked at
		for (let path = waiting.shift(); path; path = waiting.shift()) {
			const shape = shapeOf(path);
			if (walked.has(path) || (counts.get(shape) ?? 0) >= ofEachShape) continue;
			walked.add(path);
			counts.set(shape, (counts.get(shape) ?? 0) + 1);
			const answer = await page.goto(path);
			expect(answer?.status(), path).toBe(200);
			if (await isTooWide(page)) faults.push(`${path} is too wide`);
			await expectAccessible(page).catch((fault: Error) => faults.push(fault.message));
			await screenshots(page, path.replaceAll('/', '_').slice(0, 60));
			waiting.push(...(await linksOf(page)));
		}
		expect(faults).toEqual([]);
		expect(walked.size).toBeGreaterThan(6);
	});
