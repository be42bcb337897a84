import { expect, signIn, test } from './support/test';
import { rowsOf } from './support/rows';
import { screenshots } from './support/screenshots';

test('the office enrols from a list without JavaScript', async ({ openContext }) => {
	const page = await (await openContext({ javaScriptEnabled: false })).newPage();
	await signIn(page, 'office@averholm.example');
	await page.goto('/s/averholm/cohorts');
	await page.getByLabel('Name').fill('Evening group');
	await page
		.getByLabel('Course', { exact: true })
		.selectOption({ label: 'Reading failed engines' });
	await page.getByLabel('First day').fill('2026-12-07');
	await page.getByLabel('Last day').fill('2027-02-01');
	await page.getByLabel('Instructor').selectOption({ label: 'Rune Castellane' });
	await page.getByRole('button', { name: 'Make the cohort' }).click();
	await page.getByText('Record a payment made another way').click();
	await page.getByLabel('Paid places').fill('1');
	await page.getByLabel('How it was paid').selectOption('bank-transfer');
	await page.getByLabel('Its number').fill('BT-88');
	await page.getByRole('button', { name: 'Record it' }).click();
	await expect(page.getByText('1 paid, 1 free')).toBeVisible();

	await page.getByRole('textbox', { name: 'The list' }).fill('Anna "Strand,anna@evening.example');
	await page.getByRole('button', { name: 'Check the list' }).click();
	await expect(page.getByText(/cannot be read as CSV/)).toBeVisible();
	await expect(page.getByRole('textbox', { name: 'The list' })).toHaveValue(
		'Anna "Strand,anna@evening.example'
	);
	const list = 'Anna Strand,anna@evening.example\nPer Dalby,per@evening.example';
	await page.getByRole('textbox', { name: 'The list' }).fill(list);
	await page.getByRole('button', { name: 'Check the list' }).click();
	await expect(page.getByText('1 would be invited, 1 would wait')).toBeVisible();
	await expect(page.getByRole('textbox', { name: 'The list' })).toHaveValue(list);
	await page.getByRole('button', { name: 'Write 2 and invite 1' }).click();
	await expect(page.getByText('2 added. 1 invited by e-mail. 1 waits until')).toBeVisible();
	await expect(page.getByText('anna@evening.example')).toBeVisible();
	await page.getByRole('button', { name: /Take off.*Anna Strand/ }).click();
	await expect(page.getByText('waits for a place')).toHaveCount(0);
});

test('what is written is the list that was shown, not what was typed since', async ({ as }) => {
	const page = await as('office@averholm.example');
	await page.goto('/s/averholm/cohorts');
	await page.getByRole('table').getByRole('link').first().click();
	await page.getByRole('textbox', { name: 'The list' }).fill('Teo Aas,teo@shown.example');
	await page.getByRole('button', { name: 'Check the list' }).click();
	const write = page.getByRole('button', { name: /^Write 1/ });
	await expect(write).toBeVisible();
	await page.getByRole('textbox', { name: 'The list' }).fill('Somebody Else,else@typed.example');
	await write.click();
	await expect(page.getByText('teo@shown.example')).toBeVisible();
	await expect(page.getByText('else@typed.example')).toHaveCount(0);
});

test('a spreadsheet in the old code page keeps its letters', async ({ as }) => {
	const page = await as('office@averholm.example');
	await page.goto('/s/averholm/cohorts');
	await page.getByRole('table').getByRole('link').first().click();
	const buffer = Buffer.from('Bj\xf8rg \xc5s;bjorg@old.example', 'latin1');
	await page.getByLabel('Or a file').setInputFiles({ name: 'l.csv', mimeType: 'text/csv', buffer });
	await expect(page.getByRole('textbox', { name: 'The list' })).toHaveValue(
		'Bjørg Ås;bjorg@old.example'
	);
});

test('the ledger is taken away as a file', async ({ as }) => {
	const page = await as('office@averholm.example');
	await page.goto('/s/averholm/ledger');
	const [download] = await Promise.all([
		page.waitForEvent('download'),
		page.getByRole('link', { name: 'Download the whole ledger' }).click()
	]);
	expect(download.suggestedFilename()).toMatch(/^ledger-averholm-\d+\.jsonl$/);
});

test('public pages fit a phone and can be used by all, without JavaScript', async ({
	openContext,
	site
}) => {
	const page = await (await openContext({ javaScriptEnabled: false })).newPage();
	const codes = await rowsOf<{ code: string; withdrawnAt: string | null }>(
		site.dataDir,
		'SELECT code, withdrawnAt FROM certificates ORDER BY withdrawnAt'
	);
	expect(codes.map((one) => one.withdrawnAt === null)).toEqual([true, false]);
	const paths = ['/prospectus', '/check', '/check/RL-0000-0000-0000', '/check/nonsense'];
	for (const path of [...paths, ...codes.map((one) => `/check/${one.code}`)]) {
		await page.goto(path);
		await page.setViewportSize({ width: 360, height: 800 });
		expect(
			await page.evaluate(() => document.documentElement.scrollWidth),
			path
		).toBeLessThanOrEqual(360);
		await screenshots(page, path.replaceAll('/', '_'));
	}
	await page.goto('/check');
	await page.getByLabel('Code of the certificate').fill(codes[1]?.code ?? '');
	await page.getByRole('button', { name: 'Check' }).click();
	await expect(page.getByText('Withdrawn', { exact: true })).toBeVisible();
});
