import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTypescript from 'eslint-config-next/typescript';
import { defineConfig, globalIgnores } from 'eslint/config';
import { holdoff } from './scripts/lint/plugin.mjs';

const everyFile = {
  files: ['**/*.{ts,tsx,mts,mjs}'],
  plugins: { holdoff },
  // A rule is kept or changed here, never switched off in a file.
  linterOptions: { noInlineConfig: true, reportUnusedDisableDirectives: 'error' },
  rules: {
    'holdoff/environment-once': 'error',
    'holdoff/import-direction': 'error',
    'holdoff/named-exports': 'error',
    'holdoff/sql-in-db': 'error',
    'max-lines': ['error', { max: 600 }],
    'no-warning-comments': ['error', { terms: ['todo', 'fixme', 'xxx', 'hack'], location: 'anywhere' }],
    'no-console': 'error',
    'no-debugger': 'error',
    'no-eval': 'error',
    'no-implied-eval': 'error',
    'prefer-const': 'error',
    eqeqeq: ['error', 'always', { null: 'ignore' }],
    '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_', caughtErrorsIgnorePattern: '^_' }],
    '@typescript-eslint/ban-ts-comment': 'error',
    '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports', disallowTypeAnnotations: false }],
  },
};

export default defineConfig([
  globalIgnores(['**/node_modules/', '.next*/', '.data/', '.cache/', 'public/vendor/', 'test-results/', 'next-env.d.ts']),
  ...nextVitals,
  ...nextTypescript,
  everyFile,
  // The engine writes to the console from inside a worker; its host silences it.
  { files: ['lib/spice/worker/*.mjs'], rules: { 'no-console': 'off' } },
  { files: ['scripts/**/*.mjs', 'tests/**/*.mjs', '**/*.config.*', 'scripts/**/*.ts'], rules: { 'no-console': 'off' } },
]);
