// Keeps commands out of each other's way: a data folder is for one command alone, and in a checkout only one
// installs packages or builds at a time. Ends what a killed predecessor left running.
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { atEnd, stillRunning } from './lifetime.mjs';
import { takeLock } from './lock.mjs';
import { stop } from './processes.mjs';
import { Trouble, note } from './say.mjs';
import { root } from './settings.mjs';

/** @typedef {import('./lock.mjs').Lock} Lock */

/**
 * Takes a data folder until the end of this command.
 * @param {string} dataDir
 * @param {{ about: string, remedy: string }} words what this command is, and what to do if it already runs
 * @returns {Promise<Lock['adopt']>} writes a started program down
 */
export async function holdDataFolder(dataDir, { about, remedy }) {
	const lock = takeLock(join(dataDir, 'lock'), about);
	if (!('release' in lock)) {
		throw new Trouble(`${lock.about} already uses ${dataDir} (process ${lock.holder.pid}).`, remedy);
	}
	atEnd(lock.release);
	await endLeftovers(lock);
	return lock.adopt;
}

/**
 * Does a piece of work that changes the checkout's node_modules or build, after any other command's.
 * @param {string} about
 * @param {(started: Lock['adopt']) => Promise<void>} work looks for itself whether it is still needed
 */
export async function aloneInCheckout(about, work) {
	const path = join(root, '.data-checkout/lock');
	let lock = takeLock(path, about);
	if (!('release' in lock)) note(`Waiting for another command: ${lock.about} …`);
	while (!('release' in lock)) {
		stillRunning();
		await sleep(200);
		lock = takeLock(path, about);
	}
	const forget = atEnd(lock.release);
	try {
		await endLeftovers(lock);
		await work(lock.adopt);
	} finally {
		forget();
		lock.release();
	}
}

/** @param {Lock} lock */
async function endLeftovers({ leftovers }) {
	for (const leftover of leftovers) {
		note(`Stopping process ${leftover.pid}, which an earlier, killed command left running.`);
		await stop(leftover, 'SIGTERM', 5000);
	}
}
