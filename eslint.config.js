import svelte from 'eslint-plugin-svelte';
import globals from 'globals';
import ts from 'typescript-eslint';
import svelteConfig from './svelte.config.js';

const domainOnly = {
	patterns: [
		{
			regex: '^(?!\\.{1,2}/|zod$)',
			message: 'The domain imports only itself and zod.'
		},
		{
			group: ['**/server/**', '**/components/**', '**/schemas/**'],
			message: 'The domain imports only itself.'
		}
	]
};

export default ts.config(
	{ ignores: ['build/', '.svelte-kit/', 'drizzle/', 'node_modules/', 'data/', 'test-results/'] },
	...ts.configs.recommended,
	...svelte.configs.recommended,
	{
		languageOptions: { globals: { ...globals.browser, ...globals.node } },
		rules: {
			'@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
			'@typescript-eslint/consistent-type-imports': ['error', { prefer: 'type-imports' }],
			'no-console': ['error', { allow: ['warn', 'error'] }],
			eqeqeq: 'error',
			'svelte/no-navigation-without-resolve': 'off'
		}
	},
	{
		files: ['**/*.svelte', '**/*.svelte.ts'],
		languageOptions: { parserOptions: { parser: ts.parser, svelteConfig } }
	},
	{
		files: ['src/lib/domain/**/*.ts'],
		ignores: ['**/*.test.ts'],
		rules: {
			'no-restricted-imports': ['error', domainOnly],
			'no-restricted-globals': [
				'error',
				'process',
				'window',
				'document',
				'fetch',
				'setTimeout',
				'performance',
				'crypto'
			],
			'no-restricted-properties': [
				'error',
				{ object: 'Math', property: 'random', message: 'The domain takes a seed.' },
				{ object: 'Date', property: 'now', message: 'The domain is told the date.' }
			]
		}
	},
	{ files: ['seeds/**', 'tests/**'], rules: { 'no-console': 'off' } }
);
