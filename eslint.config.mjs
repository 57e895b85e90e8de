import angular from 'angular-eslint';
import { defineConfig, globalIgnores } from 'eslint/config';
import tseslint from 'typescript-eslint';

/** What must never appear anywhere: ways around the type system, raw SQL from text, HTML from text. */
const ban = (selector, message) => ({ selector, message });
const everywhere = [
  ban(
    "CallExpression[callee.object.name='sql'][callee.property.name='raw']",
    'Text must never become SQL; use the query builder or sql`…${value}…`.',
  ),
  ban(
    'MemberExpression[property.name=/^(innerHTML|outerHTML|bypassSecurityTrust.*)$/]',
    'Text is shown as text only.',
  ),
  ban("CallExpression[callee.name='eval']", 'Never evaluate text.'),
  ban(
    "ImportDeclaration[source.value='zod'][importKind='value'] > ImportSpecifier[imported.name='z']",
    "Write import * as z from 'zod': the browser bundle then drops what is not used (33 kB instead of 98).",
  ),
];

export default defineConfig(
  globalIgnores(['dist', '.angular', 'node_modules', 'coverage', 'tmp', '.data']),
  {
    files: ['**/*.ts'],
    extends: [tseslint.configs.strict, tseslint.configs.stylistic],
    rules: {
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_' },
      ],
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/consistent-type-definitions': 'off',
      '@typescript-eslint/no-extraneous-class': [
        'error',
        { allowWithDecorator: true, allowConstructorOnly: true },
      ],
      'no-control-regex': 'error',
      'no-console': 'error',
      eqeqeq: 'error',
      'no-restricted-syntax': ['error', ...everywhere],
    },
  },
  {
    // an unawaited write could be lost without a word
    files: ['apps/api/src/**/*.ts', 'seeds/**/*.ts', 'db/**/*.ts'],
    languageOptions: {
      parserOptions: { project: ['apps/api/tsconfig.json'], tsconfigRootDir: import.meta.dirname },
    },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: false }],
    },
  },
  {
    // pure rooms: the day and chance come in as arguments
    files: ['libs/domain/src/**/*.ts'],
    ignores: ['**/*.spec.ts', 'libs/domain/src/schema/**'],
    rules: {
      'no-restricted-syntax': [
        'error',
        ...everywhere,
        ban(
          "NewExpression[callee.name='Date'][arguments.length=0]",
          'The day comes in as an argument.',
        ),
        ban(
          "CallExpression[callee.object.name='Date'][callee.property.name='now']",
          'The day comes in as an argument.',
        ),
        ban(
          "CallExpression[callee.object.name='Math'][callee.property.name='random']",
          'Chance comes in as an argument.',
        ),
      ],
    },
  },
  {
    // the words of a check constraint come from our own lists, never from input
    files: ['libs/domain/src/schema/columns.ts'],
    rules: { 'no-restricted-syntax': 'off' },
  },
  {
    files: ['apps/client/src/**/*.ts'],
    extends: [angular.configs.tsRecommended],
    processor: angular.processInlineTemplates,
    rules: {
      '@angular-eslint/component-selector': [
        'error',
        { type: 'element', prefix: ['app', 'lg'], style: 'kebab-case' },
      ],
      '@angular-eslint/directive-selector': [
        'error',
        { type: 'attribute', prefix: ['app', 'lg'], style: 'camelCase' },
      ],
      '@angular-eslint/prefer-on-push-component-change-detection': 'error',
    },
  },
  {
    files: ['apps/client/src/**/*.html'],
    extends: [angular.configs.templateRecommended, angular.configs.templateAccessibility],
  },
  {
    files: [
      'apps/api/src/main.ts',
      'apps/api/src/start.ts',
      'apps/tools/**',
      'tests/verification/print-table.ts',
      'seeds/**',
      'db/**',
    ],
    rules: { 'no-console': 'off' },
  },
);
