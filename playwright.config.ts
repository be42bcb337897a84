import { defineConfig } from '@playwright/test';
import { found } from './src/bin/steps/machine.js';

/**
 * Against the production build in Debian's Chromium. Each file of tests has a server, stand-ins
 * and a data folder of its own (tests/e2e/support), so files can run beside each other.
 */
export default defineConfig({
	testDir: 'tests/e2e',
	testMatch: '**/*.test.ts',
	globalSetup: './tests/e2e/support/seed-template.ts',
	outputDir: 'test-results',
	retries: 0,
	workers: 2,
	timeout: 90_000,
	expect: { timeout: 10_000 },
	use: {
		viewport: { width: 1360, height: 900 },
		locale: 'en-GB',
		timezoneId: 'Europe/Oslo',
		trace: 'retain-on-failure',
		screenshot: 'only-on-failure',
		launchOptions: {
			executablePath: found('chromium'),
			args: [
				'--no-sandbox',
				'--disable-dev-shm-usage',
				'--autoplay-policy=no-user-gesture-required'
			]
		}
	}
});
