import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { playwrightCounts, vitestCounts } from '../../src/bin/steps/tally.js';

let folder: string;
beforeEach(() => {
	folder = mkdtempSync(join(tmpdir(), 'tally-'));
});
afterEach(() => rmSync(folder, { recursive: true }));

function report(value: unknown): string {
	const file = join(folder, 'report.json');
	writeFileSync(file, JSON.stringify(value));
	return file;
}

const vitest = (more: object) => ({
	numPassedTests: 5,
	numFailedTests: 0,
	numPendingTests: 1,
	numTodoTests: 0,
	testResults: [{ status: 'passed', assertionResults: [{ status: 'passed' }] }],
	...more
});

it('counts the tests of vitest', () => {
	expect(vitestCounts(report(vitest({})), 0)).toEqual({ passed: 5, failed: 0, skipped: 1 });
	const failing = {
		numFailedTests: 2,
		testResults: [{ status: 'failed', assertionResults: [{ status: 'failed' }] }]
	};
	expect(vitestCounts(report(vitest(failing)), 1)).toMatchObject({ passed: 5, failed: 2 });
});

it('counts a file that did not load, an error outside every test and a missing report', () => {
	const unloaded = { testResults: [{ status: 'failed', assertionResults: [] }] };
	expect(vitestCounts(report(vitest(unloaded)), 1).failed).toBe(1);
	expect(vitestCounts(report(vitest({})), 1).failed).toBe(1);
	expect(vitestCounts(join(folder, 'absent.json'), 0)).toMatchObject({ passed: 0, failed: 1 });
});

it('counts the tests of Playwright, a flaky one as failed', () => {
	const stats = { expected: 7, unexpected: 1, flaky: 1, skipped: 2 };
	expect(playwrightCounts(report({ stats }), 1)).toEqual({ passed: 7, failed: 2, skipped: 2 });
	const nothing = { expected: 0, unexpected: 0, flaky: 0, skipped: 0 };
	expect(playwrightCounts(report({ stats: nothing }), 1).failed).toBe(1);
});
