// Where PostgreSQL's programs and Chromium are looked for, on real folders with real links.
import { chmodSync, mkdirSync, symlinkSync, writeFileSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { expect, test } from 'vitest';
import { findChromium } from '../../../scripts/lib/chromium.mjs';
import { postgresFolders } from '../../../scripts/lib/postgres-binaries.mjs';
import { testFolder } from './folder';

function programs(folder: string, names = ['initdb', 'postgres', 'pg_ctl']): string {
	mkdirSync(folder, { recursive: true });
	for (const name of names) writeFileSync(join(folder, name), '#!/bin/sh\n', { mode: 0o755 });
	return folder;
}

test("Debian's versions are taken from the highest down, as numbers", () => {
	const versions = testFolder();
	for (const version of ['9.6', '15', '100', 'common']) programs(join(versions, version, 'bin'));
	expect(postgresFolders('', versions)).toEqual(
		['100', '15', '9.6'].map((version) => join(versions, version, 'bin'))
	);
});

test('the PATH comes first, and a link on it leads to the folder of all programs', () => {
	const folder = testFolder();
	const versions = join(folder, 'versions');
	const newer = programs(join(versions, '16/bin'));
	const linked = programs(join(folder, 'own/bin'));
	const path = join(folder, 'path');
	mkdirSync(path);
	symlinkSync(join(linked, 'pg_ctl'), join(path, 'pg_ctl'));
	expect(postgresFolders(path, versions)).toEqual([linked, newer]);
});

test('a folder without all programs, or with one that may not be run, is left out', () => {
	const folder = testFolder();
	programs(join(folder, '17/bin'), ['postgres', 'pg_ctl']);
	chmodSync(join(programs(join(folder, '16/bin')), 'initdb'), 0o644);
	const whole = programs(join(folder, '15/bin'));
	const path = [join(folder, '17/bin'), join(folder, 'nowhere')].join(delimiter);
	expect(postgresFolders(path, folder)).toEqual([whole]);
	expect(postgresFolders('', join(folder, 'nowhere'))).toEqual([]);
});

test('CHROMIUM names the browser, and a wrong one is told', () => {
	const folder = programs(testFolder(), ['chromium', 'browser']);
	expect(findChromium({ CHROMIUM: join(folder, 'browser'), PATH: folder })).toBe(join(folder, 'browser'));
	expect(findChromium({ PATH: folder })).toBe(join(folder, 'chromium'));
	expect(() => findChromium({ CHROMIUM: join(folder, 'nothing'), PATH: folder })).toThrow('CHROMIUM is');
});
