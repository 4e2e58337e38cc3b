import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';
import { typeErrors } from './lib/testing/type-errors.rule.mjs';

export default tseslint.config(
  {
    ignores: [
      '**/dist/',
      '**/node_modules/',
      '.ferrite/',
      '.ferrite-test/',
      'portal/src/api-client/schema.d.ts',
      '**/*.cjs',
      '**/*.mjs',
      '**/*.js',
    ],
  },
  ...tseslint.configs.recommendedTypeChecked,
  {
    linterOptions: { reportUnusedDisableDirectives: 'error' },
    languageOptions: { parserOptions: { projectService: true } },
    plugins: { house: { rules: { 'type-errors': typeErrors } } },
    rules: {
      'house/type-errors': 'error',
      eqeqeq: 'error',
      'no-console': 'error',
      '@typescript-eslint/consistent-type-imports': [
        'error',
        { fixStyle: 'inline-type-imports', disallowTypeAnnotations: false },
      ],
      '@typescript-eslint/explicit-module-boundary-types': 'off',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/restrict-template-expressions': [
        'error',
        { allowNumber: true, allowBoolean: true },
      ],
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
      'max-lines': ['error', { max: 300, skipBlankLines: true, skipComments: true }],
      'max-lines-per-function': ['error', { max: 80, skipBlankLines: true, skipComments: true }],
    },
  },
  {
    // Programs speak on the console; the API speaks through its logger.
    files: ['api/src/main.ts', 'api/src/migrate.ts', 'fakes/**/*.ts', 'seeds/**/*.ts'],
    rules: { 'no-console': 'off' },
  },
  {
    // The API has one clock. `new Date(x)` converts and is fine; `new Date()` and `Date.now()` read another clock.
    files: ['api/src/**/*.ts'],
    ignores: ['api/src/common/clock.ts'],
    rules: {
      'no-restricted-syntax': [
        'error',
        { selector: 'NewExpression[callee.name="Date"][arguments.length=0]', message: 'Ask the Clock.' },
        {
          selector: 'CallExpression[callee.object.name="Date"][callee.property.name="now"]',
          message: 'Ask the Clock.',
        },
      ],
    },
  },
  {
    // Dependency injection reads the classes at run time, so their imports must not become types.
    files: ['api/src/**/*.ts', 'seeds/**/*.ts'],
    rules: { '@typescript-eslint/consistent-type-imports': 'off', '@typescript-eslint/require-await': 'off' },
  },
  {
    files: ['**/*.spec.ts', '**/*.test.ts', '**/*.test.tsx', 'api/test/**/*.ts', 'portal/browser/**/*.ts'],
    rules: { 'max-lines-per-function': 'off' },
  },
  {
    // A response body is `any` in supertest's types; what it holds is what these specs are about.
    files: ['api/**/*.spec.ts', 'fakes/**/*.spec.ts', 'seeds/**/*.spec.ts'],
    rules: {
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
    },
  },
  {
    files: ['portal/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: {
      ...reactHooks.configs.recommended.rules,
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
    },
  },
);
