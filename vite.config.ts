import { sveltekit } from '@sveltejs/kit/vite';
import tailwindcss from '@tailwindcss/vite';
import { playwright } from '@vitest/browser-playwright';
import { defineConfig } from 'vitest/config';

// Flags for Debian's Chromium: no sandbox as root, and no calls to the outside.
const chromium = {
	executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
	args: [
		'--no-sandbox',
		'--disable-quic',
		'--no-first-run',
		'--disable-background-networking',
		'--disable-component-update',
		'--disable-sync'
	]
};

export default defineConfig({
	plugins: [tailwindcss(), sveltekit()],
	test: {
		expect: { requireAssertions: true },
		projects: [
			{
				extends: true,
				test: {
					name: 'unit',
					environment: 'node',
					include: ['tests/**/*.test.ts'],
					exclude: ['tests/**/*.svelte.test.ts', 'tests/server/**', 'tests/e2e/**']
				}
			},
			{
				extends: true,
				test: {
					name: 'server',
					environment: 'node',
					include: ['tests/server/**/*.test.ts'],
					testTimeout: 30_000,
					hookTimeout: 60_000
				}
			},
			{
				extends: true,
				test: {
					name: 'component',
					include: ['tests/**/*.svelte.test.ts'],
					testTimeout: 60_000,
					browser: {
						enabled: true,
						headless: true,
						screenshotFailures: false,
						provider: playwright({ launchOptions: chromium }),
						instances: [{ browser: 'chromium' }]
					}
				}
			}
		]
	}
});
