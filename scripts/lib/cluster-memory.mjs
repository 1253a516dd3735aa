// What a data folder remembers of its private database: passwords, port, and where the files lie. No absolute
// path is kept, so that a checkout can be moved; where that is not possible it says so.
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { mustLieOutside, outsidePlace } from './cluster-place.mjs';
import { freePort } from './ports.mjs';
import { keep, newSecret, readKept } from './kept.mjs';
import { Trouble } from './say.mjs';

/**
 * @typedef {object} Memory
 * @property {boolean} made whether the files were once made completely
 * @property {boolean} outside whether they lie outside the data folder
 * @property {number} port
 * @property {{ admin: string, owner: string, web: string }} passwords
 */

/** @param {string} dataDir */
function fileOf(dataDir) {
	return join(dataDir, 'database.json');
}

/**
 * @param {string} dataDir
 * @returns {Memory | null} null before the first start
 */
export function recall(dataDir) {
	const text = readKept(fileOf(dataDir));
	/** @type {Memory | null} */
	const memory = text === null ? null : JSON.parse(text);
	if (memory === null && existsSync(join(dataDir, 'postgres'))) {
		throw new Trouble(
			`${join(dataDir, 'postgres')} holds a database, but ${fileOf(dataDir)} with its passwords is gone.`,
			'Put that file back, or set DATA_DIR to a new folder.'
		);
	}
	if (memory?.made && !existsSync(placeOf(dataDir, memory))) {
		throw new Trouble(
			`The database's files are not in ${placeOf(dataDir, memory)}, where ${fileOf(dataDir)} expects them.`,
			memory.outside
				? 'If this folder was moved, move the files there from their old folder beside that one. If it is a copy, or to begin anew, delete database.json.'
				: 'Put them back, or delete database.json to begin anew.'
		);
	}
	return memory;
}

/**
 * @param {string} dataDir
 * @returns {Promise<Memory>} for a first start
 */
export async function begin(dataDir) {
	const memory = {
		made: false,
		outside: mustLieOutside(dataDir),
		port: await freePort(),
		passwords: { admin: newSecret(), owner: newSecret(), web: newSecret() }
	};
	remember(dataDir, memory);
	return memory;
}

/**
 * @param {string} dataDir
 * @param {Memory} memory
 */
export function remember(dataDir, memory) {
	keep(fileOf(dataDir), JSON.stringify(memory));
}

/**
 * @param {string} dataDir
 * @param {Memory} memory
 */
export function placeOf(dataDir, memory) {
	return memory.outside ? outsidePlace(dataDir) : join(dataDir, 'postgres');
}
