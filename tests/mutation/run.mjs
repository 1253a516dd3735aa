// Changes each constant and factor of the core's formulas, one at a time, and runs the tests: one must fail each time.
// A change that no test notices is a failure here. `node tests/mutation/run.mjs [--report FILE] [part of a name]`.
import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { availableParallelism, tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { parseArgs } from 'node:util';
import { mutantsOf } from './mutants.mjs';

const root = fileURLToPath(new URL('../..', import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'cogmark-mutants-'));

/**
 * @param {Record<string, string>} env
 * @returns {Promise<boolean>} whether every test passed
 */
function testsPass(env) {
	return new Promise((resolve, reject) => {
		const args = ['node_modules/vitest/vitest.mjs', 'run', '--config', 'tests/mutation/vitest.config.mjs'];
		const child = spawn(process.execPath, args, {
			cwd: root,
			env: { ...process.env, ...env },
			stdio: 'ignore'
		});
		child.on('error', reject);
		child.on('exit', (code) => resolve(code === 0));
	});
}

const { values, positionals } = parseArgs({
	allowPositionals: true,
	options: { report: { type: 'string' } }
});
const [part = ''] = positionals;

/** @type {import('./mutants.mjs').Mutant[]} */
const missed = [];
let caught = 0;

try {
	const waiting = mutantsOf(join(root, 'src/lib/gear')).filter(({ what }) => what.includes(part));
	if (!(await testsPass({}))) throw new Error('The tests fail without any change: mend them first.');

	/** @param {number} worker */
	const work = async (worker) => {
		for (let mutant = waiting.shift(); mutant; mutant = waiting.shift()) {
			const source = join(folder, `${worker}.ts`);
			writeFileSync(source, mutant.source);
			if (await testsPass({ MUTANT_FILE: mutant.file, MUTANT_SOURCE: source })) missed.push(mutant);
			else caught++;
		}
	};
	await Promise.all(Array.from({ length: availableParallelism() }, (_, worker) => work(worker)));
} finally {
	rmSync(folder, { recursive: true, force: true });
}

for (const { what, line } of missed)
	console.error(`No test fails when this is changed: ${what} (line ${line})`);
if (values.report)
	writeFileSync(values.report, JSON.stringify({ passed: caught, failed: missed.length, remarks: [] }));
console.log(`${caught} passed, ${missed.length} failed`);
process.exitCode = missed.length === 0 ? 0 : 1;
