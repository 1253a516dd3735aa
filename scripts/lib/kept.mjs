// Small files in the data folder that only their owner may read: passwords, the port in use, the secret of the
// sign-in cookies. Written whole or not at all.
import { randomBytes } from 'node:crypto';
import { mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';

/** @returns {string} 32 random bytes, in hexadecimal digits: safe in an address and in a quoted SQL text */
export function newSecret() {
	return randomBytes(32).toString('hex');
}

/**
 * @param {string} path
 * @returns {string | null} null when there is no such file
 */
export function readKept(path) {
	try {
		return readFileSync(path, 'utf8');
	} catch (error) {
		if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return null;
		throw error;
	}
}

/**
 * @param {string} path
 * @param {string} text
 */
export function keep(path, text) {
	mkdirSync(dirname(path), { recursive: true, mode: 0o711 });
	const draft = `${path}.${process.pid}`;
	writeFileSync(draft, text, { mode: 0o600, flush: true });
	renameSync(draft, path);
}

/**
 * The secret in a file, made at the first call.
 * @param {string} path
 */
export function keptSecret(path) {
	const found = readKept(path)?.trim();
	if (found !== undefined && found !== '') return found;
	const secret = newSecret();
	keep(path, `${secret}\n`);
	return secret;
}
