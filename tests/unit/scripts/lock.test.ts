// The lock of a data folder, with real processes: who holds it, who is refused, what is left after a kill.
import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { existsSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, onTestFinished, test } from 'vitest';
import { takeLock, type Held, type Lock } from '../../../scripts/lib/lock.mjs';
import { isRunning, know, stop } from '../../../scripts/lib/processes.mjs';
import { testFolder } from './folder';

const lockModule = new URL('../../../scripts/lib/lock.mjs', import.meta.url).href;
const processesModule = new URL('../../../scripts/lib/processes.mjs', import.meta.url).href;

/** Runs a script as another process and waits for the first thing that it prints. */
async function other(script: string): Promise<{ child: ChildProcess; said: string }> {
	const child = spawn(process.execPath, ['--input-type=module', '--eval', script], {
		stdio: ['ignore', 'pipe', 'inherit']
	});
	onTestFinished(() => void child.kill('SIGKILL'));
	const [said] = await once(child.stdout!, 'data');
	return { child, said: String(said).trim() };
}

function holding(path: string, before = ''): string {
	return `
		import { spawn } from 'node:child_process';
		import { takeLock } from ${JSON.stringify(lockModule)};
		import { know } from ${JSON.stringify(processesModule)};
		const lock = takeLock(${JSON.stringify(path)}, 'the other');
		${before}
		console.log('release' in lock ? 'taken' : 'refused');
		setInterval(() => {}, 1000);
	`;
}

function taken(result: Lock | Held): Lock {
	if (!('release' in result)) throw new Error(`refused: held by process ${result.holder.pid}`);
	return result;
}

async function kill(child: ChildProcess): Promise<void> {
	const gone = once(child, 'exit');
	child.kill('SIGKILL');
	await gone;
}

test('a lock held by a living process is refused, with its words and number', async () => {
	const path = join(testFolder(), 'lock');
	const { child, said } = await other(holding(path));
	expect(said).toBe('taken');
	const result = takeLock(path, 'this one');
	expect(result).not.toHaveProperty('release');
	expect(result).toMatchObject({ about: 'the other', holder: { pid: child.pid } });
});

test('the lock of a killed process is taken, and the program that it left running is named', async () => {
	const path = join(testFolder(), 'lock');
	const { child, said } = await other(
		holding(
			path,
			`
			const left = spawn(process.execPath, ['-e', 'setInterval(() => {}, 1000)'], { detached: true, stdio: 'ignore' });
			lock.adopt(know(left.pid));
			`
		)
	);
	expect(said).toBe('taken');
	await kill(child);
	const lock = taken(takeLock(path, 'this one'));
	expect(lock.leftovers).toHaveLength(1);
	const [leftover] = lock.leftovers;
	expect(isRunning(leftover!)).toBe(true);
	await stop(leftover!, 'SIGTERM', 5000);
	expect(isRunning(leftover!)).toBe(false);
});

test('a process number that was given to another program does not hold the lock', () => {
	const path = join(testFolder(), 'lock');
	// This process runs, but it is not the one that wrote the file.
	const holder = { ...know(process.pid), mark: 'an earlier boot 1' };
	writeFileSync(path, JSON.stringify({ holder, children: [holder], about: 'long gone' }));
	expect(taken(takeLock(path, 'this one')).leftovers).toEqual([]);
});

test('a file that is no lock does not hold it', () => {
	const path = join(testFolder(), 'lock');
	for (const text of ['', 'null', '{"holder":', '{"holder":{}}']) {
		writeFileSync(path, text);
		taken(takeLock(path, 'this one')).release();
	}
});

test('a released lock is free, and its folder is made when missing', () => {
	const path = join(testFolder(), 'new', 'lock');
	taken(takeLock(path, 'first')).release();
	expect(existsSync(path)).toBe(false);
	taken(takeLock(path, 'second'));
	expect(takeLock(path, 'third')).toMatchObject({ about: 'second' });
});

test('of several that find a dead lock at the same moment, one takes it', async () => {
	const path = join(testFolder(), 'lock');
	const { child } = await other(holding(path));
	await kill(child);
	const answers = await Promise.all(Array.from({ length: 5 }, () => other(holding(path))));
	expect(answers.map(({ said }) => said).sort()).toEqual([
		'refused',
		'refused',
		'refused',
		'refused',
		'taken'
	]);
});
