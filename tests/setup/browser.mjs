import { existsSync } from 'node:fs';
import { run, runNode } from './ready.mjs';

const DEBIAN = ['/usr/bin/chromium', '/usr/bin/chromium-browser'];

/**
 * Finds a Chromium: the one named, Debian's, Debian's after installing it where we may, else Playwright's own.
 * Resolves to its path, or to '' for Playwright's own.
 */
export async function findBrowser() {
	const named = process.env.PLAYWRIGHT_CHROMIUM;
	if (named) {
		if (!existsSync(named)) throw new Error(`PLAYWRIGHT_CHROMIUM names ${named}, and there is no such file.`);
		return named;
	}
	const there = () => DEBIAN.find((path) => existsSync(path));
	if (there()) return there();
	if (process.getuid?.() === 0 && existsSync('/usr/bin/apt-get')) {
		console.log('Installing Debian’s Chromium…');
		const wait = ['-o', 'DPkg::Lock::Timeout=300'];
		const env = { DEBIAN_FRONTEND: 'noninteractive' };
		await run('apt-get', [...wait, '-qq', 'update'], env);
		await run('apt-get', [...wait, '-qq', '-y', '--no-install-recommends', 'install', 'chromium'], env);
		if (there()) return there();
	}
	console.log('Fetching Playwright’s Chromium…');
	const code = await runNode('@playwright/test/cli.js', ['install', 'chromium']);
	if (code !== 0) throw new Error('No browser could be found or fetched; name one in PLAYWRIGHT_CHROMIUM.');
	return '';
}
