import { join } from 'node:path';
import type { Page } from '@playwright/test';

const widths = [360, 1360];
const themes = ['light', 'dark'] as const;

/**
 * The page at both widths in both themes, into the folder that SCREENSHOTS names; nothing where
 * it names none. Looking at them is a person's work, so no test compares them.
 */
export async function screenshots(page: Page, name: string): Promise<void> {
	const folder = process.env.SCREENSHOTS;
	if (!folder) return;
	const before = page.viewportSize();
	for (const colorScheme of themes) {
		await page.emulateMedia({ colorScheme });
		for (const width of widths) {
			await page.setViewportSize({ width, height: 900 });
			await page.evaluate(() => document.fonts.ready);
			const path = join(folder, `${name}-${colorScheme}-${width}.png`);
			await page.screenshot({ path, fullPage: true });
		}
	}
	await page.emulateMedia({ colorScheme: null });
	if (before) await page.setViewportSize(before);
}

/** Wider than the window: something sticks out and the page scrolls sideways. */
export async function isTooWide(page: Page): Promise<boolean> {
	return page.evaluate(() => document.documentElement.scrollWidth > window.innerWidth);
}
