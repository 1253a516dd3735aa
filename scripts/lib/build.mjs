// Builds the application when its sources are newer than the last complete build.
import { existsSync, readdirSync, statSync, utimesSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { aloneInCheckout } from './hold.mjs';
import { localProgram } from './modules.mjs';
import { run } from './processes.mjs';
import { Trouble, note, step } from './say.mjs';
import { root } from './settings.mjs';

const sources = ['src', 'static', 'package-lock.json', 'svelte.config.js', 'vite.config.ts'];

/** Written after a complete build; its time is when that build began, so that later changes count as newer. */
const stampIn = (/** @type {string} */ folder) => join(folder, 'build/complete.txt');

/**
 * The time of the latest change; of a folder too, since taking a file away changes only that.
 * @param {string} path
 * @returns {number} in milliseconds; 0 when there is nothing
 */
export function newestChange(path) {
	const stat = statSync(path, { throwIfNoEntry: false });
	if (stat === undefined) return 0;
	if (!stat.isDirectory()) return stat.mtimeMs;
	return readdirSync(path).reduce(
		(newest, name) => Math.max(newest, newestChange(join(path, name))),
		stat.mtimeMs
	);
}

/** @param {string} folder a checkout */
export function buildIsStale(folder) {
	const stamp = statSync(stampIn(folder), { throwIfNoEntry: false });
	if (stamp === undefined) return true;
	return sources.some((name) => newestChange(join(folder, name)) > stamp.mtimeMs);
}

/** The TypeScript settings that SvelteKit writes, without which no source file of the application can be read. */
export async function ensureSettings() {
	if (existsSync(join(root, '.svelte-kit/tsconfig.json'))) return;
	const { code, output } = await run(localProgram('svelte-kit'), ['sync'], { cwd: root });
	if (code === 0) return;
	throw new Trouble('SvelteKit could not write its settings.', 'Mend what it says above.', output);
}

export async function ensureBuild() {
	if (buildIsStale(root)) await aloneInCheckout('building the application', build);
}

/** @param {import('./lock.mjs').Lock['adopt']} started */
async function build(started) {
	if (!buildIsStale(root)) return;
	step('Building the application (about half a minute) …');
	const began = new Date();
	const { code, output } = await run(localProgram('vite'), ['build'], { cwd: root, started });
	if (code !== 0) {
		throw new Trouble('The application could not be built.', 'Mend what the build says above.', output);
	}
	const stamp = stampIn(root);
	writeFileSync(stamp, 'The build in this folder is complete.\n');
	utimesSync(stamp, began, began);
	note('Built.');
}
