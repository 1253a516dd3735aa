/**
 * The only file that reads the server's environment. Everything else is handed what it needs, so that the
 * seed, the scripts and the tests can use it without SvelteKit. Nothing is opened while building.
 */
import { randomBytes } from 'node:crypto';
import { building } from '$app/environment';
import { env } from '$env/dynamic/private';
import { version as packageVersion } from '../../../package.json';
import { connect, type Database } from './db/client';

let opened: Database | null = null;

export function database(): Database {
	if (building) throw new Error('No database is opened while building.');
	if (opened) return opened;
	const url = env['DATABASE_URL'];
	if (!url) throw new Error('DATABASE_URL is not set: give the address of the PostgreSQL database.');
	opened = connect(url);
	return opened;
}

let secretOfThisProcess: string | null = null;

/** The key that signs pull cursors. */
export function secret(): string {
	const given = env['COGMARK_SECRET'];
	if (given && given.length >= 32) return given;
	if (!secretOfThisProcess) {
		// Without a lasting secret the server still works: after a restart each tablet fetches its mirror anew.
		secretOfThisProcess = randomBytes(32).toString('hex');
		console.warn(
			'COGMARK_SECRET is not set (at least 32 characters): tablets will rebuild after each restart.'
		);
	}
	return secretOfThisProcess;
}

export function version(): string {
	return env['COGMARK_VERSION'] || packageVersion;
}

/** Whether people reach the server over HTTPS: then cookies travel over HTTPS only. */
export function overHttps(): boolean {
	return env['ORIGIN']?.startsWith('https:') ?? false;
}
