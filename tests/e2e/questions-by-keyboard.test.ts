import { expect, expectAccessible, test } from './support/test';

test('a quiz is sat and read with the keyboard alone', async ({ as }) => {
	const page = await as('student@averholm.example');
	await page.goto('/s/averholm/bench');
	await page.getByRole('link', { name: 'Torque and tagging' }).press('Enter');
	await page.getByRole('button', { name: 'Begin the sitting' }).press('Enter');
	const saved = page.locator('[data-save-state="saved"]');
	await expect(saved).toBeVisible();

	await test.step('a tightening order: focus stays among the bolts, to the last of them', async () => {
		const group = page.getByRole('group', { name: 'Take the next bolt' });
		const bolts = await group.getByRole('button').count();
		await group.getByRole('button').nth(1).focus();
		for (let taken = 1; taken < bolts; taken++) {
			await page.keyboard.press('Enter');
			await expect(group.getByRole('button')).toHaveCount(bolts - taken);
			await expect(group.locator('button:focus')).toHaveCount(1);
		}
		await page.keyboard.press('Space');
		await expect(page.getByRole('button', { name: 'Take the last one back' })).toBeFocused();
		await page.keyboard.press('Enter');
		await expect(group.getByRole('button')).toHaveCount(1);
	});

	await test.step('a choice by arrow key, a figure with its unit by typing', async () => {
		const radio = page.locator('main li input[type=radio]').first();
		await radio.focus();
		await page.keyboard.press('ArrowDown');
		await page.getByLabel('Your figure').first().focus();
		await page.keyboard.type('12.5');
		await page.keyboard.press('Tab');
		await expect(page.getByLabel('Unit').first()).toBeFocused();
		await expect(saved).toBeVisible();
	});

	await page.getByRole('button', { name: 'Hand in' }).press('Enter');
	await expect(page.getByRole('heading', { name: /result/ })).toBeVisible();
	// What was asked is read out on the result, too: in the tree, and not to be changed.
	await expect(page.getByRole('radio').first()).toBeDisabled();
	await expect(page.getByText('Left out').first()).toBeVisible();
	await expectAccessible(page);
});
