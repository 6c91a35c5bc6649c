import { readFileSync } from 'node:fs';

/** From vitest's report. A skipped test proves nothing, so it counts as failed; so does a file that can't be loaded. */
export const countVitest = (path) => (code) =>
	counted(path, code, (report) => {
		const unloaded = report.testResults.filter(
			({ status, assertionResults }) => status === 'failed' && assertionResults.length === 0
		);
		return {
			passed: report.numPassedTests,
			failed: report.numFailedTests + report.numPendingTests + report.numTodoTests + unloaded.length
		};
	});

/** From Playwright's report. A test that passed only when tried again counts as failed too. */
export const countPlaywright = (path) => (code) =>
	counted(path, code, ({ stats, errors }) => ({
		passed: stats.expected,
		failed: stats.unexpected + stats.flaky + stats.skipped + errors.length
	}));

/** A step that ended badly, wrote no report or ran nothing has failed, whatever its report says. */
function counted(path, code, count) {
	try {
		const { passed, failed } = count(JSON.parse(readFileSync(path, 'utf8')));
		const unsaid = failed === 0 && (code !== 0 || passed === 0);
		return { passed, failed: unsaid ? 1 : failed };
	} catch {
		return { passed: 0, failed: 1 };
	}
}
