// When packages are installed and the application is built again, on real files.
import { mkdirSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { expect, test } from 'vitest';
import { buildIsStale } from '../../../scripts/lib/build.mjs';
import { modulesAreStale } from '../../../scripts/lib/modules.mjs';
import { testFolder } from './folder';

/** A file last changed at the given minute of an hour long past; its folder too, as when both came with a clone. */
function put(folder: string, name: string, minute: number): void {
	const path = join(folder, name);
	mkdirSync(dirname(path), { recursive: true });
	writeFileSync(path, name);
	touch(path, minute);
	touch(dirname(path), minute);
}

function touch(path: string, minute: number): void {
	const time = new Date(Date.UTC(2024, 0, 1, 12, minute));
	utimesSync(path, time, time);
}

test('packages are installed when missing, broken off, or older than the lock', () => {
	const folder = testFolder();
	put(folder, 'package-lock.json', 10);
	expect(modulesAreStale(folder)).toBe(true);
	put(folder, 'node_modules/some/package.json', 20);
	expect(modulesAreStale(folder)).toBe(true);
	put(folder, 'node_modules/.package-lock.json', 20);
	expect(modulesAreStale(folder)).toBe(false);
	touch(join(folder, 'package-lock.json'), 30);
	expect(modulesAreStale(folder)).toBe(true);
});

function builtCheckout(): string {
	const folder = testFolder();
	for (const name of ['src/lib/gear/rack.ts', 'static/icon.svg', 'package-lock.json', 'vite.config.ts']) {
		put(folder, name, 10);
	}
	touch(join(folder, 'src/lib'), 10);
	touch(join(folder, 'src'), 10);
	put(folder, 'build/index.js', 25);
	put(folder, 'build/complete.txt', 20);
	return folder;
}

test('a complete build that is newer than its sources is kept', () => {
	expect(buildIsStale(builtCheckout())).toBe(false);
});

test('a build that was broken off is made again', () => {
	const folder = builtCheckout();
	rmSync(join(folder, 'build/complete.txt'));
	expect(buildIsStale(folder)).toBe(true);
});

test.each(['src/lib/gear/rack.ts', 'static/icon.svg', 'package-lock.json', 'vite.config.ts'])(
	'a change of %s makes the build stale',
	(name) => {
		const folder = builtCheckout();
		// Changed after the build began, although before it ended.
		put(folder, name, 22);
		expect(buildIsStale(folder)).toBe(true);
	}
);

test('a source file taken away makes the build stale', () => {
	const folder = builtCheckout();
	rmSync(join(folder, 'src/lib/gear/rack.ts'));
	expect(buildIsStale(folder)).toBe(true);
});

test('a change outside the sources does not', () => {
	const folder = builtCheckout();
	put(folder, 'tests/unit/rack.test.ts', 40);
	put(folder, 'README.md', 40);
	expect(buildIsStale(folder)).toBe(false);
});
