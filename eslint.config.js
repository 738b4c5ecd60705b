import { defineConfig, globalIgnores } from 'eslint/config';
import jsxA11y from 'eslint-plugin-jsx-a11y';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

const defaultExport = {
  selector: 'ExportDefaultDeclaration',
  message: 'Export by name; only a tool’s own configuration has a default export.',
};

const transaction = {
  selector: 'CallExpression[callee.property.name="transaction"]',
  message: 'Use inTransaction: db/transaction.ts is the only caller of sequelize.transaction.',
};

/** Imports are checked apart, by e2e/tools/import-rules.mjs. */
export default defineConfig(
  globalIgnores(['dist', 'coverage', '.data', 'test-results', 'playwright-report']),
  {
    // A rule that is wrong is changed here for everybody, not silenced where it hurts.
    linterOptions: { noInlineConfig: true },
  },
  {
    rules: {
      eqeqeq: 'error',
      'no-restricted-syntax': ['error', defaultExport],
      'no-warning-comments': ['error', { terms: ['todo', 'fixme', 'xxx', 'hack'] }],
      'object-shorthand': 'error',
      'prefer-const': 'error',
    },
  },
  {
    files: ['**/*.{ts,tsx}'],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: {
      parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname },
    },
    rules: {
      '@typescript-eslint/ban-ts-comment': 'error',
      '@typescript-eslint/consistent-type-assertions': ['error', { assertionStyle: 'never' }],
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': [
        'error',
        // Express 5 waits for handlers and React for event handlers that are async.
        { checksVoidReturn: { arguments: false, attributes: false } },
      ],
      '@typescript-eslint/no-non-null-assertion': 'error',
      // An interface may promise what one of its makers can answer at once.
      '@typescript-eslint/require-await': 'off',
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
      // Destructuring is how a field is left out; an argument that is only in the way is `_named`.
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', ignoreRestSiblings: true },
      ],
    },
  },
  {
    // Vitest's asymmetric matchers (expect.any and the like) are typed `any`.
    files: ['**/*.test.{ts,tsx}'],
    rules: {
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/unbound-method': 'off',
    },
  },
  {
    files: ['apps/**/*.{ts,tsx}'],
    ignores: ['apps/api/src/entry/**', '**/*.test.{ts,tsx}'],
    rules: { 'no-console': 'error' },
  },
  {
    // The page has no other log to tell a fault to.
    files: ['apps/web/src/app/**'],
    rules: { 'no-console': ['error', { allow: ['error'] }] },
  },
  {
    files: ['apps/api/**/*.ts'],
    ignores: ['apps/api/src/db/transaction.ts'],
    rules: { 'no-restricted-syntax': ['error', defaultExport, transaction] },
  },
  {
    files: ['apps/web/**/*.{ts,tsx}'],
    extends: [reactHooks.configs.flat['recommended-latest'], jsxA11y.flatConfigs.recommended],
  },
  {
    // Tools want a default export, and so do the packages whose types we describe.
    files: [
      'eslint.config.js',
      'vite.config.ts',
      'e2e/playwright.config.ts',
      'e2e/tools/*.mjs',
      '**/*.d.ts',
    ],
    rules: { 'no-restricted-syntax': 'off' },
  },
);
