// The tests that a changed formula must fail, with the change of one file put in its place.
import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../..', import.meta.url));
const { MUTANT_FILE: file, MUTANT_SOURCE: source } = process.env;

export default {
	root,
	resolve: { alias: { $lib: `${root}src/lib` } },
	plugins: [
		{
			name: 'mutant',
			enforce: 'pre',
			/** @param {string} id */
			load: (id) => (file && source && id === file ? readFileSync(source, 'utf8') : undefined)
		}
	],
	test: {
		include: [
			'tests/reference/{velocity-laws,worked-examples,wear,measuring,mesh}.test.ts',
			'tests/unit/gear/{docstring-examples,member,pair*,verdict,capacity,working,wear}.test.ts'
		],
		environment: 'node',
		pool: 'threads',
		isolate: false,
		bail: 1,
		watch: false
	}
};
