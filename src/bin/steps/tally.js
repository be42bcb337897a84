import { existsSync, readFileSync } from 'node:fs';
import { say, seconds } from './say.js';

/**
 * @typedef {{ passed: number, failed: number, skipped: number }} Counts
 */

/** The counts of every runner, added up, and one line for each as it ends. */
export function tally() {
	const total = { passed: 0, failed: 0, skipped: 0 };
	return {
		total,
		/**
		 * @param {string} name
		 * @param {() => Promise<Counts>} stage
		 */
		async stage(name, stage) {
			const startedAtMs = Date.now();
			const counts = await stage();
			total.passed += counts.passed;
			total.failed += counts.failed;
			total.skipped += counts.skipped;
			const skipped = counts.skipped > 0 ? `, ${counts.skipped} skipped` : '';
			say(
				`== ${name}: ${counts.passed} passed, ${counts.failed} failed${skipped} (${seconds(startedAtMs)})`
			);
			return counts.failed === 0;
		}
	};
}

/** A command that either holds or does not. @param {boolean} held @returns {Counts} */
export const single = (held) => ({ passed: held ? 1 : 0, failed: held ? 0 : 1, skipped: 0 });

/**
 * What a run of vitest counted. A file that could not be loaded has no test that failed, and an
 * error outside every test neither, so both are counted by themselves.
 * @param {string} file of its JSON reporter
 * @param {number} code that it ended with
 * @returns {Counts}
 */
export function vitestCounts(file, code) {
	const report = readReport(file);
	if (!report) return single(false);
	const unloaded = report.testResults.filter(
		(/** @type {any} */ one) => one.status === 'failed' && one.assertionResults.every(isNoFailure)
	).length;
	const failed = report.numFailedTests + unloaded;
	return {
		passed: report.numPassedTests,
		failed: failed === 0 && code !== 0 ? 1 : failed,
		skipped: report.numPendingTests + report.numTodoTests
	};
}

/** @param {{ status: string }} one */
const isNoFailure = ({ status }) => status !== 'failed';

/**
 * @param {string} file of Playwright's JSON reporter
 * @param {number} code
 * @returns {Counts}
 */
export function playwrightCounts(file, code) {
	const report = readReport(file);
	if (!report) return single(false);
	const { expected, unexpected, flaky, skipped } = report.stats;
	const failed = unexpected + flaky;
	return { passed: expected, failed: failed === 0 && code !== 0 ? 1 : failed, skipped };
}

/** @param {string} file */
function readReport(file) {
	return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : undefined;
}
