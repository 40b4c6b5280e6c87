import svelte from 'eslint-plugin-svelte';
import ts from 'typescript-eslint';
import { importsOneWay } from './houseRules.js';

export default ts.config(
	{
		ignores: ['node_modules', '.svelte-kit', 'build', '.data', 'test-results', 'playwright-report']
	},
	...ts.configs.recommended,
	...svelte.configs.recommended,
	{
		files: ['**/*.svelte', '**/*.svelte.ts'],
		languageOptions: { parserOptions: { parser: ts.parser } }
	},
	{
		plugins: { house: { rules: { 'imports-one-way': importsOneWay } } },
		rules: {
			'house/imports-one-way': 'error',
			'no-undef': 'off',
			'no-console': 'error',
			eqeqeq: ['error', 'smart'],
			'no-empty': 'error',
			'@typescript-eslint/no-explicit-any': 'error',
			'@typescript-eslint/no-non-null-assertion': 'error',
			'@typescript-eslint/no-unused-vars': [
				'error',
				{ argsIgnorePattern: '^_', varsIgnorePattern: '^_' }
			],
			// Links are made by $lib/links; the app is served from the root.
			'svelte/no-navigation-without-resolve': 'off'
		}
	},
	{ files: ['src/local/**', 'tests/**', '.config/**'], rules: { 'no-console': 'off' } }
);
