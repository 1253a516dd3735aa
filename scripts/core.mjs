// The calculation core from a shell: `npm run -s core -- evaluate < check.json`. Node 20 runs no TypeScript, so
// Vite loads the very modules that the tablet and the server use; what they answer is in scripts/lib/core-cli.ts.
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('..', import.meta.url));

async function readStandardInput() {
	const parts = [];
	for await (const part of process.stdin) parts.push(part);
	return Buffer.concat(parts).toString('utf8');
}

async function loadCommands() {
	const { runnerImport } = await import('vite').catch((error) => {
		if (error?.code !== 'ERR_MODULE_NOT_FOUND') throw error;
		process.stderr.write('The modules are not installed yet: run npm ci (or npm start) first.\n');
		process.exit(1);
	});
	const { module } = await runnerImport(`${root}scripts/lib/core-cli.ts`, {
		root,
		configFile: false,
		logLevel: 'error',
		resolve: { alias: { $lib: `${root}src/lib` } }
	});
	return module;
}

const { runCore } = await loadCommands();
const { stdout, stderr, exitCode } = await runCore(process.argv.slice(2), readStandardInput);
// The exit code is set, not forced: a long answer into a pipe is written out first.
process.exitCode = exitCode;
process.stderr.write(stderr);
process.stdout.write(stdout);
