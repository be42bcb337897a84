import { calculators } from '../../src/lib/domain/crib/registry';
import { isTooWide, screenshots } from './support/screenshots';
import { expect, expectAccessible, signIn, test, type Page } from './support/test';

const result = (page: Page) => page.getByRole('region', { name: 'Result' });

test('a grid is filled by the keyboard alone, and the address opens the page again', async ({
	stranger
}) => {
	const page = await stranger();
	await page.goto('/crib');
	await page.getByRole('link', { name: /^Oil clearance/ }).click();
	const bore = page.getByRole('group', { name: 'Bearing bore' });
	const pin = page.getByRole('group', { name: 'Pin', exact: true });
	await bore.getByLabel('Bearing bore, Depth 1, Plane 1').focus();
	// Enter goes down, and from the last depth to the next plane.
	await page.keyboard.type('40.024\n40.023\n40,026\n40,025');
	await expect(result(page)).toContainText('Still wanted: Pin');
	await pin.getByLabel('Pin, Depth 1, Plane 1').focus();
	await page.keyboard.type('39.992\n39.990\n39.988\n39.986');
	await expect(result(page)).toContainText('0.031 mm');
	await expect(result(page)).toContainText('40.023 − 39.992');
	const again = await stranger();
	await again.goto(page.url());
	await expect(result(again)).toContainText('0.031 mm');
	await pin.getByLabel('Pin, Depth 2, Plane 2').fill('forty');
	await expect(pin).toContainText('Depth 2, Plane 2: there is no number in it');
	await expect(result(page)).toContainText('cannot be read yet');
});

test('a block is pasted from a spreadsheet, with decimal commas and more rows than stand there', async ({
	stranger
}) => {
	const page = await stranger();
	await page.goto('/crib/oil-clearance');
	const paste = (label: string, text: string) =>
		page.getByLabel(label).evaluate((cell, block) => {
			const data = new DataTransfer();
			data.setData('text', block);
			cell.dispatchEvent(
				new ClipboardEvent('paste', { clipboardData: data, bubbles: true, cancelable: true })
			);
		}, text);
	await paste('Bearing bore, Depth 1, Plane 1', '40,024\t40,026\n40,023\t40,025\n40,022\t40,024');
	await paste('Pin, Depth 1, Plane 1', '39,992\t39,988');
	await expect(page.getByLabel('Bearing bore, Depth 3, Plane 2')).toHaveValue('40,024');
	await expect(result(page)).toContainText('0.030 mm');
});

test('inch figures give the same clearance as millimetres', async ({ stranger }) => {
	const page = await stranger();
	await page.goto('/crib/oil-clearance?units=inch&bore=2.0020&pin=2.0000');
	await expect(result(page)).toContainText('0.0020 in');
	await expect(result(page)).toContainText('0.051 mm');
});

test('without script the form works it out', async ({ openContext }) => {
	const context = await openContext({ javaScriptEnabled: false });
	const page = await context.newPage();
	await page.goto('/crib/oil-clearance');
	await page.getByLabel('Bearing bore, Depth 1, Plane 1').fill('40.024');
	await page.getByLabel('Pin, Depth 1, Plane 1').fill('39.99');
	await page.getByRole('button', { name: 'Work it out' }).click();
	await expect(result(page)).toContainText('0.034 mm');
	await expect(page.getByLabel('Bearing bore, Depth 1, Plane 1')).toHaveValue('40.024');
});

test('once opened it works without a network, and keeps nothing of who opened it', async ({
	openContext,
	expectTrouble
}) => {
	expectTrouble(/ERR_INTERNET_DISCONNECTED/);
	expectTrouble(/ERR_FAILED .*\/data-sheets\/index\.json/); // the page says so, and goes on
	const page = await (await openContext({ serviceWorkers: 'allow' })).newPage();
	await signIn(page, 'edda@averholm.example');
	await page.goto('/crib');
	await expect(page.getByText('The tool crib is kept on this device')).toBeVisible({
		timeout: 30_000
	});
	const kept = await page.evaluate(async () => {
		const [name = ''] = await caches.keys();
		const cache = await caches.open(name);
		const all = await Promise.all(
			(await cache.keys()).map(async (request) => ({
				path: new URL(request.url).pathname,
				text: await (await cache.match(request))?.text()
			}))
		);
		return all.map(({ path, text }) => ({ path, named: /edda@|Edda Moreau/.test(text ?? '') }));
	});
	expect(kept.filter((one) => one.named)).toEqual([]);
	expect(kept.filter((one) => !/^\/(crib|_app\/immutable)(\/|$)/.test(one.path))).toEqual([]);
	for (const one of calculators) expect(kept.map(({ path }) => path)).toContain(`/crib/${one.key}`);

	await page.context().setOffline(true);
	await page.goto('/crib/oil-clearance?bore=40.024&pin=39.99');
	await expect(result(page)).toContainText('0.034 mm');
	await page.getByRole('link', { name: 'Tool crib' }).last().click();
	await page.getByRole('link', { name: /^Oil clearance/ }).click();
	await page.getByRole('button', { name: 'Show an example' }).click();
	await expect(result(page)).toContainText('0.031 mm');
	await expect(page.goto('/prospectus')).rejects.toThrow(/ERR_INTERNET_DISCONNECTED/);
});

for (const one of calculators)
	test(`${one.title}: its example is drawn, fits a phone and can be used by all`, async ({
		stranger
	}) => {
		const page = await stranger();
		await page.setViewportSize({ width: 360, height: 800 });
		await page.goto(`/crib/${one.key}`);
		await page.getByRole('button', { name: 'Show an example' }).click();
		await expect(result(page).getByRole('img').first()).toBeVisible();
		await expect(page.getByRole('heading', { name: 'Working' })).toBeVisible();
		expect(
			await page
				.locator('svg')
				.evaluateAll(
					(all) => all.filter((svg) => /NaN|undefined|Infinity/.test(svg.outerHTML)).length
				)
		).toBe(0);
		expect(await isTooWide(page)).toBe(false);
		await expectAccessible(page);
		await screenshots(page, `crib-${one.key}`);
	});
