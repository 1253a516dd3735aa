// The files of the private database: made whole or not at all, and freed of a PostgreSQL that an earlier,
// killed command left running on them. To be called only by the holder of the data folder's lock.
import { chownSync, existsSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { makePrivateFolder } from './cluster-place.mjs';
import { run } from './processes.mjs';
import { Trouble, note } from './say.mjs';

/** @typedef {import('./cluster-place.mjs').ClusterUser} ClusterUser */
/** @typedef {import('./lock.mjs').Lock['adopt']} Adopt */

/** Role that may do everything; only the set-up signs in with it. */
export const adminRole = 'cogmark_admin';

/**
 * @param {string} place
 * @returns {string | null} major version of the PostgreSQL that made the cluster; null when there is none
 */
export function madeBy(place) {
	const file = join(place, 'PG_VERSION');
	return existsSync(file) ? readFileSync(file, 'utf8').trim() : null;
}

/**
 * Makes a cluster that asks everyone for a password.
 * @param {{ place: string, binaries: string, user: ClusterUser, adminPassword: string, started: Adopt }} options
 */
export async function makeCluster({ place, binaries, user, adminPassword, started }) {
	// Made beside its place and moved there when complete: one broken off half-way is never taken for a database.
	const draft = `${place}.new`;
	rmSync(draft, { recursive: true, force: true });
	makePrivateFolder(draft, user);
	const passwordFile = `${place}.password`;
	try {
		writeFileSync(passwordFile, adminPassword, { mode: 0o600 });
		if ('uid' in user) chownSync(passwordFile, Number(user.uid), Number(user.gid));
		const locale = process.platform === 'linux' ? 'C.UTF-8' : 'en_US.UTF-8';
		const { code, output } = await run(
			join(binaries, 'initdb'),
			[
				`--pgdata=${draft}`,
				`--username=${adminRole}`,
				`--pwfile=${passwordFile}`,
				'--auth=scram-sha-256',
				'--encoding=UTF8',
				`--locale=${locale}`,
				'--no-instructions'
			],
			{ cwd: draft, ...user, started }
		);
		if (code !== 0) {
			throw new Trouble(
				`PostgreSQL could not make its files in ${place}.`,
				'Mend what initdb says above and start again.',
				output
			);
		}
	} finally {
		rmSync(passwordFile, { force: true });
	}
	renameSync(draft, place);
}

/**
 * Ends a PostgreSQL that still runs on these files although the command that started it is gone.
 * @param {{ place: string, binaries: string, user: ClusterUser }} options
 */
export async function endLeftover({ place, binaries, user }) {
	const pidFile = join(place, 'postmaster.pid');
	const pid = existsSync(pidFile) ? Number(readFileSync(pidFile, 'utf8').split('\n')[0]) : 0;
	if (!(pid > 0)) return;
	if (!isPostgres(pid)) {
		// The number may belong to any program by now. PostgreSQL would wait for that program, pg_ctl would stop it.
		rmSync(pidFile);
		return;
	}
	note('Stopping the PostgreSQL that an earlier, killed start left running.');
	const { code, output } = await run(
		join(binaries, 'pg_ctl'),
		['stop', '-D', place, '-m', 'fast', '-w', '-t', '60'],
		{ cwd: place, ...user }
	);
	// It may have come to its end by itself in the meantime.
	if (code !== 0 && existsSync(pidFile)) {
		throw new Trouble(
			`The PostgreSQL that an earlier start left running (process ${pid}) does not stop.`,
			`Stop it by hand (kill -INT ${pid}) and start again.`,
			output
		);
	}
}

/** @param {number} pid */
function isPostgres(pid) {
	// Elsewhere PostgreSQL and pg_ctl are left to judge for themselves.
	if (process.platform !== 'linux') return true;
	try {
		return readFileSync(`/proc/${pid}/comm`, 'utf8').trim() === 'postgres';
	} catch {
		return false;
	}
}
