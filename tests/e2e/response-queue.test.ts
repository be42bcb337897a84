import { expect, test, type Page } from './support/test';

const saved = (page: Page) => page.locator('[data-save-state="saved"]');
const figure = (page: Page, n: number) => page.getByLabel('Your figure').nth(n);

async function fill(page: Page, n: number, words: string) {
	await figure(page, n).fill(words);
	await figure(page, n).blur();
}

async function openSitting(page: Page, quiz: string) {
	await page.goto('/s/averholm/bench');
	await page.getByRole('link', { name: quiz }).click();
	await page.getByRole('button', { name: 'Begin the sitting' }).click();
	await expect(saved(page)).toBeVisible();
}

test('what waited without a network never undoes what another device gave since', async ({
	as,
	openContext,
	expectTrouble
}) => {
	expectTrouble(/ERR_INTERNET_DISCONNECTED/);
	const bench = await as('student@averholm.example');
	await openSitting(bench, 'Torque and tagging');
	await bench.context().setOffline(true);
	await fill(bench, 0, '11');
	await fill(bench, 1, '22');
	await expect(bench.getByText('No connection. Go on')).toBeVisible();

	const other = await openContext({ storageState: await bench.context().storageState() });
	const phone = await other.newPage();
	await phone.goto(bench.url());
	await expect(saved(phone)).toBeVisible();
	await fill(phone, 0, '33');
	await expect(saved(phone)).toBeVisible();

	await bench.context().setOffline(false);
	await expect(bench.getByText('opened on another device')).toBeVisible({ timeout: 40_000 });
	await bench.getByRole('button', { name: 'Take it back here' }).click();
	await expect(saved(bench)).toBeVisible();
	// The first was given later on the phone and stands; the second nobody gave but this device.
	await expect(figure(bench, 0)).toHaveValue('33');
	await expect(figure(bench, 1)).toHaveValue('22');
	await expect(bench.getByText('given on another device since')).toBeVisible();

	await phone.reload();
	await expect(saved(phone)).toBeVisible();
	await expect(figure(phone, 0)).toHaveValue('33');
	await expect(figure(phone, 1)).toHaveValue('22');
});

test('a server that stumbles is tried again; one that refuses is shown, and nothing is let go', async ({
	as,
	expectTrouble
}) => {
	expectTrouble(/status of 500/);
	const page = await as('student@averholm.example');
	await page.goto('/s/averholm/bench');
	await page.getByRole('link', { name: 'Torque and tagging' }).click();
	await page.getByRole('link', { name: 'Go on with the open sitting' }).click();
	await expect(saved(page)).toBeVisible();

	await page.route('**/responses', (route) => route.fulfill({ status: 500, body: '{}' }), {
		times: 2
	});
	await fill(page, 2, '44');
	await expect(page.getByText('1 to send.')).toBeVisible();
	await expect(saved(page)).toBeVisible({ timeout: 15_000 });

	await page.route(
		'**/responses',
		(route) => route.fulfill({ status: 400, json: { detail: 'It has not the form.' } }),
		{ times: 1 }
	);
	await fill(page, 2, '55');
	await expect(page.getByText('A response was not taken: It has not the form.')).toBeVisible();
	await page.reload();
	await expect(saved(page)).toBeVisible();
	await expect(figure(page, 2)).toHaveValue('55');
	await page.reload();
	await expect(figure(page, 2)).toHaveValue('55');

	// Typed, and the field never left.
	const sent = page.waitForResponse((one) => one.url().endsWith('/responses') && one.ok());
	await figure(page, 2).fill('66');
	await sent;
	await page.reload();
	await expect(figure(page, 2)).toHaveValue('66');
});
