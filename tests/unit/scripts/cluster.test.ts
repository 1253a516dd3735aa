// The life of the private PostgreSQL, with the real one: stopped with its command, and taken up again with its
// data after the command was killed.
import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { chmodSync, existsSync, rmSync, statSync } from 'node:fs';
import { join } from 'node:path';
import postgres from 'postgres';
import { expect, onTestFinished, test } from 'vitest';
import { outsidePlace } from '../../../scripts/lib/cluster-place.mjs';
import { testFolder } from './folder';

const script = (dataDir: string) => `
	import { startCluster } from ${JSON.stringify(new URL('../../../scripts/lib/cluster.mjs', import.meta.url).href)};
	import { live } from ${JSON.stringify(new URL('../../../scripts/lib/lifetime.mjs', import.meta.url).href)};
	await live(async () => {
		const cluster = await startCluster(${JSON.stringify(dataDir)}, { quick: true, started() {} });
		console.log('admin ' + cluster.addresses('postgres').admin);
		await cluster.died;
		return 1;
	}, { interrupted: 0 });
`;

interface Command {
	child: ChildProcess;
	admin: string;
	said: string;
}

async function start(dataDir: string): Promise<Command> {
	const child = spawn(process.execPath, ['--input-type=module', '--eval', script(dataDir)], {
		stdio: ['ignore', 'pipe', 'inherit']
	});
	let said = '';
	for await (const text of child.stdout!.iterator({ destroyOnReturn: false })) {
		said += String(text);
		const admin = said.match(/^admin (.*)$/m)?.[1];
		if (admin !== undefined) return { child, admin, said };
	}
	throw new Error(`The database did not start: ${said}`);
}

async function end({ child }: Command, signal: NodeJS.Signals): Promise<number | null> {
	const exit = once(child, 'exit');
	child.kill(signal);
	const [code] = await exit;
	return code;
}

async function ask(address: string, statement: string): Promise<Record<string, unknown>[]> {
	const sql = postgres(address, { max: 1, connect_timeout: 5 });
	try {
		return [...(await sql.unsafe(statement))];
	} finally {
		await sql.end();
	}
}

function dataFolder(): string {
	const folder = testFolder();
	// PostgreSQL runs as a user of its own where the tests run as root.
	chmodSync(folder, 0o711);
	onTestFinished(() => rmSync(outsidePlace(folder), { recursive: true, force: true }));
	return folder;
}

test(
	'the database ends with its command, and keeps its data when the command is killed',
	{ timeout: 60_000 },
	async () => {
		const dataDir = dataFolder();

		const first = await start(dataDir);
		await ask(first.admin, 'create table kept as select 14.5 as pressure_angle');
		expect(await end(first, 'SIGKILL')).toBe(null);
		// Killed without warning: its PostgreSQL is still there.
		expect(await ask(first.admin, 'select 1 as alive')).toEqual([{ alive: 1 }]);

		const second = await start(dataDir);
		expect(second.said).toContain('earlier, killed');
		expect(second.admin).toBe(first.admin);
		expect(await ask(second.admin, 'select pressure_angle from kept')).toEqual([{ pressure_angle: '14.5' }]);
		expect(await end(second, 'SIGTERM')).toBe(0);
		await expect(ask(second.admin, 'select 1')).rejects.toThrow('ECONNREFUSED');
		expect(existsSync(join(dataDir, 'postgres/postmaster.pid'))).toBe(false);
	}
);

test(
	'the database lets nobody in without its password, which only the owner may read',
	{ timeout: 60_000 },
	async () => {
		const dataDir = dataFolder();
		const command = await start(dataDir);
		const guess = new URL(command.admin);
		guess.password = 'guess';
		await expect(ask(guess.href, 'select 1')).rejects.toThrow('password authentication failed');
		expect(statSync(join(dataDir, 'database.json')).mode & 0o777).toBe(0o600);
		expect(await end(command, 'SIGINT')).toBe(0);
	}
);
