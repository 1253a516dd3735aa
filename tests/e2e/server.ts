/** The built application as a process of its own, which a test may stop and start again on the same address. */
import { spawn, type ChildProcess } from 'node:child_process';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';

const ROOT = join(import.meta.dirname, '../..');

export class Server {
	readonly origin: string;
	readonly #port: number;
	#child: ChildProcess | null = null;
	#output = '';

	private constructor(port: number) {
		this.#port = port;
		this.origin = `http://localhost:${port}`;
	}

	static async create(): Promise<Server> {
		return new Server(await freePort());
	}

	async start(): Promise<void> {
		const url = process.env.E2E_DATABASE_URL;
		if (!url) throw new Error('E2E_DATABASE_URL is missing: run the browser tests with `npm test -- e2e`.');
		const child = spawn(process.execPath, ['build/index.js'], {
			cwd: ROOT,
			env: {
				...process.env,
				DATABASE_URL: url,
				HOST: 'localhost',
				PORT: String(this.#port),
				ORIGIN: this.origin,
				COGMARK_SECRET: 'of the browser tests only, and long enough for a key',
				BODY_SIZE_LIMIT: '1M'
			},
			stdio: ['ignore', 'pipe', 'pipe']
		});
		this.#child = child;
		for (const stream of [child.stdout, child.stderr]) stream?.on('data', (data) => (this.#output += data));
		for (let tries = 0; tries < 200; tries++) {
			if (child.exitCode !== null) break;
			const answer = await fetch(`${this.origin}/health`).catch(() => null);
			if (answer?.ok) return;
			await sleep(100);
		}
		throw new Error(`The server did not become healthy.\n${this.#output.slice(-2000)}`);
	}

	/** Ends the process at once, as a power cut would. */
	async stop(): Promise<void> {
		const child = this.#child;
		if (!child || child.exitCode !== null) return;
		const ended = new Promise((resolve) => child.once('exit', resolve));
		child.kill('SIGKILL');
		await ended;
		this.#child = null;
	}

	get output(): string {
		return this.#output;
	}
}

function freePort(): Promise<number> {
	return new Promise((resolve, reject) => {
		const probe = createServer();
		probe.once('error', reject);
		probe.listen(0, 'localhost', () => {
			const address = probe.address();
			probe.close(() => (address && typeof address === 'object' ? resolve(address.port) : reject()));
		});
	});
}
