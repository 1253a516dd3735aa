// Counting a test run: nothing but a plain pass counts as passed.
import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { playwrightTally, tallyOf, vitestTally } from '../../../scripts/lib/tally.mjs';
import { testFolder } from './folder';

const nothing = {
	numPassedTests: 0,
	numFailedTests: 0,
	numPendingTests: 0,
	numTodoTests: 0,
	testResults: []
};

function vitestReport(part: object): string {
	const file = join(testFolder(), 'report.json');
	writeFileSync(file, JSON.stringify({ ...nothing, ...part }));
	return file;
}

test('passed and failed tests are counted', () => {
	const file = vitestReport({ numPassedTests: 7, numFailedTests: 2 });
	expect(tallyOf(file, vitestTally, 1)).toMatchObject({ passed: 7, failed: 2 });
});

test('a test file that does not load is a failure', () => {
	const testResults = [
		{ name: 'broken.test.ts', status: 'failed', assertionResults: [] },
		{ name: 'red.test.ts', status: 'failed', assertionResults: [{ status: 'failed' }] }
	];
	const file = vitestReport({ numPassedTests: 7, numFailedTests: 1, testResults });
	expect(tallyOf(file, vitestTally, 1)).toEqual({
		passed: 7,
		failed: 2,
		remarks: ['broken.test.ts could not be run to its end.']
	});
});

test('skipped and unwritten tests are failures', () => {
	const file = vitestReport({ numPassedTests: 7, numPendingTests: 1, numTodoTests: 1 });
	expect(tallyOf(file, vitestTally, 0)).toMatchObject({ passed: 7, failed: 2 });
	const stats = { expected: 3, unexpected: 1, flaky: 1, skipped: 2 };
	expect(playwrightTally({ stats, errors: [{ message: 'no server' }] })).toMatchObject({
		passed: 4,
		failed: 4
	});
});

test('a run without tests, without a report, or that fails in another way is a failure', () => {
	expect(tallyOf(vitestReport({}), vitestTally, 0)).toMatchObject({ passed: 0, failed: 1 });
	expect(tallyOf(join(testFolder(), 'none.json'), vitestTally, 0)).toMatchObject({ passed: 0, failed: 1 });
	expect(tallyOf(vitestReport({ numPassedTests: 7 }), vitestTally, 1)).toMatchObject({
		passed: 7,
		failed: 1
	});
	expect(tallyOf(vitestReport({ numPassedTests: 7 }), vitestTally, 0)).toEqual({
		passed: 7,
		failed: 0,
		remarks: []
	});
});
