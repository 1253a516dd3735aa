// Finds the Chromium in which the browser tests run, or has Debian's installed.
import { canInstall, installPackages } from './debian.mjs';
import { isProgram, programOnPath } from './paths.mjs';
import { Trouble, note, step } from './say.mjs';

/**
 * @param {NodeJS.ProcessEnv} [env]
 * @returns {string | null} path of the browser, null when there is none
 */
export function findChromium(env = process.env) {
	const set = env['CHROMIUM'];
	if (set !== undefined && set !== '') {
		if (isProgram(set)) return set;
		throw new Trouble(
			`CHROMIUM is "${set}", which is no program.`,
			'Set it to the path of Chromium, or leave it out.'
		);
	}
	return programOnPath('chromium', `${env['PATH'] ?? ''}:/usr/bin`);
}

/** @returns {Promise<string>} path of the browser */
export async function ensureChromium() {
	const found = findChromium();
	if (found !== null) return found;
	if (!canInstall()) {
		throw new Trouble(
			'Chromium is not installed on this machine.',
			'Install it and start again (on Debian, as root: apt-get install chromium), or set CHROMIUM to its path.'
		);
	}
	step('Installing Chromium from Debian …');
	await installPackages(['chromium']);
	const installed = findChromium();
	if (installed === null) {
		throw new Trouble(
			"Debian's package chromium brought no chromium.",
			'Set CHROMIUM to the path of a browser.'
		);
	}
	note('Chromium installed.');
	return installed;
}
