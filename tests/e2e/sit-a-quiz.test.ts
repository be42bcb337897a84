import { expect, expectAccessible, test, type Page } from './support/test';

const saved = (page: Page) => page.locator('[data-save-state="saved"]');

async function beginQuiz(page: Page) {
	await page.goto('/s/averholm/bench');
	await page.getByRole('link', { name: 'Torque and tagging' }).click();
	await page.getByRole('button', { name: 'Begin the sitting' }).click();
	await expect(saved(page)).toBeVisible();
}

/** Gives the first option of the first question that has options to choose one of. */
function firstRadio(page: Page) {
	return page.locator('main li input[type=radio]').first();
}

test('a lesson opens with its caution, and its balloons lead through it', async ({ as }) => {
	const page = await as('student@averholm.example');
	await page.getByRole('link', { name: 'Go on' }).click();
	await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
	const main = page.locator('main');
	const caution = await main.getByRole('note').first().boundingBox();
	expect(caution?.y ?? 9999, 'the caution stands above the fold').toBeLessThan(700);
	await page
		.getByRole('navigation', { name: 'Parts of this lesson' })
		.getByRole('link')
		.nth(2)
		.click();
	await expect(page).toHaveURL(/#/);
	await expectAccessible(page);
});

test('a film is watched: captions, what is said, and what was really seen, on every device', async ({
	as,
	openContext
}) => {
	const page = await as('jonas@averholm.example');
	await page.goto('/s/averholm/bench');
	await page.getByRole('link', { name: 'Reading failed parts to the cause' }).click();
	await expect(page.getByRole('heading', { name: /^Film/ })).toHaveCount(0);
	const student = await as('student@averholm.example');
	await student.goto('/s/averholm/bench');
	await student.getByRole('link', { name: 'Crankpins and clearances' }).click();
	await expect(student.getByText('0:00–2:04').first()).toBeVisible();
	const address = student.url();

	const said = student.getByRole('complementary', { name: 'Said here' });
	await student.locator('.vjs-tech').waitFor();
	await said
		.getByRole('button', { name: 'Write each reading down before you take the next.' })
		.click();
	await expect(said.locator('[aria-current="true"]')).toHaveText(
		'Write each reading down before you take the next.'
	);
	await expect(student.locator('.vjs-text-track-cue')).toContainText('Write each reading down');
	await student.waitForTimeout(7000);
	const stoppedS = await student.locator('.vjs-tech').evaluate((film: HTMLVideoElement) => {
		film.pause();
		return film.currentTime;
	});
	// The page reports every few seconds and at the stop: only the stop's own report counts here.
	const notYetSeen = student.getByText(/^Not yet seen:/);
	const seenTo = async () => {
		const [, minutes, seconds] =
			/, (\d+):(\d\d)–2:04/.exec((await notYetSeen.textContent()) ?? '') ?? [];
		return 60 * Number(minutes) + Number(seconds);
	};
	await expect.poll(seenTo).toBeGreaterThan(stoppedS - 1.5);
	const unseen = await notYetSeen.textContent();
	expect(unseen).toMatch(/0:00–0:3\d, 0:\d\d–2:04/);
	await expectAccessible(student);

	await student.reload();
	await expect(student.getByText(/^Not yet seen:/)).toHaveText(unseen ?? '');
	const phone = await openContext({
		viewport: { width: 360, height: 740 },
		storageState: await student.context().storageState()
	});
	const second = await phone.newPage();
	await second.goto(address);
	await expect(second.getByText(/^Not yet seen:/)).toHaveText(unseen ?? '');

	await test.step('saying “read” without having watched is refused', async () => {
		await second.getByRole('button', { name: 'I have read this lesson' }).click();
		await expect(second.getByText('Watch the film first.')).toBeVisible();
	});
});

test('a quiz loses nothing: a closed browser, a lost network, another device', async ({
	as,
	openContext,
	expectTrouble
}) => {
	expectTrouble(/ERR_INTERNET_DISCONNECTED/);
	const page = await as('student@averholm.example');
	await beginQuiz(page);
	expect(await page.locator('main ol > li').count()).toBeGreaterThanOrEqual(10);
	await expectAccessible(page);

	await firstRadio(page).check();
	await expect(saved(page)).toBeVisible();
	const address = page.url();
	const order = page.getByRole('group', { name: 'Take the next bolt' });
	await order.getByRole('button').first().click();
	await expect(page.getByText(/^Taken: /)).toBeVisible();
	await expect(saved(page)).toBeVisible();

	await test.step('after closing and coming back', async () => {
		await page.goto('/s/averholm/bench');
		await page.goto(address);
		await expect(saved(page)).toBeVisible();
		await expect(firstRadio(page)).toBeChecked();
		await expect(page.getByText(/^Taken: /)).toBeVisible();
	});

	await test.step('while the network is gone, and when it is back', async () => {
		await page.context().setOffline(true);
		await page.getByLabel('Your figure').first().fill('12,5');
		await page.getByLabel('Your figure').first().blur();
		await expect(page.getByText('No connection. Go on')).toBeVisible();
		await page.context().setOffline(false);
		await expect(saved(page)).toBeVisible({ timeout: 15_000 });
	});

	await test.step('on another device, which takes the sitting over', async () => {
		const phone = await openContext({
			viewport: { width: 360, height: 740 },
			storageState: await page.context().storageState()
		});
		const second = await phone.newPage();
		await second.goto(address);
		await expect(saved(second)).toBeVisible();
		await expect(firstRadio(second)).toBeChecked();
		await expect(second.getByLabel('Your figure').first()).toHaveValue('12,5');
		await second.locator('main li input[type=radio]').nth(1).check();
		await expect(saved(second)).toBeVisible();

		await page.getByLabel('Your figure').first().fill('99');
		await page.getByLabel('Your figure').first().blur();
		await expect(page.getByText('opened on another device')).toBeVisible();
		await second.reload();
		await expect(saved(second)).toBeVisible();
		await expect(second.getByLabel('Your figure').first()).toHaveValue('12,5');

		await second.getByRole('button', { name: 'Hand in' }).click();
		await expect(second.getByRole('heading', { name: /result/ })).toBeVisible();
		await expect(second.getByText('Working').first()).toBeVisible();
		await expect(second.getByText('Source').first()).toBeVisible();
		await expect(second.getByText('12,5').first()).toBeVisible();
		await expectAccessible(second);
		await second.getByRole('link', { name: 'The lesson, at this point' }).first().click();
		await expect(second).toHaveURL(/\/lessons\/.*#/);
	});
});

test('what is sent before the end holds no key', async ({ as }) => {
	const page = await as('sana@averholm.example');
	const bodies: Promise<string>[] = [];
	await page.goto('/s/averholm/bench');
	await page.getByRole('link', { name: 'Clearance and cause' }).click();
	const begin = page.getByRole('button', { name: 'Begin the sitting' });
	await begin.waitFor();
	page.on('response', (response) => {
		if (/document|fetch|xhr/.test(response.request().resourceType()))
			bodies.push(response.text().catch(() => ''));
	});
	await begin.click();
	await expect(saved(page)).toBeVisible();
	await firstRadio(page).check();
	await expect(saved(page)).toBeVisible();
	const sent = (await Promise.all(bodies)).join('\n');
	expect(sent).toContain('Choose all that apply');
	expect(sent).not.toMatch(/"(seed|right|expected|printedOrder|because|working|answer)"\s*:/);
	// The explanations of wrong options are part of the key.
	expect(sent).not.toContain('Oil starvation is where');
	expect(sent).not.toContain('they stand proud of the joint');
});

test('the programs that the browser loads hold no key of a question', async () => {
	const { readdir, readFile } = await import('node:fs/promises');
	const files = (await readdir('build/client/_app/immutable', { recursive: true })).filter((name) =>
		name.endsWith('.js')
	);
	expect(files.length).toBeGreaterThan(10);
	for (const name of files) {
		const text = await readFile(`build/client/_app/immutable/${name}`, 'utf8');
		// Words that only the questions' keys hold.
		expect(text, name).not.toContain('A bolt pulled apart is drawn to a waist');
		expect(text, name).not.toContain('rod-bolts-once');
	}
});
