/**
 * The rooms of the code and what each may import: the twin of the table in DEVELOPERS.md. A room is a folder below
 * src; the first that a path begins with is its room.
 */

export interface Room {
	name: string;
	/** Path prefix below src. */
	at: string;
	/** Rooms that may be imported, besides the room itself. */
	rooms: string[];
	/** Packages, by name or by the prefix before a slash; `$app` and `$env` are kit's. */
	packages: string[];
}

export const ROOMS: Room[] = [
	{ name: 'gear', at: 'lib/gear/', rooms: [], packages: [] },
	{ name: 'records', at: 'lib/records/', rooms: ['gear'], packages: ['zod'] },
	{ name: 'tablet/store', at: 'lib/tablet/store/', rooms: ['records', 'gear'], packages: ['idb'] },
	{ name: 'tablet/sync', at: 'lib/tablet/sync/', rooms: ['records'], packages: ['zod'] },
	{
		name: 'tablet',
		at: 'lib/tablet/',
		rooms: ['tablet/store', 'tablet/sync', 'records', 'gear'],
		packages: ['zod']
	},
	{ name: 'ui', at: 'lib/ui/', rooms: [], packages: ['svelte'] },
	{ name: 'i18n', at: 'lib/i18n/', rooms: ['records', 'gear'], packages: ['svelte'] },
	{
		name: 'features',
		at: 'lib/features/',
		rooms: ['ui', 'records', 'gear', 'tablet', 'i18n'],
		packages: ['svelte', 'zod', '@cantoo/pdf-lib', '$app']
	},
	{
		name: 'server',
		at: 'lib/server/',
		rooms: ['records', 'gear', 'i18n/language'],
		packages: [
			'drizzle-orm',
			'postgres',
			'zod',
			'lucia',
			'@lucia-auth/adapter-drizzle',
			'@node-rs/argon2',
			'$env',
			'$app',
			'@sveltejs/kit',
			'node:'
		]
	},
	{
		name: 'server routes',
		at: 'routes/',
		rooms: ['features', 'ui', 'records', 'gear', 'i18n', 'tablet', 'server'],
		packages: ['svelte', '@sveltejs/kit', 'zod', '$app', '$env']
	},
	{
		name: 'routes',
		at: 'routes/',
		rooms: ['features', 'ui', 'records', 'gear', 'i18n', 'tablet'],
		packages: ['svelte', '@sveltejs/kit', 'zod', '$app']
	},
	{ name: 'params', at: 'params/', rooms: ['records', 'i18n'], packages: ['@sveltejs/kit'] },
	{ name: 'service worker', at: 'service-worker.ts', rooms: [], packages: ['workbox-'] },
	{
		name: 'hooks',
		at: 'hooks.server.ts',
		rooms: ['server', 'i18n', 'records'],
		packages: ['@sveltejs/kit', '$app', '$env', 'node:']
	},
	{
		name: 'types',
		at: 'app.d.ts',
		rooms: ['server', 'i18n', 'records'],
		packages: ['svelte', '@sveltejs/kit']
	}
];

/** A feature that any other may show: it imports no feature itself. */
export const LEAF_FEATURES = ['verdict'];
