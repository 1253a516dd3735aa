// npm test: every check that there is, on a database, browser and build of its own, ending with one line of
// counts. `npm test -- vitest tests/server` runs one stage only and hands the rest on to its runner.
import { join } from 'node:path';
import { holdDataFolder } from './lib/hold.mjs';
import { atEnd, live, stillRunning } from './lib/lifetime.mjs';
import { ensureModules, requireNode } from './lib/modules.mjs';
import { Trouble, note, report, step } from './lib/say.mjs';
import { root } from './lib/settings.mjs';
import { stagesIn } from './lib/stages.mjs';

/** @typedef {import('./lib/tally.mjs').Tally} Tally */

const [only, ...extra] = process.argv.slice(2);

/** The counts so far. What did not come to its end counts as one failure more. */
const counts = { passed: 0, failed: 0, complete: false };

await live(test, { interrupted: 130 });

/** @returns {Promise<number>} */
async function test() {
	// Registered first, so done last: nothing may come after the line of counts.
	atEnd(() => step(`\n${counts.passed} passed, ${counts.failed + (counts.complete ? 0 : 1)} failed`));
	requireNode();
	const dataDir = join(root, '.data-test');
	const started = await holdDataFolder(dataDir, {
		about: 'A test run',
		remedy: 'Wait for it to end, or stop it first.'
	});
	await ensureModules();
	const stages = stagesIn({ dataDir, started });
	const chosen = Object.entries(stages).filter(([name]) => only === undefined || name === only);
	if (chosen.length === 0) {
		throw new Trouble(`There is no stage "${only}".`, `The stages are: ${Object.keys(stages).join(', ')}.`);
	}
	for (const [name, { title, work }] of chosen) {
		step(`\n${title} (${name})`);
		const tally = await counted(() => work(extra));
		tally.remarks.forEach(note);
		note(`${name}: ${tally.passed} passed, ${tally.failed} failed`);
		counts.passed += tally.passed;
		counts.failed += tally.failed;
	}
	counts.complete = true;
	return counts.failed === 0 ? 0 : 1;
}

/**
 * A stage whose set-up fails is one failure; the others still run.
 * @param {() => Promise<Tally>} work
 * @returns {Promise<Tally>}
 */
async function counted(work) {
	try {
		return await work();
	} catch (error) {
		stillRunning();
		report(error);
		return { passed: 0, failed: 1, remarks: [] };
	}
}
