import AxeBuilder from '@axe-core/playwright';
import {
	test as base,
	expect,
	type BrowserContext,
	type BrowserContextOptions,
	type Page
} from '@playwright/test';
import { mailboxAt, type Mailbox } from './mail';
import { startSite, type Site } from './server';

export { expect };
export type { Page, Site };

export const demoPassword = 'averholm-demo';

type Fixtures = {
	/** A server with a fresh copy of the demo, shared by the tests of one file. */
	site: Site;
	mail: Mailbox;
	/** A page of a browser of its own, signed in through the real page. */
	as: (email: string, password?: string) => Promise<Page>;
	/** A page of a browser of its own, signed in as nobody. */
	stranger: () => Promise<Page>;
	/** Console errors that match are part of the test. */
	expectTrouble: (words: RegExp) => void;
	/** Opens a browser context that is watched and closed with the test. */
	openContext: (options?: BrowserContextOptions) => Promise<BrowserContext>;
	noTrouble: void;
	troubles: { said: string[]; expected: RegExp[]; watch: (context: BrowserContext) => void };
};
type WorkerFixtures = { sites: { forFile: (file: string) => Promise<Site> } };

export const test = base.extend<Fixtures, WorkerFixtures>({
	sites: [
		// eslint-disable-next-line no-empty-pattern -- Playwright reads the pattern
		async ({}, use) => {
			let current: { file: string; site: Site } | undefined;
			await use({
				async forFile(file) {
					if (current?.file === file) return current.site;
					await current?.site.stop();
					const site = await startSite({ template: process.env.RINGLAND_TEMPLATE });
					current = { file, site };
					return site;
				}
			});
			await current?.site.stop();
		},
		{ scope: 'worker', timeout: 60_000 }
	],
	site: async ({ sites }, use, info) => {
		const site = await sites.forFile(info.file);
		await use(site);
		if (info.status !== info.expectedStatus)
			await info.attach('server.log', {
				body: site.log().slice(-50_000),
				contentType: 'text/plain'
			});
	},
	baseURL: async ({ site }, use) => use(site.origin),
	mail: async ({ site }, use) => use(mailboxAt(site.mailboxUrl)),

	// eslint-disable-next-line no-empty-pattern -- Playwright reads the pattern
	troubles: async ({}, use) => {
		const said: string[] = [];
		const watch = (context: BrowserContext) => {
			context.on('console', (message) => {
				// A refused form or a missing page is an answer, not a fault of the page.
				const answered = /Failed to load resource.* status of 4\d\d/.test(message.text());
				if (message.type() === 'error' && !answered)
					said.push(`${message.text()} (${message.location().url})`);
			});
			context.on('weberror', (error) => said.push(String(error.error().stack)));
		};
		await use({ said, expected: [], watch });
	},
	expectTrouble: async ({ troubles }, use) => use((words) => troubles.expected.push(words)),
	noTrouble: [
		async ({ troubles, context }, use) => {
			troubles.watch(context);
			await use();
			const unexpected = troubles.said.filter(
				(words) => !troubles.expected.some((one) => one.test(words))
			);
			expect(unexpected, 'errors on the console that no test expected').toEqual([]);
		},
		{ auto: true }
	],

	openContext: async ({ browser, baseURL, troubles }, use) => {
		const opened: BrowserContext[] = [];
		await use(async (options = {}) => {
			// Every new browser would fetch the whole crib to keep it: the test of that asks for it.
			const context = await browser.newContext({
				baseURL,
				serviceWorkers: 'block',
				...options
			});
			troubles.watch(context);
			opened.push(context);
			return context;
		});
		for (const context of opened) await context.close();
	},
	stranger: async ({ openContext }, use) => use(async () => (await openContext()).newPage()),
	as: async ({ stranger }, use) =>
		use(async (email, password = demoPassword) => {
			const page = await stranger();
			await signIn(page, email, password);
			return page;
		})
});

export async function signIn(page: Page, email: string, password = demoPassword): Promise<void> {
	await page.goto('/sign-in');
	await page.getByLabel('E-mail').fill(email);
	await page.getByLabel('Password').fill(password);
	await page.getByRole('button', { name: 'Sign in', exact: true }).click();
	await expect(page).not.toHaveURL(/\/sign-in/);
}

/** WCAG 2.2, A and AA, as far as a program can tell. */
export async function expectAccessible(page: Page): Promise<void> {
	const { violations } = await new AxeBuilder({ page })
		.withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
		.analyze();
	const faults = violations.map(({ id, help, nodes }) => ({
		id,
		help,
		where: nodes.map((node) => `${node.target.join(' ')}: ${node.failureSummary}`)
	}));
	expect(faults, `accessibility of ${page.url()}`).toEqual([]);
}
