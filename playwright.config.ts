import { defineConfig, devices } from '@playwright/test';

/** The browser that `npm test` found; empty or unset is Playwright's own. */
const executablePath = process.env.PLAYWRIGHT_CHROMIUM || undefined;

export default defineConfig({
	testDir: 'tests/e2e',
	testMatch: '*.test.ts',
	globalSetup: './tests/setup/e2e-server.ts',
	workers: 2,
	retries: 0,
	forbidOnly: true,
	timeout: 240_000,
	expect: { timeout: 20_000 },
	reporter: 'line',
	use: {
		...devices['Desktop Chrome'],
		viewport: { width: 1280, height: 800 },
		screenshot: 'off',
		trace: 'off',
		video: 'off',
		launchOptions: {
			executablePath,
			args: [
				'--no-sandbox',
				'--disable-gpu',
				'--disable-quic',
				'--no-first-run',
				'--disable-background-networking',
				'--disable-component-update',
				'--disable-sync'
			]
		}
	}
});
