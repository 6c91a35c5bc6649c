// `npm test`: everything that proves the product, two steps at once. The last line counts what passed.
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { findBrowser } from './setup/browser.mjs';
import { countPlaywright, countVitest } from './setup/counts.mjs';
import { bin, checkNode, install, runNode } from './setup/ready.mjs';
import { runSteps } from './setup/steps.mjs';

checkNode();
await install();
await runNode('@sveltejs/kit/svelte-kit.js', ['sync']);

const reports = mkdtempSync(join(tmpdir(), 'paperlarder-tests-'));
const unit = join(reports, 'unit.json');
const journeys = join(reports, 'journeys.json');

const vite = (...args) => [...bin('vite/bin/vite.js'), ...args];
const types = (project) => [...bin('typescript/bin/tsc'), '-p', project];

const results = await runSteps(
	[
		{ name: 'build', commands: [vite('build'), vite('build', '--mode', 'workers')] },
		{ name: 'browser', commands: [rememberBrowser] },
		{ name: 'format', commands: [[...bin('prettier/bin/prettier.cjs'), '--check', '.']] },
		{ name: 'types of the domain', commands: [types('src/lib/domain')] },
		{ name: 'types of the seeds', commands: [types('seeds')] },
		{ name: 'lint', commands: [[...bin('eslint/bin/eslint.js'), '.']] },
		{
			name: 'unit, published, service and API tests',
			after: ['build'],
			commands: [
				[
					...bin('vitest/vitest.mjs'),
					'run',
					'--reporter=default',
					'--reporter=json',
					`--outputFile.json=${unit}`
				]
			],
			count: countVitest(unit)
		},
		{
			name: 'types',
			commands: [[...bin('svelte-check/bin/svelte-check'), '--tsconfig', './tsconfig.json']]
		},
		{ name: 'unused code', commands: [bin('knip/bin/knip.js')] },
		{
			name: 'browser journeys',
			after: ['build', 'browser'],
			commands: [[...bin('@playwright/test/cli.js'), 'test', '--reporter=line,json']],
			env: { PLAYWRIGHT_JSON_OUTPUT_NAME: journeys },
			count: countPlaywright(journeys)
		}
	],
	2
);
rmSync(reports, { recursive: true, force: true });

console.log('');
for (const { name, passed, failed, seconds } of results) {
	console.log(`${failed === 0 ? 'ok  ' : 'FAIL'}  ${name}: ${passed} passed, ${failed} failed, ${seconds} s`);
}
const passed = results.reduce((sum, result) => sum + result.passed, 0);
const failed = results.reduce((sum, result) => sum + result.failed, 0);
process.exitCode = failed > 0 || passed === 0 ? 1 : 0;
console.log(`${passed} passed, ${failed} failed`);

/** The journeys' step is told which browser through the environment; empty is Playwright's own. */
async function rememberBrowser() {
	const path = await findBrowser();
	process.env.PLAYWRIGHT_CHROMIUM = path;
	return path || 'Playwright’s own Chromium';
}
