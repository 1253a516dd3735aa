// The database's roles and databases: cogmark_owner owns and migrates; cogmark_web signs in for the served
// application and has only the rights that the migrations give to the group cogmark_app.
import { ownerRole, webRole } from './cluster.mjs';
import { Trouble } from './say.mjs';

/** @typedef {import('postgres').Sql} Sql */

/** The group that the migrations grant to. */
export const appRole = 'cogmark_app';

/**
 * Makes the roles of the private cluster and gives them their passwords.
 * @param {Sql} admin
 * @param {{ owner: string, web: string }} passwords hexadecimal digits, so that they may stand in quotes
 */
export async function makeOwnRoles(admin, passwords) {
	const found =
		await admin`select rolname from pg_roles where rolname in (${ownerRole}, ${webRole}, ${appRole})`;
	const missing = [ownerRole, webRole, appRole].filter(
		(name) => !found.some((row) => row['rolname'] === name)
	);
	for (const name of missing) await admin`create role ${admin(name)}`;
	// A role statement takes no parameters.
	await admin.unsafe(`alter role ${ownerRole} login password '${passwords.owner}'`);
	await admin.unsafe(`alter role ${webRole} login password '${passwords.web}'`);
	await admin`grant ${admin(appRole)} to ${admin(ownerRole)}, ${admin(webRole)}`;
}

/**
 * @param {Sql} admin
 * @param {string} name
 * @param {{ fresh: boolean }} options fresh: one of that name is removed first, with all that is in it
 */
export async function makeOwnDatabase(admin, name, { fresh }) {
	if (fresh) await admin`drop database if exists ${admin(name)} with (force)`;
	const [found] = await admin`select 1 from pg_database where datname = ${name}`;
	if (found === undefined) await admin`create database ${admin(name)} owner ${admin(ownerRole)}`;
}

/**
 * Sees to it that the group exists in a database that the operator gave, and that the users are in it.
 * @param {Sql} owner
 * @param {string[]} users
 */
export async function joinGroup(owner, users) {
	const [found] = await owner`select 1 from pg_roles where rolname = ${appRole}`;
	if (found === undefined) {
		await permitted(() => owner`create role ${owner(appRole)} nologin`, `CREATE ROLE ${appRole} NOLOGIN;`);
	}
	for (const user of new Set(users)) {
		const [row] = await owner`select pg_has_role(${user}, ${appRole}, 'member') as member`;
		if (row?.['member'] === true) continue;
		const quoted = `"${user.replaceAll('"', '""')}"`;
		await permitted(() => owner`grant ${owner(appRole)} to ${owner(user)}`, `GRANT ${appRole} TO ${quoted};`);
	}
}

/**
 * @param {() => Promise<unknown>} work
 * @param {string} statement what an administrator has to run instead
 */
async function permitted(work, statement) {
	try {
		await work();
	} catch (error) {
		if (!(error instanceof Error && 'code' in error && error.code === '42501')) throw error;
		throw new Trouble(
			'The owner of the database may not set up the roles that the application needs.',
			`Have an administrator of the database run this, then start again:  ${statement}`
		);
	}
}
