import { photograph } from './support/photograph';
import { expect, expectAccessible, test, type Page } from './support/test';

const lwazi = 'lwazi@averholm.example';
const allSaved = (page: Page) => expect(page.getByText('All saved.')).toBeVisible();

/** The tag as a phone reads it from the screen. */
async function tagOf(page: Page): Promise<string> {
	const words = (await page.locator('#tag ~ div .fig').first().textContent())?.trim() ?? '';
	return `RLT1:${words.replaceAll('-', '')}`;
}

async function addPhotographs(page: Page, tag: string, seed: string) {
	for (const shot of ['The crankpin', 'Its two shells', 'What decides the cause']) {
		const buffer = await photograph(`${seed} ${shot}`, shot === 'Its two shells' ? undefined : tag);
		await page
			.getByLabel(`Add a photograph: ${shot}`)
			.setInputFiles({ name: `${shot}.jpg`, mimeType: 'image/jpeg', buffer });
	}
	await expect(page.getByText('Tag found', { exact: true })).toHaveCount(2, { timeout: 40_000 });
	await expect(page.getByText('No tag found')).toHaveCount(1);
}

async function takeReadings(page: Page) {
	const cells = page.getByRole('textbox', { name: /Crankpin, .* millimetres/ });
	for (const [index, value] of ['39.975', '39,968', '39.974', '39.966'].entries()) {
		await cells.nth(index).fill(value);
		await cells.nth(index).blur();
	}
	const bores = page.getByRole('textbox', { name: /Bearing bore, .* millimetres/ });
	await bores.nth(0).fill('40.036');
	await bores.nth(0).blur();
	await bores.nth(1).fill('40.037');
	await bores.nth(1).blur();
}

test('a job sheet from the first photograph to competent at the second attempt', async ({
	as,
	mail,
	stranger
}) => {
	test.setTimeout(240_000);
	const student = await as(lwazi);
	await student.goto('/s/averholm/bench');
	await student.getByRole('link', { name: 'Crankpins and shells' }).click();
	await student.getByRole('button', { name: 'Open an attempt' }).click();
	await expect(student.getByRole('heading', { name: 'Evidence tag' })).toBeVisible();
	const firstTag = await tagOf(student);
	expect(firstTag).toMatch(/^RLT1:[0-9A-HJKMNP-TV-Z]{16}$/);

	await test.step('a file that is no photograph is refused by its content', async () => {
		await student.getByLabel('Add a photograph: The crankpin').setInputFiles({
			name: 'pin.jpg',
			mimeType: 'image/jpeg',
			buffer: Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>')
		});
		await expect(student.getByRole('alert').filter({ hasText: 'pin.jpg' })).toBeVisible();
	});

	await addPhotographs(student, firstTag, 'first');
	await test.step('readings compute as they are typed, slips are named', async () => {
		const cell = student.getByRole('textbox', { name: /Crankpin, front end, in line/ });
		await cell.fill('399.75');
		await cell.blur();
		await expect(student.getByText('is not between 39.5 and 40.1 mm')).toBeVisible();
		await takeReadings(student);
		const row = (name: string) => student.getByRole('row').filter({ hasText: name });
		// 39.975 − 39.968 and 39.974 − 39.966: the larger is 0.008; 40.037 − 39.966 = 0.071.
		await expect(row('Out-of-round')).toContainText('0.008');
		await expect(row('Oil clearance, most')).toContainText('0.071');
		await expect(row('Oil clearance, most')).toContainText('Too close to call');
		await allSaved(student);
	});
	await test.step('a finding is pinned, the cause argued', async () => {
		await student.getByLabel('From the left, %').fill('42');
		await student.getByLabel('What is seen there').fill('Blue band in the middle of the pin.');
		await student.getByRole('button', { name: 'Pin finding 1' }).click();
		await student.getByLabel('Root cause').fill('Excess sealant at the sump joint');
		await student
			.getByLabel('From what you found')
			.fill('1 because the film failed; because strands closed the screen.');
		await student.getByLabel('From what you found').blur();
		await allSaved(student);
		await expectAccessible(student);
	});
	await test.step('what was typed survives another visit', async () => {
		await student.reload();
		await expect(student.getByLabel('Root cause')).toHaveValue('Excess sealant at the sump joint');
		await expect(student.getByRole('textbox', { name: /Crankpin, front end, square/ })).toHaveValue(
			'39.968'
		);
	});
	await student.getByRole('button', { name: 'Hand in attempt 1' }).click();
	await expect(student.getByText('Waiting to be marked')).toBeVisible();

	const marker = await as('instructor@averholm.example');
	const second = await as('instructor2@averholm.example');
	await marker.goto('/s/averholm/marking');
	const mine = /Crankpins and shells: Lwazi Brandt/;
	await marker.getByRole('link', { name: mine }).click();
	await marker.getByRole('button', { name: 'Take it to mark' }).click();
	await expect(marker.getByText('With you until')).toBeVisible();
	await test.step('two instructors cannot mark the same work unawares', async () => {
		await second.goto('/s/averholm/marking');
		await expect(second.getByText('With Marit Oyelaran')).toBeVisible();
		await second.getByRole('link', { name: mine }).click();
		await expect(second.getByText(/Marit Oyelaran has this work/)).toBeVisible();
		await expect(second.getByRole('button', { name: 'Sign and send' })).toHaveCount(0);
	});
	await test.step('the scheme decides: not yet, with what to do again', async () => {
		await marker.getByRole('button', { name: 'Larger' }).click();
		await expect(marker.getByText('150 %')).toBeVisible();
		await marker.getByRole('button', { name: 'Turn' }).click();
		await expectAccessible(marker);
		await marker
			.getByLabel('The part can be identified; balloon or focus misses the damage.')
			.check();
		await marker.getByLabel(/Readings contradict each other/).check();
		await marker.getByLabel(/The ruling follows, what is too close/).check();
		await marker.getByLabel(/Reaches a cause and rules others out/).check();
		await marker.getByLabel(/Seen at the bench, shaft lifted/).check();
		await expect(
			marker.getByText('Readings lies more than one level below its least.')
		).toBeVisible();
		await marker.getByRole('button', { name: 'Sign and send' }).click();
		await expect(marker.getByText('Safe work: say who saw it at the bench.').first()).toBeVisible();
		await marker.getByLabel('Seen at the bench by').selectOption({ label: 'Rune Castellane' });
		await marker.getByLabel('In words: Evidence').fill('The tag hides the pin.');
		await marker.getByLabel('In words: Readings').fill('Zero was not checked afterwards.');
		await marker.getByRole('button', { name: 'Sign and send' }).click();
		await expect(marker.getByText('Signed by Marit Oyelaran')).toBeVisible();
	});

	const letter = await mail.letterTo(lwazi, /not yet competent/);
	expect(letter.text).toContain('Measure again in two planes at both ends');
	const address = letter.links.find((one) => one.includes('/job-sheets/')) ?? '';
	await student.goto(address);
	await expect(student.getByText('Not yet', { exact: true })).toBeVisible();
	await expect(student.getByText('Zero was not checked afterwards.')).toBeVisible();
	await student.getByRole('link', { name: 'To the next attempt' }).click();
	await student.getByRole('button', { name: 'Open another attempt' }).click();
	const secondTag = await tagOf(student);
	expect(secondTag, 'a tag belongs to one attempt').not.toBe(firstTag);

	await test.step('the tag of the attempt before is told from this one', async () => {
		const buffer = await photograph('old tag', firstTag);
		await student
			.getByLabel('Add a photograph: The crankpin')
			.setInputFiles({ name: 'old.jpg', mimeType: 'image/jpeg', buffer });
		await expect(student.getByText('Another tag')).toBeVisible({ timeout: 30_000 });
		await student.getByRole('button', { name: 'Take out' }).click();
		await expect(student.getByText('Another tag')).toHaveCount(0);
	});
	await addPhotographs(student, secondTag, 'second');
	await takeReadings(student);
	await student.getByLabel('What is seen there').fill('Blue band in the middle of the pin.');
	await student.getByRole('button', { name: 'Pin finding 1' }).click();
	await student.getByLabel('Root cause').fill('Excess sealant at the sump joint');
	await student
		.getByLabel('From what you found')
		.fill('1 because the film failed; because the screen was shut.');
	await student.getByLabel('From what you found').blur();
	await allSaved(student);
	await student.getByRole('button', { name: 'Hand in attempt 2' }).click();
	await expect(student.getByRole('heading', { name: 'Attempt 1 (before)' })).toBeVisible();

	await second.goto('/s/averholm/marking');
	await second.getByRole('link', { name: mine }).click();
	await second.getByRole('button', { name: 'Take it to mark' }).click();
	await second.getByText('Attempt 1, before this one').click();
	await expect(second.getByText('Zero was not checked afterwards.')).toBeVisible();
	await second.getByLabel(/Part identifiable, in focus, tagged, balloon/).check();
	await second.getByLabel(/Two planes, both ends, zero checked/).check();
	await second.getByLabel(/The ruling follows, what is too close/).check();
	await second.getByLabel(/Reaches a cause and rules others out/).check();
	await second.getByLabel(/Seen at the bench, shaft lifted/).check();
	await second.getByLabel('Seen at the bench by').selectOption({ label: 'Marit Oyelaran' });
	await second.getByRole('button', { name: 'Sign and send' }).click();
	await expect(second.getByText('Every row reaches its least level.')).toBeVisible();
	await mail.letterTo(lwazi, /: Crankpins and shells, competent/);

	await test.step('photographs are served to those who may see the work, clean of places', async () => {
		const src = await second.locator('main img').first().getAttribute('src');
		const file = await second.request.get(src ?? '');
		expect(file.status()).toBe(200);
		expect(Buffer.from(await file.body()).includes('GPS')).toBe(false);
		const nobody = await stranger();
		expect((await nobody.request.get(src ?? '')).status()).toBe(401);
		const other = await as('student@averholm.example');
		expect((await other.request.get(src ?? '')).status()).toBe(404);
	});
});
