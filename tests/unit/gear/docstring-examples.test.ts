/// <reference types="vite/client" />
/**
 * Every `@example call // answer` in a docstring of the core is run: the call with the core's own functions, the
 * answer to the digits that the docstring prints.
 */
import { describe, expect, test } from 'vitest';

const sources = import.meta.glob<string>('/src/lib/gear/**/*.ts', {
	query: '?raw',
	import: 'default',
	eager: true
});
const modules = import.meta.glob<Record<string, unknown>>('/src/lib/gear/**/*.ts', { eager: true });

const examples = Object.entries(sources).flatMap(([file, source]) =>
	[...source.matchAll(/@example (.+) \/\/ (\S+)$/gm)].map(([, call = '', answer = '']) => ({
		file,
		call,
		answer
	}))
);

describe('docstring examples', () => {
	test('there are some in each file with formulas', () => {
		const files = new Set(examples.map(({ file }) => file.split('/').at(-1)));
		for (const file of [
			'quantity.ts',
			'pitch.ts',
			'velocity.ts',
			'load.ts',
			'form-factor.ts',
			'bending.ts'
		]) {
			expect(files).toContain(file);
		}
	});

	test.each(examples)('$file: $call', ({ file, call, answer }) => {
		const exported = modules[file] ?? {};
		const run = new Function(...Object.keys(exported), `return ${call};`);
		const value: unknown = run(...Object.values(exported));
		if (typeof value === 'number') {
			const digits = answer.split('.')[1]?.length ?? 9;
			expect(Math.abs(value - Number(answer))).toBeLessThanOrEqual(0.51 * 10 ** -digits);
		} else {
			expect(value).toBe(answer);
		}
	});
});
