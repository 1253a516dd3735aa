// Finds the folder of PostgreSQL's programs, or has Debian's package installed. The package must not start a
// database of its own: the application runs a private one.
import { existsSync, mkdirSync, readdirSync, realpathSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { canInstall, installPackages } from './debian.mjs';
import { isProgram, programOnPath } from './paths.mjs';
import { run } from './processes.mjs';
import { Trouble, note, step } from './say.mjs';

const needed = ['initdb', 'postgres', 'pg_ctl'];
const debianFolder = '/usr/lib/postgresql';

/**
 * Folders that hold all needed programs, the preferred first: where the PATH leads (links followed, since
 * often only one of the programs is linked), then Debian's folders from the highest version down.
 * @param {string} [path]
 * @param {string} [versions] folder with a folder for each version
 */
export function postgresFolders(path = process.env['PATH'] ?? '', versions = debianFolder) {
	const linked = needed
		.map((name) => programOnPath(name, path))
		.filter((program) => program !== null)
		.map((program) => dirname(realpathSync(program)));
	const installed = existsSync(versions)
		? readdirSync(versions)
				.filter((name) => /^\d+(\.\d+)?$/.test(name))
				.sort((a, b) => Number(b) - Number(a))
				.map((name) => join(versions, name, 'bin'))
		: [];
	return [...new Set([...linked, ...installed])].filter((folder) =>
		needed.every((name) => isProgram(join(folder, name)))
	);
}

/**
 * @param {string | null} major version that made the data, of which only the same can read it; null for new data
 * @returns {Promise<string>} folder of the programs
 */
export async function ensurePostgres(major) {
	const found = await choose(major);
	if (found !== null) return found;
	if (major !== null && postgresFolders().length > 0) {
		throw new Trouble(
			`The data was made by PostgreSQL ${major}, and only other versions are installed here.`,
			`Install PostgreSQL ${major} again (on Debian: apt-get install postgresql-${major}).`
		);
	}
	if (!canInstall()) {
		throw new Trouble(
			'PostgreSQL is not installed on this machine.',
			'Install it and start again (on Debian, as root: apt-get install postgresql), or set DATABASE_URL to the address of a database that runs elsewhere.'
		);
	}
	step('Installing PostgreSQL from Debian …');
	await withoutSystemCluster(() => installPackages(['postgresql']));
	const installed = await choose(major);
	if (installed === null) {
		throw new Trouble(
			`Debian's package postgresql brought no ${needed.join(', ')} that fits.`,
			major === null ? `Look into ${debianFolder}.` : `The data needs PostgreSQL ${major}.`
		);
	}
	note('PostgreSQL installed.');
	return installed;
}

/** @param {string | null} major */
async function choose(major) {
	for (const folder of postgresFolders()) {
		if (major === null) return folder;
		const { output } = await run(join(folder, 'postgres'), ['--version']);
		if (output.match(/(\d+)(\.|devel|beta|rc)/)?.[1] === major) return folder;
	}
	return null;
}

/**
 * @template T
 * @param {() => Promise<T>} install
 */
async function withoutSystemCluster(install) {
	const folder = '/etc/postgresql-common/createcluster.d';
	const file = join(folder, 'cogmark.conf');
	mkdirSync(folder, { recursive: true });
	writeFileSync(file, '# Read while Cogmark installs PostgreSQL.\ncreate_main_cluster = false\n');
	try {
		return await install();
	} finally {
		rmSync(file);
	}
}
