// The database that npm start serves from, for commands that work beside it: found, never started or changed.
import { addressesOf } from './cluster.mjs';
import { recall } from './cluster-memory.mjs';
import { Trouble } from './say.mjs';

/**
 * @param {import('./settings.mjs').Settings} settings
 * @returns {{ owner: string, web: string }} addresses, by role
 */
export function runningDatabase({ databaseUrl, databaseOwnerUrl, dataDir }) {
	if (databaseUrl !== null && databaseOwnerUrl !== null) return { owner: databaseOwnerUrl, web: databaseUrl };
	const memory = recall(dataDir);
	if (!memory?.made) {
		throw new Trouble(
			`There is no database in ${dataDir} yet.`,
			'Run npm start first; or, if it runs with a DATA_DIR or DATABASE_URL of its own, set the same here.'
		);
	}
	return addressesOf(memory, 'cogmark');
}

/**
 * What to do about a database that does not answer.
 * @param {import('./settings.mjs').Settings} settings
 */
export function howToReach({ databaseUrl, dataDir }) {
	return databaseUrl === null
		? `Start it with npm start (its data folder is ${dataDir}), leave that running, and try again.`
		: 'Start it, or check DATABASE_URL and DATABASE_OWNER_URL, and try again.';
}
