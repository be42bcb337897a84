import { expect, expectAccessible, test } from './support/test';
import { screenshots } from './support/screenshots';

const office = 'office@averholm.example';

test('a school admin enrols a cohort: places by card, a list, letters, students', async ({
	as,
	stranger,
	mail,
	site
}) => {
	test.setTimeout(150_000);
	const page = await as(office);
	await page.goto('/s/averholm/cohorts');
	await page.getByLabel('Name').fill('Winter intake, quay group');
	await page
		.getByLabel('Course', { exact: true })
		.selectOption({ label: 'Reading failed engines' });
	await page.getByLabel('First day').fill('2026-12-07');
	await page.getByLabel('Last day').fill('2026-12-01');
	await page.getByLabel('Instructor').selectOption({ label: 'Rune Castellane' });
	await page.getByRole('button', { name: 'Make the cohort' }).click();
	await expect(page.getByText('The last day comes after the first.')).toBeVisible();
	await expect(page.getByLabel('Name')).toHaveValue('Winter intake, quay group');
	await page.getByLabel('Last day').fill('2027-03-19');
	await page.getByRole('button', { name: 'Make the cohort' }).click();
	await expect(page.getByRole('heading', { name: 'Winter intake, quay group' })).toBeVisible();

	await test.step('a faulty list is named row by row, and nothing is written', async () => {
		await page
			.getByLabel('The list')
			.fill('Anna Strand,anna@quay.example\nNo Mail,\nTwice,anna@quay.example');
		await page.getByRole('button', { name: 'Check the list' }).click();
		await expect(page.getByText('2 rows need mending first')).toBeVisible();
		await expect(page.getByText('The e-mail address is missing.')).toBeVisible();
		await expect(page.getByText('The same e-mail address stands in line 1.')).toBeVisible();
		await expectAccessible(page);
		await page.reload();
		await expect(page.getByText('Nobody is on the roster yet.')).toBeVisible();
	});

	await test.step('a card that is refused opens nothing', async () => {
		await page.getByRole('spinbutton', { name: 'Places', exact: true }).fill('2');
		await page.getByRole('button', { name: 'To the till' }).click();
		await expect(page).toHaveURL(new RegExp(`^${site.till.url}`));
		await page.locator('#card').fill('4000 0000 0000 0002');
		await page.getByRole('button', { name: 'Pay' }).click();
		await expect(page.getByText(/refused|declined/i).first()).toBeVisible();
		await page.locator('#card').fill('4242 4242 4242 4242');
	});

	await test.step('the signed event opens the places, not the way back', async () => {
		await site.till.hold(true);
		await page.getByRole('button', { name: 'Pay' }).click();
		await expect(page.getByText("Waiting for the till's confirmation")).toBeVisible();
		await expect(page.getByText('0 paid, 0 free')).toBeVisible();
		await site.till.hold(false);
		await expect(page.getByText('The payment came in. 2 places are open.')).toBeVisible({
			timeout: 20_000
		});
		await expect(page.getByText('2 paid, 2 free')).toBeVisible();
	});

	await test.step('an event that comes again counts once', async () => {
		const events = await site.till.events();
		const statuses = await site.till.resend([...events, ...events].map((one) => one.id).reverse());
		expect(new Set(statuses)).toEqual(new Set([200]));
		await page.waitForTimeout(2500);
		await page.reload();
		await expect(page.getByText('2 paid, 2 free')).toBeVisible();
	});

	await test.step('a list longer than the places says so and enrols up to them', async () => {
		const list =
			'name;e-mail;number\nAnna Strand;anna@quay.example;Q-1\nInes Gallowan;ines@averholm.example;\nPer Dalby;per@quay.example;Q-3';
		await page.getByLabel('The list').fill(list);
		await page.getByRole('button', { name: 'Check the list' }).click();
		await expect(
			page.getByText('2 would be invited, 1 would wait: the list is longer than the paid places')
		).toBeVisible();
		await page.getByRole('button', { name: 'Write 3 and invite 2' }).click();
		await expect(
			page.getByText('3 added. 2 invited by e-mail. 1 waits until places are paid.')
		).toBeVisible();
	});

	const link = await mail.linkTo('anna@quay.example', /Your place in/, /^\/invitation\//);
	await test.step('a new person follows the link, sets a password and is in', async () => {
		const anna = await stranger();
		await anna.goto(link);
		await expect(anna.getByText('Averholm Trade School').first()).toBeVisible();
		await expectAccessible(anna);
		await screenshots(anna, 'invitation');
		await anna.reload();
		await anna.getByLabel('Password').first().fill('short');
		await anna
			.getByRole('button')
			.filter({ hasText: /place|accept/i })
			.first()
			.click();
		await expect(anna.getByText('Use at least 12 characters.').first()).toBeVisible();
		await anna.getByLabel('Password').first().fill('a few plain words');
		await anna
			.getByRole('button')
			.filter({ hasText: /place|accept/i })
			.first()
			.click();
		await expect(anna.getByRole('heading', { name: 'Your bench' })).toBeVisible();
		await expect(anna.getByText('Winter intake, quay group').first()).toBeVisible();
		await anna.goto(link);
		await expect(anna.getByRole('button').filter({ hasText: /take|accept/i })).toHaveCount(0);
	});

	await test.step('an account that exists is asked to sign in, and then accepts', async () => {
		const invited = await mail.linkTo('ines@averholm.example', /Your place in/, /^\/invitation\//);
		const ines = await stranger();
		await ines.goto(invited);
		await expect(ines.getByLabel('Choose a password')).toHaveCount(0);
		await ines
			.getByRole('link', { name: /sign in/i })
			.last()
			.click();
		await ines.getByLabel('Password').fill('averholm-demo');
		const email = ines.getByLabel('E-mail');
		if ((await email.inputValue()) === '') await email.fill('ines@averholm.example');
		await ines.getByRole('button', { name: 'Sign in', exact: true }).click();
		await ines
			.getByRole('button')
			.filter({ hasText: /place|accept/i })
			.first()
			.click();
		await expect(ines.getByText('Winter intake, quay group').first()).toBeVisible();
	});

	await test.step('a purchase order opens the place that was waited for', async () => {
		await page.getByText('Record a payment made another way').click();
		await page.getByLabel('Paid places').fill('1');
		await page.getByLabel('How it was paid').selectOption('purchase-order');
		await page.getByLabel('Its number').fill('PO-7731');
		await page.getByRole('button', { name: 'Record it' }).click();
		await expect(page.getByText('purchase order, PO-7731')).toBeVisible();
		await mail.letterTo('per@quay.example', /Your place in/);
	});

	await test.step('the chart shows the cohort, and hours can be entered', async () => {
		const instructor = await as('instructor2@averholm.example');
		await instructor.goto('/s/averholm/progress');
		await instructor.getByRole('link', { name: 'Winter intake, quay group' }).click();
		await instructor.getByRole('link', { name: 'Ines Gallowan' }).click();
		await instructor.getByLabel('Hours').fill('2,5');
		await instructor.getByLabel('What was done').fill('Strip-down');
		await instructor.getByRole('button', { name: 'Enter the hours' }).click();
		await expect(instructor.getByText(/as a number|before the cohort began/).first()).toBeVisible();
	});
});
