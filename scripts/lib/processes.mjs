// Running other programs, and telling a process that is still there from one whose number was given to another.
// Every program runs in a process group of its own: Ctrl-C reaches only this command, which then stops its
// programs in order, and ending a program ends what it started too.
import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { atEnd, stillRunning } from './lifetime.mjs';

/**
 * A process that can be recognised again: `mark` is its start time where the system tells it, else empty.
 * @typedef {{ pid: number, mark: string }} Known
 */

/**
 * @typedef {object} RunOptions
 * @property {string} [cwd]
 * @property {NodeJS.ProcessEnv} [env]
 * @property {number} [uid]
 * @property {number} [gid]
 * @property {boolean} [show] let its output through instead of keeping it
 * @property {boolean} [letFinish] at the end wait for it instead of stopping it (a package manager)
 * @property {(child: Known) => void} [started]
 */

/**
 * Runs a program to its end.
 * @param {string} command
 * @param {string[]} args
 * @param {RunOptions} [options]
 * @returns {Promise<{ code: number, output: string }>} code 1 also when a signal ended it or it could not be started
 */
export async function run(command, args, options = {}) {
	stillRunning();
	const child = spawn(command, args, {
		cwd: options.cwd,
		env: options.env ?? process.env,
		...(options.uid === undefined ? {} : { uid: options.uid, gid: options.gid }),
		detached: true,
		stdio: options.show ? ['ignore', 'inherit', 'inherit'] : ['ignore', 'pipe', 'pipe']
	});
	let output = '';
	child.stdout?.setEncoding('utf8').on('data', (text) => (output += text));
	child.stderr?.setEncoding('utf8').on('data', (text) => (output += text));
	/** @type {Promise<number>} */
	const finished = new Promise((resolve) => {
		child.once('error', (error) => {
			output += error.message;
			resolve(1);
		});
		child.once('close', (code) => resolve(code ?? 1));
	});
	if (child.pid === undefined) return { code: await finished, output };
	const known = know(child.pid);
	options.started?.(known);
	const forget = atEnd(async () => {
		if (!options.letFinish) await stop(known, 'SIGTERM', 10_000);
		await finished;
	});
	const code = await finished;
	forget();
	// A command that is being ended must not read the end of its program as an answer.
	stillRunning();
	return { code, output };
}

/**
 * @param {number} pid
 * @returns {Known}
 */
export function know(pid) {
	return { pid, mark: markOf(pid) ?? '' };
}

/**
 * True while the very process that was known is running.
 * @param {Known} known
 */
export function isRunning(known) {
	const mark = markOf(known.pid);
	return mark !== null && mark === known.mark;
}

/**
 * Ends a process and its group: the given signal first, SIGKILL when that is not heeded in time.
 * @param {Known} known
 * @param {NodeJS.Signals} signal
 * @param {number} patience in milliseconds
 */
export async function stop(known, signal, patience) {
	for (const [sent, wait] of /** @type {[NodeJS.Signals, number][]} */ ([
		[signal, patience],
		['SIGKILL', 2000]
	])) {
		if (!isRunning(known)) return;
		send(known.pid, sent);
		const last = Date.now() + wait;
		while (isRunning(known) && Date.now() < last) await sleep(30);
	}
}

/**
 * @param {number} pid leader of its process group
 * @param {NodeJS.Signals} signal
 */
function send(pid, signal) {
	try {
		process.kill(-pid, signal);
	} catch {
		// Gone between the look and the signal: that is what was wanted.
	}
}

/**
 * When a process started, as text to compare; null when no such process runs.
 * @param {number} pid
 */
function markOf(pid) {
	try {
		process.kill(pid, 0);
	} catch (error) {
		// EPERM: it runs, but as another user.
		if (!(error instanceof Error && 'code' in error && error.code === 'EPERM')) return null;
	}
	if (process.platform !== 'linux') return '';
	try {
		const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
		// The second field is the program's name in brackets and may hold spaces: count from behind it.
		const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
		const dead = fields[0] === 'Z' || fields[0] === 'X';
		// Start times count from the machine's boot, so the boot belongs to the mark.
		return dead ? null : `${readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim()} ${fields[19]}`;
	} catch {
		return null;
	}
}
