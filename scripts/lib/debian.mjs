// Installs Debian's packages, where this runs as root on a system that has apt-get.
import { programOnPath } from './paths.mjs';
import { run } from './processes.mjs';
import { Trouble } from './say.mjs';

/** True where `installPackages` may be tried. */
export function canInstall() {
	return process.getuid?.() === 0 && programOnPath('apt-get') !== null;
}

/** @param {string[]} names */
export async function installPackages(names) {
	const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
	// Another apt may be at work on this machine: wait for it, as a person would.
	const patience = ['-o', 'DPkg::Lock::Timeout=300'];
	// A package manager stopped half-way leaves the system broken, so it is let finish.
	const update = await run('apt-get', [...patience, 'update'], { env, letFinish: true });
	const install = await run('apt-get', [...patience, 'install', '-y', '--no-install-recommends', ...names], {
		env,
		letFinish: true
	});
	if (install.code === 0) return;
	throw new Trouble(
		`apt-get could not install ${names.join(' ')}.`,
		`Mend what apt-get says above, or install it by hand: apt-get install ${names.join(' ')}`,
		(update.code === 0 ? '' : update.output) + install.output
	);
}
