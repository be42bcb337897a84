import { expect, expectAccessible, test, type Page } from './support/test';
import { isTooWide, screenshots } from './support/screenshots';

const saved = (page: Page) => page.locator('[data-save-state="saved"]');
const row = (page: Page, words: string | RegExp) =>
	page.getByRole('button', { name: words }).first();

/** A draft page in a browser, where it takes what is typed. */
async function openDraft(page: Page, key: string) {
	await page.goto(`/s/averholm/data-sheets/${key}/draft`);
	const begin = page.getByRole('button', { name: 'Begin a draft' });
	if (await begin.isVisible()) await begin.click();
	await expect(saved(page)).toBeVisible();
}

test('an instructor changes a wear limit, sees what it touches, and publishes', async ({
	as,
	stranger,
	site
}) => {
	test.slow();
	const page = await as('instructor@averholm.example');
	await page.goto('/s/averholm/data-sheets');
	await page.getByRole('link', { name: 'AV3-1150', exact: true }).click();
	await page.getByRole('link', { name: 'Change it' }).click();
	await page.getByRole('button', { name: 'Begin a draft' }).click();
	await expect(saved(page)).toBeVisible();
	await row(page, /^Crankpin, oil clearance/).click();
	const limit = page.getByLabel(/To run again, not above/);

	await test.step('what cannot be right says so in its place', async () => {
		await limit.fill('0,0x');
		await expect(page.getByText('This cannot be read').first()).toBeVisible();
		await limit.fill('0.03');
		await expect(page.getByText(/already be past its wear limit/).first()).toBeVisible();
		await expectAccessible(page);
	});
	await limit.fill('0,065');
	await expect(page.getByText('was 0.07')).toBeVisible();
	await expect(page.getByText('to run again up to 0.065 mm').first()).toBeVisible();
	await expect(saved(page)).toBeVisible();
	await screenshots(page, 'draft');
	await page.getByRole('button', { name: 'Publish …' }).click();

	const main = page.locator('main');
	await expect(main.getByRole('heading', { name: 'Publish revision D of AV3-1150' })).toBeVisible();
	await expect(main.getByText('Crankpins and clearances').first()).toBeVisible();
	await expect(main.getByRole('heading', { name: /^Questions/ })).toBeVisible();
	await expect(main.getByText('Crankpins and shells').first()).toBeVisible();
	await expectAccessible(page);
	await screenshots(page, 'publish');
	for (const warning of await main.getByRole('checkbox').all()) await warning.check();
	await main.getByRole('button', { name: 'Publish revision D' }).click();
	await expect(page).toHaveURL(/data-sheets\/av3-1150$/);
	await expect(main.getByText('revision D').first()).toBeVisible();

	await test.step('its history says what changed, and the older one is still there', async () => {
		await page.getByRole('link', { name: 'Earlier revisions' }).click();
		await expect(main.getByText('to run again up to 0.070 mm')).toBeVisible();
		await page.getByRole('link', { name: 'Revision C' }).click();
		await expect(main.getByText('Not in force')).toBeVisible();
	});

	await test.step('anybody reads the new revision, and asks again for nothing', async () => {
		const nobody = await stranger();
		await nobody.goto('/data-sheets');
		await nobody.getByRole('link', { name: 'AV3-1150' }).click();
		await expect(nobody.getByRole('heading', { name: 'AV3-1150' })).toBeVisible();
		const { sheets } = (await (await nobody.request.get('/data-sheets/index.json')).json()) as {
			sheets: { key: string; revision: string; href: string }[];
		};
		const listed = sheets.find((one) => one.href.endsWith('/averholm/av3-1150'));
		expect(listed).toMatchObject({ key: 'av3-1150', revision: 'D' });
		const first = await nobody.request.get(`${listed?.href}.json`);
		const etag = first.headers().etag ?? '';
		expect(etag).toMatch(/^"[0-9a-f]{64}-json"$/);
		const again = await fetch(`${site.origin}${listed?.href}.json`, {
			headers: { 'if-none-match': etag }
		});
		expect([again.status, await again.text()]).toEqual([304, '']);
		const csv = await nobody.request.get(`${listed?.href}.csv`);
		expect(await csv.text()).toMatch(/^kind,key,words.*crankpin\.oilClearance/s);
	});
});

test('a sheet of the school’s own is made on a phone with six values', async ({ as }) => {
	const page = await as('instructor2@averholm.example');
	await page.setViewportSize({ width: 360, height: 740 });
	await page.goto('/s/averholm/data-sheets');
	await page.getByLabel('Code').fill('kt 900');
	await page.getByLabel('Title').fill('two-cylinder diesel engine');
	await page.getByRole('button', { name: 'Begin the sheet' }).click();
	await page.getByRole('button', { name: 'Add these six' }).click();
	const six = [
		['Cylinder bore, diameter', '86,0', '86', '86.02'],
		['Stroke', '77.5', '', ''],
		['Crankpin, diameter', '', '45.98', '45.996'],
		['Big-end bearing bore', '', '46.02', '46.032'],
		['Crankpin, oil clearance', '', '0.024', '0.052'],
		['Crankpin, out-of-round', '', '0', '0.005']
	] as const;
	for (const [i, [words, nominal, least, most]] of six.entries()) {
		const line = row(page, new RegExp(`^${words}`));
		if ((await line.getAttribute('aria-expanded')) === 'false') await line.click();
		const open = page.getByRole('listitem').filter({ has: line });
		await open.getByLabel('Nominal').fill(nominal);
		await open.getByLabel('To build, least').fill(least);
		await open.getByLabel('To build, most').fill(most);
		if (i === 0) await open.getByLabel('Source').fill('Workshop manual KT, 1987');
		else await open.getByRole('button', { name: 'As before' }).click();
		await open.getByLabel('Page').fill('4-12');
		await line.click();
	}
	await expect(saved(page)).toBeVisible();
	expect(await isTooWide(page)).toBe(false);
	await expectAccessible(page);
	await screenshots(page, 'own-engine');
	await page.getByRole('button', { name: 'Publish …' }).click();
	for (const warning of await page.locator('main').getByRole('checkbox').all())
		await warning.check();
	await page.getByRole('button', { name: 'Publish revision A' }).click();
	await expect(page.getByRole('heading', { name: 'KT-900' })).toBeVisible();
	await expect(page.getByText('Workshop manual KT, 1987').first()).toBeVisible();
});

test('what is typed is not lost: without a network, and when two type at once', async ({
	as,
	expectTrouble
}) => {
	test.slow();
	expectTrouble(/ERR_INTERNET_DISCONNECTED/);
	const marit = await as('instructor@averholm.example');
	await openDraft(marit, 'av3-1150');
	const title = (page: Page) => page.getByLabel('Title', { exact: true });

	await marit.context().setOffline(true);
	await title(marit).fill('typed without a network');
	await expect(marit.getByText('No connection.')).toBeVisible();
	await marit.context().setOffline(false);
	await marit.reload();
	await expect(title(marit)).toHaveValue('typed without a network');
	await expect(saved(marit)).toBeVisible();

	const other = await as('instructor2@averholm.example');
	await openDraft(other, 'av3-1150');
	await expect(title(other)).toHaveValue('typed without a network');
	await title(marit).fill('what Marit says');
	await expect(saved(marit)).toBeVisible();
	await other.getByLabel('Drawn by').fill('R. C.');
	await title(other).fill('what Rune says');
	const both = other.getByRole('alert').filter({ hasText: 'What you typed since' });
	await expect(both.getByRole('row', { name: /Title/ })).toContainText('what Marit says');
	await expectAccessible(other);
	await both.getByRole('button', { name: 'Lay mine over theirs' }).click();
	await expect(saved(other)).toBeVisible();
	await marit.reload();
	await expect(title(marit)).toHaveValue('what Rune says');
	await expect(marit.getByLabel('Drawn by')).toHaveValue('R. C.');

	await marit.getByText('Discard it').click();
	await marit.getByRole('button', { name: 'Discard the draft' }).click();
	await expect(marit).toHaveURL(/data-sheets\/av3-1150$/);
});

test('a pattern is drawn while its bolts are typed or pasted, by keyboard alone', async ({
	as
}) => {
	const page = await as('instructor@averholm.example');
	await openDraft(page, 'av3-1150');
	await page.getByRole('button', { name: 'Add a bolt pattern' }).press('Enter');
	await expect(page.getByLabel('Words').last()).toBeFocused();
	await page.keyboard.type('Water pump bolts');
	const bolts = page.getByLabel('Bolts', { exact: true }).last();
	await bolts.fill('W1\t-20\t0\nW2\t20\t0\nW3\t0');
	await expect(page.getByRole('img', { name: /^Water pump bolts, as typed: W1 at/ })).toBeVisible();
	await expect(page.getByText('line 3')).not.toHaveCount(0);
	await bolts.fill('W1 -20 0\nW2 20 0\nW3 0 25');
	await page.getByLabel('Tightening order').last().fill('W1 W9');
	await expect(page.getByText('In the order and not in the pattern: W9.')).toBeVisible();
	await page.getByRole('button', { name: 'Take this row out' }).last().press('Enter');
	await expect(page.getByRole('button', { name: 'Bring it back' })).toBeFocused();
	await page.keyboard.press('Enter');
	await expect(row(page, /Water pump bolts/)).toBeVisible();
	await expect(saved(page)).toBeVisible();
});
