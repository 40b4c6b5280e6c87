import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { inWords, oneCheck, playwrightCounts, sum, vitestCounts } from '../../src/local/counts.js';
import { temporaryFolder } from './temporaryFolder';

function file(content: object): string {
	const path = join(temporaryFolder(), 'report.json');
	writeFileSync(path, JSON.stringify(content));
	return path;
}

test('vitestCounts sums passed, failed and skipped tests', () => {
	const report = file({
		numPassedTests: 7,
		numFailedTests: 2,
		numPendingTests: 1,
		numTodoTests: 1
	});
	expect(vitestCounts(report, 1)).toEqual({ passed: 7, failed: 2, skipped: 2 });
});

test('vitestCounts counts a file that breaks before its first test as failed', () => {
	const report = file({
		numPassedTests: 7,
		numFailedTests: 1,
		testResults: [
			{ status: 'failed', assertionResults: [] },
			{ status: 'failed', assertionResults: [{ status: 'failed' }] },
			{ status: 'passed', assertionResults: [{ status: 'passed' }] }
		]
	});
	expect(vitestCounts(report, 1)).toEqual({ passed: 7, failed: 2, skipped: 0 });
});

test('a run that crashes, or leaves no report, counts as one failure', () => {
	const none = join(temporaryFolder(), 'none.json');
	expect(vitestCounts(none, 1)).toEqual({ passed: 0, failed: 1, skipped: 0 });
	expect(playwrightCounts(none, 127)).toEqual({ passed: 0, failed: 1, skipped: 0 });
	expect(vitestCounts(file({ numPassedTests: 3, numFailedTests: 0 }), 1).failed).toBe(1);
});

test('playwrightCounts counts a flaky test as failed', () => {
	const report = file({ stats: { expected: 5, unexpected: 1, flaky: 1, skipped: 2 } });
	expect(playwrightCounts(report, 1)).toEqual({ passed: 5, failed: 2, skipped: 2 });
});

test('the closing line names skipped tests only where there are some', () => {
	const all = sum([oneCheck(true), oneCheck(false), { passed: 3, failed: 0, skipped: 0 }]);
	expect(inWords(all)).toBe('4 passed, 1 failed');
	expect(inWords({ ...all, skipped: 2 })).toBe('4 passed, 1 failed, 2 skipped');
});
