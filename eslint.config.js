import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import svelte from 'eslint-plugin-svelte';
import globals from 'globals';
import ts from 'typescript-eslint';
import svelteConfig from './svelte.config.js';

export default ts.config(
	{
		ignores: [
			'build',
			'build-*/',
			'.svelte-kit/',
			'data/',
			'test-results/',
			'playwright-report/',
			'tests/reference/',
			'lessons/**/*.svx'
		]
	},
	js.configs.recommended,
	...ts.configs.recommended,
	...svelte.configs.recommended,
	prettier,
	...svelte.configs.prettier,
	{
		languageOptions: {
			globals: { ...globals.browser, ...globals.node },
			parserOptions: {
				projectService: true,
				tsconfigRootDir: import.meta.dirname,
				extraFileExtensions: ['.svelte']
			}
		},
		rules: {
			// A promise that nobody waits for is a write that may be lost unseen.
			'@typescript-eslint/no-floating-promises': 'error',
			'@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: false }],
			'@typescript-eslint/no-explicit-any': 'error',
			'@typescript-eslint/consistent-type-imports': 'error',
			'@typescript-eslint/no-unused-vars': [
				'error',
				{ argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true }
			],
			// TypeScript sees undefined names better, types included.
			'no-undef': 'off',
			'no-console': 'off',
			eqeqeq: ['error', 'always', { null: 'ignore' }],
			// Links inside a school are plain addresses that carry the school; there is no base path.
			'svelte/no-navigation-without-resolve': 'off'
		}
	},
	{
		files: ['**/*.svelte', '**/*.svelte.ts', '**/*.svelte.js'],
		languageOptions: {
			parserOptions: { parser: ts.parser, svelteConfig }
		}
	},
	// Every kind of question is given the same props, whether it needs them or not.
	{ files: ['src/lib/ui/questions/**'], rules: { 'svelte/no-unused-props': 'off' } },
	{ files: ['**/*.d.ts'], rules: { '@typescript-eslint/no-unused-vars': 'off' } }
);
