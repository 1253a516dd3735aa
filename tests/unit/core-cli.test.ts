/**
 * `npm run -s core` as a shell sees it: a real process, JSON on standard input, JSON on standard output, exit codes.
 */
import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';
import { evaluate } from '$lib/gear/evaluate';
import type { IdentifyInput } from '$lib/gear/identify/contract';
import { identify } from '$lib/gear/identify/identify';
import { runCore } from '../../scripts/lib/core-cli';
import { spurCheck } from '../reference/spur-check';

const root = fileURLToPath(new URL('../..', import.meta.url));

function core(args: string[], input = '') {
	const { status, stdout, stderr } = spawnSync(process.execPath, ['scripts/core.mjs', ...args], {
		cwd: root,
		input,
		encoding: 'utf8'
	});
	return { status, stdout, stderr };
}

/** As it comes out of a pipe: fields without a value are gone. */
const plain = (value: unknown): unknown => JSON.parse(JSON.stringify(value));

const check = spurCheck({ teeth: 24, pitch: { system: 'diametral', value: 6 }, rpm: 400 });
const outcome = plain(evaluate(check));
const bad = { ...check, gear: { ...check.gear, teeth: 0 } };
const badTeeth = {
	error: {
		code: 'invalid-input',
		issues: [{ path: 'gear.teeth', message: 'Teeth must be a whole number of at least 1.' }]
	}
};

describe('identify', () => {
	const readings = {
		teeth: 25,
		outsideDiameter: { value: 5.389, unit: 'in', uncertainty: 0.001, taken: 'over-tips' },
		prior: 'inch'
	};
	const answer = plain(identify(readings as IdentifyInput));

	test('one set of readings, and several with an invalid one in place', () => {
		const one = core(['identify'], JSON.stringify(readings));
		expect(one).toMatchObject({ status: 0, stderr: '' });
		expect(JSON.parse(one.stdout)).toEqual(answer);
		const many = core(['identify'], JSON.stringify([readings, { ...readings, teeth: 'many' }]));
		expect(many.status).toBe(0);
		const [first, second] = JSON.parse(many.stdout) as unknown[];
		expect(first).toEqual(answer);
		expect(second).toMatchObject({ error: { code: 'invalid-input', issues: [{ path: 'teeth' }] } });
	});

	test('bad readings exit 2 and name the field', () => {
		const run = core(
			['identify'],
			JSON.stringify({ ...readings, outsideDiameter: { value: 0, unit: 'in' } })
		);
		expect(run.status).toBe(2);
		expect(JSON.parse(run.stdout)).toMatchObject({
			error: { issues: [{ path: 'outsideDiameter.value' }] }
		});
	});
});

describe('evaluate', () => {
	test('one check, through npm: the outcome that the core itself gives, and nothing else', () => {
		const run = spawnSync('npm', ['run', '-s', 'core', '--', 'evaluate'], {
			cwd: root,
			input: JSON.stringify(check),
			encoding: 'utf8'
		});
		expect(run.stderr).toBe('');
		expect(run.status).toBe(0);
		expect(JSON.parse(run.stdout)).toEqual(outcome);
	});

	test('an array: same length, same order, errors in place, exit 0', () => {
		const run = core(['evaluate'], JSON.stringify([check, bad, 5, check]));
		expect(run.status).toBe(0);
		const answers = JSON.parse(run.stdout) as unknown[];
		expect(answers).toHaveLength(4);
		expect([answers[0], answers[1], answers[3]]).toEqual([outcome, badTeeth, outcome]);
		expect(answers[2]).toMatchObject({ error: { code: 'invalid-input', issues: [{ path: '' }] } });
	});

	test('a thousand checks come through whole', () => {
		const run = spawnSync(process.execPath, ['scripts/core.mjs', 'evaluate'], {
			cwd: root,
			input: JSON.stringify(Array.from({ length: 1_000 }, () => check)),
			encoding: 'utf8',
			maxBuffer: 2 ** 30
		});
		expect(run.status).toBe(0);
		expect(JSON.parse(run.stdout)).toHaveLength(1_000);
	});

	test('an invalid check: its error object, exit 2', () => {
		const run = core(['evaluate'], JSON.stringify(bad));
		expect(run.status).toBe(2);
		expect(JSON.parse(run.stdout)).toEqual(badTeeth);
	});

	test.each([
		['not JSON', '{"gear": ', /^The input is not JSON/],
		['NaN, which JSON does not have', '{"gear": {"teeth": NaN}}', /^The input is not JSON/],
		['nothing', ' \n', /^No input/]
	])('%s: what to send instead, exit 2', async (_what, input, message) => {
		const run = await runCore(['evaluate'], () => Promise.resolve(input));
		expect(run.exitCode).toBe(2);
		const { error } = JSON.parse(run.stdout) as typeof badTeeth;
		expect(error.issues).toEqual([{ path: '', message: expect.stringMatching(message) as string }]);
	});

	test('a byte order mark in front is no obstacle', async () => {
		const run = await runCore(['evaluate'], () => Promise.resolve(`\uFEFF${JSON.stringify(check)}`));
		expect(JSON.parse(run.stdout)).toEqual(outcome);
	});
});

describe('commands', () => {
	test('--help: usage on stderr, exit 0', () => {
		expect(core(['--help'])).toEqual({
			status: 0,
			stdout: '',
			stderr: expect.stringContaining('Usage:') as string
		});
	});

	test.each([[[]], [['evalute']], [['evaluate', 'check.json']]])(
		'%j: usage on stderr, exit 2',
		async (args) => {
			const run = await runCore(args, () => Promise.reject(new Error('standard input was read')));
			expect(run).toEqual({ exitCode: 2, stdout: '', stderr: expect.stringContaining('Usage:') as string });
		}
	);
});
