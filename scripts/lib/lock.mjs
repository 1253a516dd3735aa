// One command at a time for a folder: a file with the holder's process number and start time. A holder that is
// gone (kill -9, power cut) loses the lock to the next, who is told which programs the dead one left running.
import { linkSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { isRunning, know } from './processes.mjs';

/** @typedef {import('./processes.mjs').Known} Known */

/**
 * @typedef {object} Held what the lock file says
 * @property {Known} holder
 * @property {Known[]} children programs that the holder started and that outlive a kill -9 of it
 * @property {string} about what the holder is, in words for people
 */

/**
 * @typedef {object} Lock
 * @property {Known[]} leftovers programs of a dead holder that still run
 * @property {(child: Known) => void} adopt writes a started program down
 * @property {() => void} release
 */

/**
 * Takes the lock.
 * @param {string} path lock file; its folder is made when missing
 * @param {string} about what the holder is, shown to whoever is refused
 * @returns {Lock | Held} a lock (it has `release`), or what the living holder wrote
 */
export function takeLock(path, about) {
	mkdirSync(dirname(path), { recursive: true, mode: 0o711 });
	/** @type {Held} */
	const mine = { holder: know(process.pid), children: [], about };
	const draft = `${path}.${process.pid}`;
	for (;;) {
		write(draft, mine);
		try {
			// A link appears at once and whole, and never over another file: nobody can read half a lock.
			linkSync(draft, path);
			rmSync(draft);
			break;
		} catch (error) {
			rmSync(draft);
			if (!(error instanceof Error && 'code' in error && error.code === 'EEXIST')) throw error;
		}
		const other = read(path);
		if (other !== null && isRunning(other.holder)) return other;
		const removed = removeDead(path, `${draft}.dead`);
		mine.children.push(...(removed?.children ?? []).filter(isRunning));
	}
	return {
		leftovers: [...mine.children],
		adopt(child) {
			mine.children = [...mine.children.filter(isRunning), child];
			write(draft, mine);
			renameSync(draft, path);
		},
		release() {
			rmSync(path, { force: true });
		}
	};
}

/**
 * Takes a dead holder's file away. Two commands may find it at the same moment: the file is moved first and
 * looked at again, so that the slower one puts back a lock that the faster one has just taken.
 * @param {string} path
 * @param {string} aside
 * @returns {Held | null}
 */
function removeDead(path, aside) {
	try {
		renameSync(path, aside);
	} catch {
		return null;
	}
	const moved = read(aside);
	if (moved !== null && isRunning(moved.holder)) {
		renameSync(aside, path);
		return null;
	}
	rmSync(aside);
	return moved;
}

/**
 * @param {string} path
 * @returns {Held | null} null when the file is not there or not a lock
 */
function read(path) {
	try {
		/** @type {Partial<Held> | null} */
		const found = JSON.parse(readFileSync(path, 'utf8'));
		if (typeof found?.holder?.pid !== 'number' || !Array.isArray(found.children)) return null;
		return { holder: found.holder, children: found.children, about: found.about ?? '' };
	} catch {
		return null;
	}
}

/**
 * @param {string} path
 * @param {Held} held
 */
function write(path, held) {
	writeFileSync(path, JSON.stringify(held), { mode: 0o600 });
}
