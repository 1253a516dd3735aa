// The Node.js that runs this, and the packages of package-lock.json in node_modules/: installed when they are
// missing or older than the lock.
import { statSync } from 'node:fs';
import { join } from 'node:path';
import { aloneInCheckout } from './hold.mjs';
import { run } from './processes.mjs';
import { Trouble, note, step } from './say.mjs';
import { root } from './settings.mjs';

const oldestNode = /** @type {const} */ ([20, 19]);

/** @param {string} [version] for example "20.19.0" */
export function requireNode(version = process.versions.node) {
	const [major = 0, minor = 0] = version.split('.').map(Number);
	if (major > oldestNode[0] || (major === oldestNode[0] && minor >= oldestNode[1])) return;
	throw new Trouble(
		`This is Node.js ${version}; ${oldestNode.join('.')} or later is needed.`,
		'Install a newer Node.js and start again.'
	);
}

/**
 * Whether the modules of a checkout must be installed. npm writes its own copy of the lock into node_modules as
 * the last thing, so an installation that was broken off counts as missing.
 * @param {string} folder
 */
export function modulesAreStale(folder) {
	const lock = statSync(join(folder, 'package-lock.json'));
	const installed = statSync(join(folder, 'node_modules/.package-lock.json'), { throwIfNoEntry: false });
	return installed === undefined || installed.mtimeMs < lock.mtimeMs;
}

export async function ensureModules() {
	if (modulesAreStale(root)) await aloneInCheckout('installing packages', install);
}

/** @param {import('./lock.mjs').Lock['adopt']} started */
async function install(started) {
	if (!modulesAreStale(root)) return;
	step('Installing the packages of package-lock.json (npm ci, about a minute) …');
	// Development packages build the application, so they are wanted even where NODE_ENV=production is set.
	const { code, output } = await npm(['ci', '--include=dev'], { started });
	if (code !== 0) {
		throw new Trouble(
			'npm ci failed; the packages are not installed.',
			'Check that the npm registry can be reached from here, then start again.',
			output
		);
	}
	note('Packages installed.');
}

/**
 * Runs npm itself: the one that started this command, else the one on the PATH.
 * @param {string[]} args
 * @param {import('./processes.mjs').RunOptions} [options]
 */
export function npm(args, options = {}) {
	const script = process.env['npm_execpath'];
	return script?.endsWith('npm-cli.js')
		? run(process.execPath, [script, ...args], { cwd: root, ...options })
		: run('npm', args, { cwd: root, ...options });
}

/** @param {string} name a program that a package of node_modules brings */
export function localProgram(name) {
	return join(root, 'node_modules/.bin', name);
}
