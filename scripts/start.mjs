// npm start: from a bare checkout to a page to work on. Sets up what is missing, serves, and stops all of it on
// Ctrl-C. `--dev` serves the sources with live reload instead of a build.
import { join } from 'node:path';
import { ensureBuild } from './lib/build.mjs';
import { startCluster } from './lib/cluster.mjs';
import { holdDataFolder } from './lib/hold.mjs';
import { keptSecret } from './lib/kept.mjs';
import { live, stillRunning } from './lib/lifetime.mjs';
import { ensureModules, localProgram, requireNode } from './lib/modules.mjs';
import { requireFreePort } from './lib/ports.mjs';
import { Trouble, note, report, step } from './lib/say.mjs';
import { localAddress, serverDied, startServer, waitUntilHealthy } from './lib/serve.mjs';
import { readSettings, root, version } from './lib/settings.mjs';

/** @typedef {import('./lib/settings.mjs').Settings} Settings */

const dev = process.argv.includes('--dev');

await live(start, { interrupted: 0 });

/** @returns {Promise<number>} exit code, when something ended that should have gone on */
async function start() {
	requireNode();
	const settings = readSettings(process.env);
	const adopt = await holdDataFolder(settings.dataDir, {
		about: `Cogmark on port ${settings.port}`,
		remedy: 'Use the one that runs, stop it first, or start a second one with another DATA_DIR and PORT.'
	});
	await requireFreePort(settings.port, settings.host);
	await ensureModules();
	const database = await openDatabase(settings, adopt);
	if (!dev) await ensureBuild();
	step('Starting the server …');
	const server = startServer({
		...(dev
			? { command: localProgram('vite'), args: viteArguments(settings) }
			: { command: process.execPath, args: [join(root, 'build/index.js')] }),
		env: serverEnvironment(settings, database.addresses.web),
		logFile: join(settings.dataDir, 'server.log'),
		started: adopt
	});
	await waitUntilHealthy(server, localAddress(settings.host, settings.port));
	announce(settings, database.signIns);
	const end = await Promise.race([server.died.then(serverDied), database.died.then(databaseDied)]);
	// On Ctrl-C they end as they should, which is no failure.
	stillRunning();
	report(end);
	return 1;
}

/**
 * The database of its own, or the one that the operator gave; migrated, and seeded where wanted.
 * @param {Settings} settings
 * @param {import('./lib/lock.mjs').Lock['adopt']} started
 */
async function openDatabase(settings, started) {
	const { databaseUrl, databaseOwnerUrl } = settings;
	const given = databaseUrl !== null && databaseOwnerUrl !== null;
	step(given ? 'Opening the database of DATABASE_URL …' : 'Starting the database …');
	const cluster = given ? null : await startCluster(settings.dataDir, { quick: false, started });
	const { migrateDatabase, openGivenDatabase, openOwnDatabase, seedDatabase } =
		await import('./lib/database.mjs');
	const addresses =
		cluster === null
			? { owner: String(databaseOwnerUrl), web: String(databaseUrl) }
			: await openOwnDatabase(cluster, 'cogmark', { fresh: false });
	if (cluster === null) await openGivenDatabase(addresses);
	await migrateDatabase(addresses);
	const signIns = settings.demo ? await seedDatabase(addresses) : [];
	/** @type {Promise<string>} */
	const died = cluster?.died ?? new Promise(() => {});
	return { addresses, signIns, died };
}

/** @param {string} lines */
function databaseDied(lines) {
	return new Trouble('The database has ended by itself.', 'The last lines of its log stand above.', lines);
}

/** @param {Settings} settings */
function viteArguments({ host, port }) {
	return ['dev', '--host', host, '--port', String(port), '--strictPort'];
}

/**
 * @param {Settings} settings
 * @param {string} databaseUrl
 * @returns {NodeJS.ProcessEnv}
 */
function serverEnvironment(settings, databaseUrl) {
	// The owner's address can change and remove everything: the served application never gets it.
	const env = { ...process.env };
	delete env['DATABASE_OWNER_URL'];
	return {
		BODY_SIZE_LIMIT: '1M',
		...env,
		NODE_ENV: dev ? 'development' : 'production',
		HOST: settings.host,
		PORT: String(settings.port),
		ORIGIN: settings.origin,
		DATABASE_URL: databaseUrl,
		COGMARK_SECRET: settings.secret ?? keptSecret(join(settings.dataDir, 'secret')),
		COGMARK_VERSION: version()
	};
}

/**
 * @param {Settings} settings
 * @param {import('./lib/database.mjs').SignIn[]} signIns
 */
function announce(settings, signIns) {
	step(`\nCogmark ${version()} runs at ${settings.origin}`);
	if (signIns.length > 0) {
		step(
			'\nThe database holds the demonstration: its plants, people and figures are all invented. Sign in as'
		);
		const width = Math.max(...signIns.map(({ email }) => email.length));
		for (const { email, password, role, plant } of signIns) {
			note(`${email.padEnd(width)}  ${password}  (${role}, ${plant})`);
		}
	}
	step(`\nThe server's messages are in ${join(settings.dataDir, 'server.log')}. Ctrl-C stops everything.`);
}
