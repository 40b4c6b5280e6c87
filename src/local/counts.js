import { existsSync } from 'node:fs';
import { readJson } from './folders.js';

/**
 * @typedef {{ passed: number, failed: number, skipped: number }} Counts
 */

/** @param {boolean} good @returns {Counts} of a step that is one check, such as the build */
export const oneCheck = (good) => ({ passed: good ? 1 : 0, failed: good ? 0 : 1, skipped: 0 });

/**
 * A run that ended badly without a failed test (it crashed, found no test, or broke outside one)
 * counts as one failure.
 * @param {Counts} counts
 * @param {number} code
 * @returns {Counts}
 */
export const withCrash = (counts, code) =>
	code !== 0 && counts.failed === 0 ? { ...counts, failed: 1 } : counts;

/** @param {string} file @returns {Record<string, unknown>} empty where there is no report */
function report(file) {
	const read = existsSync(file) ? readJson(file) : undefined;
	return typeof read === 'object' && read !== null ? { ...read } : {};
}

/** @param {unknown} value */
const number = (value) => (typeof value === 'number' ? value : 0);

/** @param {string} file Vitest's JSON report @param {number} code @returns {Counts} */
export function vitestCounts(file, code) {
	const { numPassedTests, numFailedTests, numPendingTests, numTodoTests, ...rest } = report(file);
	const suites = Array.isArray(rest.testResults) ? rest.testResults : [];
	// A file that breaks before its first test has no failed test, and is a failure all the same.
	const broken = suites.filter(
		(suite) =>
			suite.status === 'failed' &&
			!suite.assertionResults.some(
				(/** @type {{ status: string }} */ result) => result.status === 'failed'
			)
	).length;
	return withCrash(
		{
			passed: number(numPassedTests),
			failed: number(numFailedTests) + broken,
			skipped: number(numPendingTests) + number(numTodoTests)
		},
		code
	);
}

/** @param {string} file Playwright's JSON report @param {number} code @returns {Counts} */
export function playwrightCounts(file, code) {
	const { stats } = report(file);
	const { expected, unexpected, flaky, skipped } = /** @type {Record<string, unknown>} */ (
		typeof stats === 'object' && stats !== null ? stats : {}
	);
	return withCrash(
		{
			passed: number(expected),
			failed: number(unexpected) + number(flaky),
			skipped: number(skipped)
		},
		code
	);
}

/** @param {Counts[]} all @returns {Counts} */
export const sum = (all) =>
	all.reduce(
		(total, one) => ({
			passed: total.passed + one.passed,
			failed: total.failed + one.failed,
			skipped: total.skipped + one.skipped
		}),
		{ passed: 0, failed: 0, skipped: 0 }
	);

/** @param {Counts} counts @returns {string} such as "12 passed, 0 failed" */
export const inWords = ({ passed, failed, skipped }) =>
	`${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`;
