import js from '@eslint/js';
import angular from 'angular-eslint';
import prettier from 'eslint-config-prettier/flat';
import { defineConfig, globalIgnores } from 'eslint/config';
import globals from 'globals';
import tseslint from 'typescript-eslint';

/** The arrows of the architecture: src → shared ← server; shared imports generated types and itself, nothing else. */
const forbid = (...patterns) => ({
  '@typescript-eslint/no-restricted-imports': [
    'error',
    { patterns: patterns.map(p => ({ regex: p[0], message: p[1] })) },
  ],
});

const impure = name => ({
  name,
  message: 'shared/ is pure: no clock, no randomness, no host. Pass the value in.',
});

export default defineConfig(
  globalIgnores([
    'dist/',
    '.angular/',
    '.data/',
    'coverage/',
    'test-results/',
    'schemas/generated/',
    // AssemblyScript: its own compiler checks it.
    'wasm/',
    'node_modules/',
  ]),
  js.configs.recommended,
  {
    files: ['**/*.ts'],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: false }],
      '@typescript-eslint/require-await': 'off',
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true },
      ],
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      eqeqeq: ['error', 'always', { null: 'ignore' }],
    },
  },
  {
    files: ['**/*.mjs', '**/*.cjs'],
    languageOptions: { globals: globals.node },
    rules: {
      'no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true },
      ],
    },
  },
  {
    files: ['shared/**/*.ts'],
    rules: {
      ...forbid(
        [
          '^(node:|@angular|three|express|knex|pg|rxjs)',
          'shared/ is pure TypeScript: no framework, no Node.',
        ],
        ['(^|/)(src|server)/', 'shared/ never imports from the client or the server.'],
      ),
      'no-restricted-globals': [
        'error',
        ...['window', 'document', 'process', 'Date', 'performance', 'fetch', 'Buffer'].map(impure),
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'shared/ is pure: pass randomness in.' },
      ],
    },
  },
  {
    files: ['src/**/*.ts'],
    extends: [angular.configs.tsRecommended],
    processor: angular.processInlineTemplates,
    rules: {
      ...forbid(
        ['(^|/)server/', 'The client never imports from the server.'],
        ['^node:', 'No Node in the browser.'],
      ),
      // Angular's validators are static functions that are handed on.
      '@typescript-eslint/unbound-method': ['error', { ignoreStatic: true }],
      '@angular-eslint/component-selector': ['error', { type: 'element', prefix: 'fl', style: 'kebab-case' }],
      '@angular-eslint/directive-selector': [
        'error',
        { type: 'attribute', prefix: 'fl', style: 'camelCase' },
      ],
    },
  },
  {
    files: ['src/app/designer/state/**/*.ts'],
    rules: forbid(
      ['^@angular', 'Editor state knows no framework (STYLE: editor state).'],
      ['(^|/)server/', 'The client never imports from the server.'],
    ),
  },
  {
    files: ['src/**/*.html'],
    extends: [angular.configs.templateRecommended, angular.configs.templateAccessibility],
    rules: {
      '@angular-eslint/template/no-inline-styles': ['error', { allowNgStyle: true, allowBindToStyle: true }],
    },
  },
  {
    files: ['server/**/*.ts', 'migrations/**/*.ts', 'seeds/**/*.ts'],
    rules: forbid(['(^|/)src/', 'The server never imports from the client.']),
  },
  {
    files: ['test/**/*.ts', 'src/**/*.test.ts'],
    rules: {
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
      '@typescript-eslint/unbound-method': 'off',
    },
  },
  { files: ['**/*.cjs'], languageOptions: { sourceType: 'commonjs' } },
  prettier,
);
