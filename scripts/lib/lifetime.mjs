// The life of one command: what it started is stopped in the reverse order, once, however the command ends
// (done, failed, Ctrl-C, SIGTERM, a closed terminal, or npm gone). Promises that `end` never leaves early.
import { report, step } from './say.mjs';

/** @typedef {() => void | Promise<void>} Closer */

/** @type {Closer[]} */
const closers = [];
/** @type {Promise<never> | null} */
let ending = null;

/** Thrown at the next step of a command that is already being ended; it is not a failure of its own. */
export class Ending extends Error {}

/** Refuses to start anything more once the end has begun. */
export function stillRunning() {
	if (ending !== null) throw new Ending('The command is ending.');
}

/**
 * Registers what is to be done at the end; the last registered is done first.
 * @param {Closer} closer
 * @returns {() => void} takes the registration back
 */
export function atEnd(closer) {
	stillRunning();
	closers.push(closer);
	return () => {
		const index = closers.indexOf(closer);
		if (index !== -1) closers.splice(index, 1);
	};
}

/**
 * Stops everything and leaves the process. A second call waits for the first.
 * @param {number} code exit code, raised to 1 if stopping itself fails
 * @returns {Promise<never>}
 */
export function end(code) {
	ending ??= closeAll(code);
	return ending;
}

/**
 * Runs a command's work to its end.
 * @param {() => Promise<number>} work gives the exit code
 * @param {{ interrupted: number }} options exit code after Ctrl-C or a signal
 */
export async function live(work, { interrupted }) {
	for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
		process.on(signal, () => interrupt(interrupted));
	}
	// A closed terminal or a reader that has gone must not keep what runs from being stopped.
	for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {});
	if (process.env['npm_lifecycle_event'] !== undefined) watchParent(interrupted);
	try {
		await end(await work());
	} catch (error) {
		if (ending === null) report(error);
		await end(1);
	}
}

/** @param {number} code */
function interrupt(code) {
	if (ending === null) step('\nStopping …');
	void end(code);
}

/**
 * A signal to npm does not reach the program that npm runs, so its absence is looked for.
 * @param {number} code
 */
function watchParent(code) {
	const parent = process.ppid;
	const timer = setInterval(() => {
		if (process.ppid === parent) return;
		clearInterval(timer);
		interrupt(code);
	}, 500);
	timer.unref();
}

/**
 * @param {number} code
 * @returns {Promise<never>}
 */
async function closeAll(code) {
	let result = code;
	// Give way once, so that `ending` is set before any closer runs.
	await Promise.resolve();
	for (let closer = closers.pop(); closer !== undefined; closer = closers.pop()) {
		try {
			await closer();
		} catch (error) {
			report(error);
			result = 1;
		}
	}
	process.exit(result);
}
