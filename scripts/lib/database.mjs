// Brings a database to the state that the application expects: reachable, with its roles, migrated, and where
// wanted filled with the demonstration. Needs the installed packages: import it only after `ensureModules`.
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { drizzle } from 'drizzle-orm/postgres-js';
import { migrate } from 'drizzle-orm/postgres-js/migrator';
import postgres from 'postgres';
import { runnerImport } from 'vite';
import { ensureSettings } from './build.mjs';
import { joinGroup, makeOwnDatabase, makeOwnRoles } from './roles.mjs';
import { Trouble, note } from './say.mjs';
import { root } from './settings.mjs';

/** @typedef {{ email: string, password: string, role: string, plant: string }} SignIn */
/** @typedef {{ owner: string, web: string }} Addresses */

/** Any number, but always the same: two commands must not migrate one database at once. */
const migrationLock = 4280;

/**
 * @param {import('./cluster.mjs').Cluster} cluster
 * @param {string} name
 * @param {{ fresh: boolean }} options
 * @returns {Promise<Addresses>}
 */
export async function openOwnDatabase(cluster, name, options) {
	const { owner, web } = cluster.addresses(name);
	await connected(cluster.addresses('postgres').admin, async (admin) => {
		await makeOwnRoles(admin, cluster.passwords);
		await makeOwnDatabase(admin, name, options);
	});
	return { owner, web };
}

/**
 * @param {Addresses} addresses of a database that the operator gave
 */
export async function openGivenDatabase({ owner, web }) {
	await waitForDatabase(owner, owner === web ? 'DATABASE_URL' : 'DATABASE_OWNER_URL');
	await waitForDatabase(web, 'DATABASE_URL');
	const users = [await userOf(owner), await userOf(web)];
	await connected(owner, (sql) => joinGroup(sql, users));
}

/**
 * @param {Addresses} addresses
 */
export async function migrateDatabase({ owner }) {
	await connected(owner, async (sql) => {
		await sql`select pg_advisory_lock(${migrationLock})`;
		await migrate(drizzle(sql), { migrationsFolder: join(root, 'drizzle') });
	});
}

/**
 * Fills an empty database with the demonstration.
 * @param {Addresses} addresses
 * @returns {Promise<SignIn[]>} the demonstration's sign-ins; none when the database holds something else
 */
export async function seedDatabase({ owner }) {
	await ensureSettings();
	// The seed is the application's own TypeScript, so that it writes what the application would.
	/** @type {{ module: { seedDemo: (ownerUrl: string) => Promise<SignIn[]> } }} */
	const { module } = await runnerImport(join(root, 'src/lib/server/demo/seed.ts'), {
		configFile: false,
		root,
		logLevel: 'error',
		resolve: { alias: { $lib: join(root, 'src/lib') } }
	});
	return module.seedDemo(owner);
}

/**
 * Waits until the database lets this user in; a wrong password or a missing database is told at once.
 * @param {string} address
 * @param {string} variable
 */
async function waitForDatabase(address, variable) {
	const last = Date.now() + 20_000;
	// The address holds a password: only the harmless parts are repeated.
	const { hostname, port, pathname } = new URL(address);
	const where = `${hostname || 'localhost'}:${port || 5432}${pathname}`;
	for (let waited = false; ; waited = true) {
		try {
			await connected(address, (sql) => sql`select 1`);
			return;
		} catch (error) {
			const code = error instanceof Error && 'code' in error ? String(error.code) : '';
			const reason = error instanceof Error ? error.message || code : String(error);
			if (['28P01', '28000', '3D000', '42501'].includes(code) || Date.now() > last) {
				throw new Trouble(
					`The database at ${where} does not let the application in: ${reason}`,
					`Check ${variable}: host, port, user, password and the name of a database that exists.`
				);
			}
			if (!waited) note(`Waiting for the database at ${where} (${reason}) …`);
			await sleep(500);
		}
	}
}

/** @param {string} address */
function userOf(address) {
	return connected(address, async (sql) => {
		const [row] = await sql`select current_user as name`;
		return String(row?.['name']);
	});
}

/**
 * One connection for a piece of work, closed after it.
 * @template T
 * @param {string} address
 * @param {(sql: import('postgres').Sql) => Promise<T>} work
 */
async function connected(address, work) {
	const sql = postgres(address, { max: 1, connect_timeout: 5, onnotice: () => {} });
	try {
		return await work(sql);
	} finally {
		await sql.end({ timeout: 5 });
	}
}
