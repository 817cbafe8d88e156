import js from '@eslint/js';
import reactHooks from 'eslint-plugin-react-hooks';
import globals from 'globals';
import tseslint from 'typescript-eslint';

/** Imports run one way. Each entry: a folder and what it may not reach. */
const oneWay = (files, patterns) => ({
  files,
  rules: {
    'no-restricted-imports': ['error', { patterns }],
  },
});

const up = (names, message) => ({ regex: `^(\\.\\./)+(${names.join('|')})(/|$)`, message });

export default tseslint.config(
  { ignores: ['**/dist/**', '**/node_modules/**', '.fairlead/**'] },
  js.configs.recommended,
  ...tseslint.configs.recommended,
  {
    rules: {
      '@typescript-eslint/consistent-type-imports': [
        'error',
        { fixStyle: 'separate-type-imports' },
      ],
      '@typescript-eslint/no-explicit-any': 'error',
      eqeqeq: 'error',
      'no-console': ['error', { allow: ['warn', 'error'] }],
    },
  },
  {
    files: ['scripts/**', 'docker-free-db/**', '**/*.mjs'],
    languageOptions: { globals: globals.node },
    rules: { 'no-console': 'off' },
  },
  {
    // Some of its functions run in the page.
    files: ['scripts/bench/keystroke.mjs'],
    languageOptions: { globals: globals.browser },
  },
  oneWay(
    ['shared/src/**'],
    [
      {
        group: ['node:*', '@fairlead/*', 'react', 'react/*', '@nestjs/*'],
        message: 'shared imports nothing of ours, no framework, no node:*.',
      },
      { regex: '(server|client)/', message: 'shared imports nothing of ours.' },
    ],
  ),
  { files: ['shared/src/**/*.test.ts'], rules: { 'no-restricted-imports': 'off' } },
  oneWay(
    ['server/**'],
    [
      {
        group: ['@fairlead/client', '@fairlead/shared/*', '**/client/**'],
        message: 'server imports only the door of shared.',
      },
    ],
  ),
  {
    // Nest reads the types of constructor parameters at run time, so they stay value imports.
    files: ['server/**'],
    rules: { '@typescript-eslint/consistent-type-imports': 'off' },
  },
  {
    files: ['client/src/**'],
    languageOptions: { globals: globals.browser },
    plugins: { 'react-hooks': reactHooks },
    rules: { 'react-hooks/rules-of-hooks': 'error', 'react-hooks/exhaustive-deps': 'error' },
  },
  oneWay(
    ['client/src/{lib,hooks,components}/**'],
    [
      up(['features', 'pages', 'app'], 'lib, hooks and components import nothing above them.'),
      {
        group: ['@fairlead/server', '@fairlead/shared/*'],
        message: 'client imports only the door of shared.',
      },
    ],
  ),
  // A feature reaches its siblings by climbing exactly as far as its folder is deep.
  ...[1, 2, 3, 4].map((depth) =>
    oneWay(
      [`client/src/features/*/${'*/'.repeat(depth - 1)}*.{ts,tsx}`],
      [
        up(['pages', 'app'], 'features import lib, hooks and components.'),
        {
          regex: `^(\\.\\./){${depth}}(?!\\.\\./)|^(\\.\\./)+features/`,
          message: 'features never import each other; pages compose them.',
        },
        {
          group: ['@fairlead/server', '@fairlead/shared/*'],
          message: 'client imports only the door of shared.',
        },
      ],
    ),
  ),
  oneWay(
    ['client/src/pages/**'],
    [
      up(['app'], 'pages import features and below.'),
      {
        group: ['@fairlead/server', '@fairlead/shared/*'],
        message: 'client imports only the door of shared.',
      },
    ],
  ),
);
