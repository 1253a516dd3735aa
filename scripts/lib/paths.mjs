// Looking for programs in the folders of the PATH.
import { accessSync, constants, statSync } from 'node:fs';
import { delimiter, isAbsolute, join } from 'node:path';

/**
 * @param {string} name
 * @param {string} [path] folders as the PATH variable lists them
 * @returns {string | null} the first program of that name, not resolved if it is a link
 */
export function programOnPath(name, path = process.env['PATH'] ?? '') {
	return (
		path
			.split(delimiter)
			.filter(isAbsolute)
			.map((folder) => join(folder, name))
			.find(isProgram) ?? null
	);
}

/** @param {string} path */
export function isProgram(path) {
	try {
		accessSync(path, constants.X_OK);
		return statSync(path).isFile();
	} catch {
		return false;
	}
}
