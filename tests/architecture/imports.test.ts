import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { breach, circles, featureBreaches, importsOf, modulesBelow } from './imports';

const SRC = join(import.meta.dirname, '../../src');
const imports = modulesBelow(SRC).flatMap((file) => importsOf(file, SRC));

describe('the code as it stands', () => {
	it('is read at all', () => {
		expect(imports.length).toBeGreaterThan(200);
	});

	it('keeps to the import table', () => {
		expect(imports.map(breach).filter((text) => text !== null)).toEqual([]);
	});

	it('lets a feature know at most one other', () => {
		expect(featureBreaches(imports)).toEqual([]);
	});

	it('has no circles', () => {
		expect(circles(imports)).toEqual([]);
	});
});

/** Each forbidden thing, planted in a tree of its own, must be found: a table that finds nothing proves nothing. */
describe('planted breaches', () => {
	let src = '';
	beforeEach(() => (src = mkdtempSync(join(tmpdir(), 'rooms-'))));
	afterEach(() => rmSync(src, { recursive: true }));

	const plant = (files: Record<string, string>) => {
		for (const [path, text] of Object.entries(files)) {
			mkdirSync(join(src, path, '..'), { recursive: true });
			writeFileSync(join(src, path), text);
		}
		return modulesBelow(src).flatMap((file) => importsOf(file, src));
	};

	it.each<[string, string, string]>([
		['the core taking a package', 'lib/gear/a.ts', "import { z } from 'zod';"],
		['the core taking records', 'lib/gear/a.ts', "import { b } from '$lib/records/b';"],
		['records taking the tablet', 'lib/records/a.ts', "import { b } from '../tablet/store/b';"],
		['sync taking the store', 'lib/tablet/sync/a.ts', "import type { b } from '../store/b';"],
		[
			'a primitive taking words',
			'lib/ui/x/A.svelte',
			"<script>\n\timport { b } from '$lib/i18n/b';\n</script>"
		],
		['the server taking a feature', 'lib/server/a.ts', "import { b } from '$lib/features/y/b';"],
		['a feature taking the server', 'lib/features/x/a.ts', "import { b } from '$lib/server/b';"],
		[
			'a page taking the server',
			'routes/x/+page.svelte',
			"<script>\n\timport { b } from '$lib/server/b';\n</script>"
		],
		['the library taking a route', 'lib/features/x/a.ts', "export { b } from '../../../routes/b';"],
		['a lazy import of the server', 'lib/features/x/a.ts', "const b = await import('$lib/server/b');"]
	])('%s', (_what, path, text) => {
		const targets = ['records', 'tablet/store', 'i18n', 'features/y', 'server'].map(
			(room) => `lib/${room}/b.ts`
		);
		const files = Object.fromEntries(
			[...targets, 'routes/b.ts'].map((target) => [target, 'export const b = 1;'])
		);
		const found = plant({ ...files, [path]: text }).map(breach);
		expect(found.filter((reason) => reason?.startsWith(path))).toHaveLength(1);
	});

	it('allows a server file of a route to take the server', () => {
		const found = plant({
			'lib/server/b.ts': 'export const b = 1;',
			'routes/x/+page.server.ts': "import { b } from '$lib/server/b';"
		});
		expect(found.map(breach)).toEqual([null]);
	});

	it('finds a feature that knows two others, a leaf that knows one, and a circle', () => {
		const found = plant({
			'lib/features/x/a.ts': "import '../y/a';\nimport '../z/a';",
			'lib/features/y/a.ts': "import '../x/a';",
			'lib/features/z/a.ts': 'export {};',
			'lib/features/verdict/a.ts': "import '../z/a';"
		});
		expect(featureBreaches(found)).toHaveLength(2);
		expect(circles(found)).toHaveLength(1);
	});

	it('refuses an import that leads nowhere', () => {
		expect(() => plant({ 'lib/gear/a.ts': "import { b } from './b';" })).toThrow('does not exist');
	});
});
