import { defineConfig, devices } from '@playwright/test';

/**
 * The test command starts the production build with a data folder, ports, database and demo of its
 * own, and then runs these tests, which find it by FARWHEEL_TEST_ADDRESS:
 *   npm test -- --only build,e2e
 */
const report = process.env.FARWHEEL_TEST_REPORT;

export default defineConfig({
	testDir: '.',
	testMatch: '*.test.ts',
	outputDir: '../../test-results/e2e',
	// One app and one database for all: tests run one after another, and a test that fails once fails.
	workers: 1,
	retries: 0,
	timeout: 120_000,
	expect: { timeout: 15_000 },
	forbidOnly: true,
	reporter: report ? [['list'], ['json', { outputFile: report }]] : [['list']],
	use: {
		...devices['Desktop Chrome'],
		baseURL: process.env.FARWHEEL_TEST_ADDRESS,
		locale: 'en-GB',
		timezoneId: 'Europe/London',
		trace: 'retain-on-failure',
		launchOptions: {
			executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
			// No sandbox as root, and no calls to the outside.
			args: [
				'--no-sandbox',
				'--disable-quic',
				'--no-first-run',
				'--disable-background-networking',
				'--disable-component-update',
				'--disable-sync'
			]
		}
	}
});
