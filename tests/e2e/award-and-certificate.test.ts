import { readPdf } from './support/pdf';
import { expect, expectAccessible, test } from './support/test';

test('an award is decided by a verifier, printed, checked by anyone, and withdrawn', async ({
	as,
	stranger,
	mail,
	site
}) => {
	const verifier = await as('verifier@averholm.example');
	await verifier.goto('/s/averholm/awards');
	await verifier.getByRole('link', { name: 'Edda Moreau' }).click();
	await expect(verifier.getByText('All 4 lessons were read.')).toBeVisible();
	await verifier.getByLabel('Decline for now').check();
	await verifier.getByRole('button', { name: 'Sign the decision' }).click();
	await expect(verifier.getByText('Say why: the student reads it.')).toBeVisible();
	await verifier.getByRole('radio', { name: /Award: the evidence/ }).check();
	await verifier.getByRole('button', { name: 'Sign the decision' }).click();
	await expect(verifier.getByText('Awarded', { exact: true }).first()).toBeVisible();

	const letter = await mail.letterTo('edda@averholm.example', /Your certificate/);
	const edda = await as('edda@averholm.example');
	await edda.goto('/s/averholm/certificates');
	const code = (await edda.locator('main .fig.text-lg').textContent())?.trim() ?? '';
	expect(letter.text).toContain(code);
	const [download] = await Promise.all([
		edda.waitForEvent('download'),
		edda.getByRole('link', { name: 'Download the PDF' }).click()
	]);
	expect(download.suggestedFilename()).toBe(`${code}.pdf`);
	const chunks: Buffer[] = [];
	for await (const chunk of await download.createReadStream()) chunks.push(chunk as Buffer);
	const pdf = await readPdf(Buffer.concat(chunks));
	for (const words of [
		'Edda Moreau',
		'Reading failed engines',
		'Averholm Trade School',
		'AV3-1150',
		code
	])
		expect(pdf.text).toContain(words);
	expect(pdf.text).toContain('Machining of journals, bores or head faces');
	expect(pdf.fonts.length).toBeGreaterThan(1);
	expect(pdf.fonts.filter((one) => !one.embedded)).toEqual([]);
	expect(pdf.qr).toBe(`${site.origin}/check/${code}`);

	const employer = await stranger();
	await employer.goto('/check');
	await employer
		.getByLabel('Code of the certificate')
		.fill(code.toLowerCase().replaceAll('-', ' '));
	await employer.getByRole('button', { name: 'Check' }).click();
	await expect(employer.getByRole('heading', { name: 'Edda Moreau' })).toBeVisible();
	await expect(employer.getByText('Stands', { exact: true })).toBeVisible();
	await expectAccessible(employer);
	const address = employer.url();

	await verifier.getByText('Withdraw the certificate').click();
	await verifier.getByLabel('Why it is withdrawn').fill('The readings were another student’s.');
	await verifier.getByRole('button', { name: 'Withdraw it' }).click();
	await expect(verifier.getByText('Withdrawn', { exact: true }).first()).toBeVisible();
	await employer.goto(address);
	await expect(employer.getByText('Withdrawn', { exact: true })).toBeVisible();
	await expect(employer.getByText('The readings were another student’s.')).toBeVisible();
	await edda.reload();
	await expect(edda.getByRole('link', { name: 'Download the PDF' })).toHaveCount(0);
});

test('a code with a slip is told from one that nobody has', async ({ page }) => {
	await page.goto('/check/RL-0000-0000-0001');
	await expect(page.getByText('a character is wrong or missing')).toBeVisible();
});
