// Runs the application's server as a child: starts it, waits until it is healthy, stops it at the end.
import { spawn } from 'node:child_process';
import { closeSync, openSync, readFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { atEnd, stillRunning } from './lifetime.mjs';
import { know, stop } from './processes.mjs';
import { Trouble, lastLines, note } from './say.mjs';
import { root } from './settings.mjs';

/**
 * @typedef {object} Server
 * @property {Promise<string>} died settles with its last lines when it ends unasked
 */

/**
 * @param {object} options
 * @param {string} options.command
 * @param {string[]} options.args
 * @param {NodeJS.ProcessEnv} options.env
 * @param {string} options.logFile
 * @param {(child: import('./processes.mjs').Known) => void} options.started
 * @returns {Server}
 */
export function startServer({ command, args, env, logFile, started }) {
	stillRunning();
	// Straight into a file: the server must not fail for want of a reader when this command is killed.
	const log = openSync(logFile, 'w', 0o600);
	const child = spawn(command, args, { cwd: root, env, detached: true, stdio: ['ignore', log, log] });
	closeSync(log);
	/** @type {Promise<string>} */
	const died = new Promise((resolve) => {
		child.once('error', (error) => resolve(error.message));
		child.once('exit', () => resolve(lastLines(readFileSync(logFile, 'utf8'))));
	});
	if (child.pid !== undefined) {
		const known = know(child.pid);
		started(known);
		const forget = atEnd(async () => {
			note('Stopping the server.');
			await stop(known, 'SIGTERM', 10_000);
		});
		void died.then(forget);
	}
	return { died };
}

/**
 * Waits until the server says that it and its database are well.
 * @param {Server} server
 * @param {string} address
 */
export async function waitUntilHealthy(server, address) {
	const last = Date.now() + 60_000;
	let answer = 'no answer yet';
	/** @type {string | null} */
	let ended = null;
	void server.died.then((lines) => (ended = lines));
	while (Date.now() < last) {
		if (ended !== null) throw serverDied(ended);
		try {
			const response = await fetch(`${address}/health`, { signal: AbortSignal.timeout(5000) });
			if (response.ok) return;
			answer = `${response.status} ${(await response.text()).slice(0, 200)}`;
		} catch {
			// Not listening yet.
		}
		await sleep(100);
	}
	throw new Trouble(
		`The server does not become healthy: ${answer}`,
		`Look into its messages and start again.`
	);
}

/** @param {string} lines */
export function serverDied(lines) {
	return new Trouble('The server has ended by itself.', 'Its last lines stand above.', lines);
}

/**
 * Where this machine reaches a server that listens on the given address.
 * @param {string} host
 * @param {number} port
 */
export function localAddress(host, port) {
	const reached = host === '0.0.0.0' ? '127.0.0.1' : host === '::' ? '::1' : host;
	return `http://${reached.includes(':') ? `[${reached}]` : reached}:${port}`;
}
