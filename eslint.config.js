import typescript from '@typescript-eslint/eslint-plugin'
import { defineConfig } from 'eslint/config'
import expo from 'eslint-config-expo/flat.js'
import wedgeline from './scripts/lint/import-direction.mjs'

const SYNTAX = [
  {
    selector: 'ExportAllDeclaration[exportKind!="type"]',
    message: 'Name what is exported: a reader finds it by searching.',
  },
  {
    selector: 'CallExpression[callee.property.name="transaction"] > :function[async=true]',
    message: 'SQLite transactions are synchronous: an await inside would commit before the work is done.',
  },
  {
    // An Express error handler is told by its four parameters; its first is called `error`.
    selector: ':function[params.length>3]:not([params.0.name="error"])',
    message: 'At most 3 parameters; then an object.',
  },
]

/** A query, screen or engine module never prints; the server logs and scripts talk to a terminal. */
const SILENT = ['app/**', 'features/**', 'components/**', 'lib/**', 'packages/**']

const typeAware = {
  files: ['**/*.{ts,tsx}'],
  languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
  rules: {
    ...typescript.configs['recommended-type-checked'].rules,
    '@typescript-eslint/ban-ts-comment': ['error', { 'ts-expect-error': true, 'ts-ignore': true, 'ts-nocheck': true }],
    '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'separate-type-imports' }],
    '@typescript-eslint/no-explicit-any': 'error',
    '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
    '@typescript-eslint/no-non-null-assertion': 'error',
    '@typescript-eslint/no-empty-object-type': ['error', { allowInterfaces: 'with-single-extends' }],
    '@typescript-eslint/no-unused-vars': [
      'error',
      { args: 'after-used', argsIgnorePattern: '^_', ignoreRestSiblings: true },
    ],
    '@typescript-eslint/switch-exhaustiveness-check': [
      'error',
      { allowDefaultCaseForExhaustiveSwitch: false, considerDefaultExhaustiveForUnions: false },
    ],
  },
}

export default defineConfig([
  {
    ignores: ['dist/**', '.expo/**', 'drizzle/**', 'data/**', 'test-results/**', 'node_modules/**', 'expo-env.d.ts'],
  },
  expo,
  {
    linterOptions: { noInlineConfig: true, reportUnusedDisableDirectives: 'error' },
    plugins: { wedgeline },
    rules: {
      eqeqeq: ['error', 'always'],
      'max-lines': ['error', { max: 400, skipBlankLines: true, skipComments: true }],
      'max-lines-per-function': ['error', { max: 60, skipBlankLines: true, skipComments: true }],
      'no-restricted-syntax': ['error', ...SYNTAX],
      'no-warning-comments': ['error', { terms: ['todo', 'fixme', 'xxx', 'hack'], location: 'anywhere' }],
      'wedgeline/import-direction': 'error',
      'import/no-named-as-default': 'off',
      'import/no-named-as-default-member': 'off',
      // TypeScript resolves imports itself, and knows the packages' export maps, which this rule does not.
      'import/no-unresolved': 'off',
      'import/namespace': 'off',
    },
  },
  typeAware,
  { files: SILENT, rules: { 'no-console': 'error' } },
  {
    files: ['**/*.tsx'],
    rules: { 'max-lines-per-function': ['error', { max: 120, skipBlankLines: true, skipComments: true }] },
  },
  // Tables of data are as long as what they hold.
  { files: ['**/*-table.ts', '**/*-tables.ts', 'db/seed/demo-*.ts'], rules: { 'max-lines': 'off' } },
  {
    files: ['tests/**'],
    rules: {
      'max-lines-per-function': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/require-await': 'off',
    },
  },
  {
    files: ['**/*.cjs'],
    languageOptions: { globals: { __dirname: 'readonly', module: 'writable', require: 'readonly' } },
  },
  {
    files: ['scripts/**', '*.config.js'],
    languageOptions: {
      globals: { process: 'readonly', console: 'readonly', performance: 'readonly', URL: 'readonly' },
    },
  },
])
