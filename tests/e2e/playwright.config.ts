import { defineConfig } from '@playwright/test';

// One worker: the tests share a server that some of them stop on purpose, and the machines have two cores.
export default defineConfig({
	testDir: '.',
	outputDir: '../../test-results',
	workers: 1,
	fullyParallel: false,
	forbidOnly: true,
	retries: 0,
	timeout: 90_000,
	expect: { timeout: 10_000 },
	use: {
		viewport: { width: 1280, height: 800 },
		hasTouch: true,
		actionTimeout: 10_000,
		screenshot: 'only-on-failure',
		launchOptions: {
			executablePath: process.env.CHROMIUM,
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
