// ESLint for the whole tree: the recommended rules of JavaScript, TypeScript and Svelte, few of our own.
import js from '@eslint/js';
import globals from 'globals';
import svelte from 'eslint-plugin-svelte';
import ts from 'typescript-eslint';
import svelteConfig from '../svelte.config.js';

export default ts.config(
	{ ignores: ['node_modules/', '.svelte-kit/', 'build/', '.data*/', 'drizzle/', 'test-results/'] },
	js.configs.recommended,
	...ts.configs.recommended,
	...svelte.configs.recommended,
	{
		languageOptions: { globals: { ...globals.browser, ...globals.node } },
		rules: {
			// TypeScript knows undefined names better than the linter does.
			'no-undef': 'off',
			'@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
			// Dates here are moments that are read, never state that is changed in place.
			'svelte/prefer-svelte-reactivity': 'off',
			// Paths are plain strings here; the application is served from the root only.
			'svelte/no-navigation-without-resolve': 'off',
			'no-restricted-syntax': [
				'error',
				{ selector: 'TSEnumDeclaration', message: 'Use a union of string literals.' }
			]
		}
	},
	{
		files: ['**/*.svelte', '**/*.svelte.ts'],
		languageOptions: {
			parserOptions: { extraFileExtensions: ['.svelte'], parser: ts.parser, svelteConfig }
		}
	}
);
