import js from '@eslint/js';
import svelte from 'eslint-plugin-svelte';
import { defineConfig } from 'eslint/config';
import globals from 'globals';
import ts from 'typescript-eslint';
import svelteConfig from './svelte.config.js';

/**
 * Rules of the house that a linter can hold; the import order and the plan are held by test/architecture.
 *
 * @type {import('eslint').Linter.RulesRecord}
 */
const house = {
	'no-warning-comments': ['error', { terms: ['todo', 'fixme'], location: 'anywhere' }],
	'no-restricted-syntax': [
		'error',
		{ selector: 'ExportDefaultDeclaration', message: 'Named exports only (rule 23).' },
		{ selector: 'ExportSpecifier[exported.name="default"]', message: 'Named exports only (rule 23).' },
		{ selector: 'TSEnumDeclaration', message: 'A union of literals instead of an enum (rule 23).' },
		{ selector: 'ForInStatement', message: 'Object.entries: for-in also walks the prototype.' },
	],
	eqeqeq: 'error',
	'no-console': 'error',
	'no-eval': 'error',
	'prefer-const': 'error',
	'@typescript-eslint/switch-exhaustiveness-check': ['error', { considerDefaultExhaustiveForUnions: true }],
	'@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
	'@typescript-eslint/consistent-type-definitions': ['error', 'type'],
	'@typescript-eslint/consistent-indexed-object-style': 'off',
	'@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
	'@typescript-eslint/no-confusing-void-expression': [
		'error',
		{ ignoreArrowShorthand: true, ignoreVoidReturningFunctions: true },
	],
	'@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
};

export default defineConfig(
	{ ignores: ['build/', '.svelte-kit/', '.cache/', 'static/', 'data/'] },
	{ linterOptions: { reportUnusedDisableDirectives: 'error' } },
	js.configs.recommended,
	ts.configs.strictTypeChecked,
	ts.configs.stylisticTypeChecked,
	svelte.configs.recommended,
	{
		languageOptions: {
			globals: globals['shared-node-browser'],
			parserOptions: { projectService: true, extraFileExtensions: ['.svelte'] },
		},
		rules: house,
	},
	{
		files: ['**/*.svelte', '**/*.svelte.ts'],
		languageOptions: { globals: globals.browser, parserOptions: { parser: ts.parser, svelteConfig } },
		rules: {
			'svelte/no-at-html-tags': 'error',
			'svelte/require-each-key': 'error',
			'prefer-const': 'off',
			'svelte/prefer-const': 'error',
		},
	},
	{
		// Callbacks in a template have no types for the linter; svelte-check knows them and checks every one.
		files: ['**/*.svelte'],
		rules: {
			'@typescript-eslint/no-unsafe-argument': 'off',
			'@typescript-eslint/no-unsafe-assignment': 'off',
			'@typescript-eslint/no-unsafe-call': 'off',
			'@typescript-eslint/no-unsafe-member-access': 'off',
			'@typescript-eslint/no-unsafe-return': 'off',
			'@typescript-eslint/no-unnecessary-condition': 'off',
		},
	},
	{
		// Components know no routes: the address of a place is data, resolved where the route hands it in.
		files: ['src/lib/ui/**/*.svelte'],
		rules: { 'svelte/no-navigation-without-resolve': 'off' },
	},
	{
		// Programs of the terminal talk to it; plain JavaScript cannot say every type to the linter.
		files: ['**/*.mjs'],
		languageOptions: { globals: globals.node },
		rules: { 'no-console': 'off', '@typescript-eslint/no-unsafe-assignment': 'off' },
	},
	{
		// These tools, and the types of packages, demand a default export.
		files: ['*.config.js', '*.config.ts', '**/*.d.ts'],
		rules: { 'no-restricted-syntax': 'off' },
	},
	{
		files: ['test/**'],
		rules: { '@typescript-eslint/no-non-null-assertion': 'off' },
	},
);
