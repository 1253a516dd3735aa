// Counts of a test run, read from the reports that the runners write for machines. Whatever is not plainly a
// pass counts as a failure: a file that does not load, a test that is skipped, a run without tests or report.
import { readKept } from './kept.mjs';

/** @typedef {{ passed: number, failed: number, remarks: string[] }} Tally */

/**
 * The parts of Vitest's JSON report that are read here.
 * @typedef {object} VitestReport
 * @property {number} numPassedTests
 * @property {number} numFailedTests
 * @property {number} numPendingTests
 * @property {number} numTodoTests
 * @property {{ name: string, status: string, assertionResults: { status: string }[] }[]} testResults
 */

/**
 * The parts of Playwright's JSON report that are read here.
 * @typedef {object} PlaywrightReport
 * @property {{ expected: number, unexpected: number, flaky: number, skipped: number }} stats
 * @property {{ message?: string }[]} errors
 */

/**
 * @param {VitestReport} report
 * @returns {Tally}
 */
export function vitestTally(report) {
	const broken = report.testResults.filter(
		({ status, assertionResults }) =>
			status === 'failed' && !assertionResults.some((result) => result.status === 'failed')
	);
	const skipped = report.numPendingTests + report.numTodoTests;
	return {
		passed: report.numPassedTests,
		failed: report.numFailedTests + broken.length + skipped,
		remarks: [
			...broken.map(({ name }) => `${name} could not be run to its end.`),
			...(skipped > 0 ? [skippedRemark(skipped)] : [])
		]
	};
}

/**
 * @param {PlaywrightReport} report
 * @returns {Tally}
 */
export function playwrightTally({ stats, errors }) {
	return {
		passed: stats.expected + stats.flaky,
		failed: stats.unexpected + stats.skipped + errors.length,
		remarks: [
			...(stats.skipped > 0 ? [skippedRemark(stats.skipped)] : []),
			...(stats.flaky > 0 ? [`${stats.flaky} passed only when tried again.`] : [])
		]
	};
}

/** @param {number} count */
function skippedRemark(count) {
	return `${count} skipped: a skipped test shows nothing, so it counts as failed.`;
}

/**
 * The tally of one run.
 * @template Report
 * @param {string} file the runner's report
 * @param {(report: Report) => Tally} count
 * @param {number} code the runner's exit code
 * @returns {Tally}
 */
export function tallyOf(file, count, code) {
	const text = readKept(file);
	if (text === null) return { passed: 0, failed: 1, remarks: ['The runner wrote no report.'] };
	const tally = count(JSON.parse(text));
	if (tally.passed + tally.failed === 0) return { passed: 0, failed: 1, remarks: ['No test ran.'] };
	if (code !== 0 && tally.failed === 0) {
		return { ...tally, failed: 1, remarks: [...tally.remarks, 'The runner itself failed; see above.'] };
	}
	return tally;
}
