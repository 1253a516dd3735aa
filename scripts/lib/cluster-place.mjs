// Where the private database's files lie and as which user PostgreSQL runs: it refuses to run as root, and its
// user must be able to reach the folder.
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { chownSync, mkdirSync, readFileSync, statSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { Trouble, note } from './say.mjs';

/**
 * The user that PostgreSQL runs as; empty: the user of this process.
 * @typedef {{ uid: number, gid: number } | Record<string, never>} ClusterUser
 */

/** Data that the database's user cannot reach in the checkout goes here; it stays over a restart of the machine. */
const sharedFolder = '/var/lib/cogmark';

/**
 * The place for new data: in the data folder, or where the database's user can reach it.
 * @param {string} dataDir
 * @returns {boolean} true when it must be outside the data folder
 */
export function mustLieOutside(dataDir) {
	const user = newClusterUser();
	if (!('uid' in user) || canEnter(dataDir, user)) return false;
	note(`PostgreSQL's own user cannot enter ${dataDir}: the database's files go to ${outsidePlace(dataDir)}.`);
	return true;
}

/** @param {string} dataDir */
export function outsidePlace(dataDir) {
	return join(sharedFolder, createHash('sha256').update(dataDir).digest('hex').slice(0, 16));
}

/** @returns {ClusterUser} the user for a cluster that is to be made */
export function newClusterUser() {
	if (process.getuid?.() !== 0) return {};
	const users = readFileSync('/etc/passwd', 'utf8').split('\n');
	for (const name of ['postgres', 'nobody']) {
		const [, , uid, gid] = users.find((line) => line.startsWith(`${name}:`))?.split(':') ?? [];
		if (uid !== undefined && gid !== undefined) return { uid: Number(uid), gid: Number(gid) };
	}
	throw new Trouble(
		'PostgreSQL does not run as root, and this machine has no user "postgres" or "nobody".',
		'Start as an ordinary user, or set DATABASE_URL to the address of a database that runs elsewhere.'
	);
}

/**
 * The user of a cluster that exists: whoever owns its files.
 * @param {string} place
 * @returns {ClusterUser}
 */
export function ownerOf(place) {
	const { uid, gid } = statSync(place);
	const self = process.getuid?.();
	if (self === undefined || self === uid) return {};
	if (self === 0) return { uid, gid };
	throw new Trouble(
		`The database's files in ${place} belong to another user (number ${uid}).`,
		'Start as that user or as root, or set DATA_DIR to another folder.'
	);
}

/**
 * Makes a private folder for the database's user; only that user and root see into it.
 * @param {string} path
 * @param {ClusterUser} user
 */
export function makePrivateFolder(path, user) {
	mkdirSync(dirname(path), { recursive: true, mode: 0o711 });
	mkdirSync(path, { mode: 0o700 });
	if ('uid' in user) chownSync(path, Number(user.uid), Number(user.gid));
}

/**
 * Asked of the system itself, as that user: rights lists and mounts count too, not only the mode bits.
 * @param {string} folder
 * @param {ClusterUser} user
 */
function canEnter(folder, user) {
	return spawnSync('/bin/sh', ['-c', 'cd -- "$1"', 'sh', folder], { cwd: '/', ...user }).status === 0;
}
