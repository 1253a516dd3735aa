// npm run -s recompute: what the core of this version makes of the checks that another one computed, for an operator
// after an update. Reads the database that npm start serves from; what it prints is in scripts/lib/recompute-cli.ts.
import { join } from 'node:path';
import { howToReach, runningDatabase } from './lib/running-database.mjs';
import { Trouble, report } from './lib/say.mjs';
import { readSettings, root } from './lib/settings.mjs';

/** @typedef {typeof import('./lib/recompute-cli.ts')} Commands */

const USAGE = `Usage: npm run -s recompute [-- --json]

  Answers every check that another version of the core computed once more, from what was stored with it, in all
  plants. Prints one line for each whose verdict or bending margin is another now, and a summary. Changes nothing.

  --json   prints JSON lines, the summary last

It reads DATA_DIR, DATABASE_URL and DATABASE_OWNER_URL as npm start does, and the database must be running.
Exit code 0: done. 1: the database could not be read. 2: bad command.
`;

class ReaderGone extends Error {}
// Told by the write itself; without a listener the same error would end the process.
process.stdout.on('error', () => {});

const args = process.argv.slice(2);
const help = args.includes('--help') || args.includes('-h');
const unknown = args.filter((word) => word !== '--json');
if (help) process.stderr.write(USAGE);
else if (unknown.length > 0) {
	process.stderr.write(`Unknown: ${unknown.join(' ')}\n\n${USAGE}`);
	process.exitCode = 2;
} else {
	// The exit code is set, not forced: a long answer into a pipe is written out first.
	process.exitCode = await run({ json: args.includes('--json') }).catch((error) => {
		report(error);
		return 1;
	});
}

/** @param {{ json: boolean }} options */
async function run({ json }) {
	const settings = readSettings(process.env);
	const addresses = runningDatabase(settings);
	const { recompute, whyUnread } = await loadCommands();
	try {
		const { plants } = await recompute(addresses, { json, print });
		if (plants === 0) {
			process.stderr.write(
				'No plant is to be seen. If there are plants, DATABASE_OWNER_URL must name the user that npm start migrates with.\n'
			);
		}
		return 0;
	} catch (error) {
		// A reader that has read enough, such as head, is no failure.
		if (error instanceof ReaderGone) return 0;
		const why = whyUnread(error);
		if (why === null) throw error;
		const [problem, remedy] = {
			'no-answer': ['The database does not answer.', howToReach(settings)],
			'not-let-in': ['The database does not let this command in.', howToReach(settings)],
			'not-set-up': [
				'The database is not that of this version.',
				'Run npm start once: it brings it up to date.'
			]
		}[why];
		throw new Trouble(String(problem), String(remedy), rootMessage(error));
	}
}

/** @returns {Promise<Commands>} the application's own TypeScript, so that it answers as the server does */
async function loadCommands() {
	const { runnerImport } = await import('vite').catch((error) => {
		if (error?.code !== 'ERR_MODULE_NOT_FOUND') throw error;
		throw new Trouble('The modules are not installed yet.', 'Run npm ci (or npm start) first.');
	});
	/** @type {{ module: Commands }} */
	const { module } = await runnerImport(join(root, 'scripts/lib/recompute-cli.ts'), {
		root,
		configFile: false,
		logLevel: 'error',
		resolve: { alias: { $lib: join(root, 'src/lib') } }
	});
	return module;
}

/**
 * Waits until the line has gone out, so that a slow reader slows the reading of the database too.
 * @param {string} line
 * @returns {Promise<void>}
 */
function print(line) {
	return new Promise((resolve, reject) => {
		process.stdout.write(`${line}\n`, (error) => (error ? reject(new ReaderGone()) : resolve()));
	});
}

/**
 * What the database or the connection itself said; the error around it repeats the whole query.
 * @param {unknown} error
 * @returns {string}
 */
function rootMessage(error) {
	if (!(error instanceof Error)) return String(error);
	return error.cause instanceof Error ? rootMessage(error.cause) : error.message;
}
