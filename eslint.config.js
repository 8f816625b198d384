import { defineConfig } from 'eslint/config';
import tseslint from 'typescript-eslint';

const UNEQUAL_BITS =
  'differs in the last bit between versions of Node, and replay depends on equal bits: multiply, or use Math.exp, Math.log, Math.sqrt.';
const NOT_PURE =
  'A function gives the same answer for the same arguments, always: hand it in as an argument.';

export default defineConfig(
  { ignores: ['dist', '.build-*', 'coverage', 'data'] },
  ...tseslint.configs.strictTypeChecked,
  ...tseslint.configs.stylisticTypeChecked,
  {
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    linterOptions: { reportUnusedDisableDirectives: 'error' },
    rules: {
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-param-reassign': 'error',
      'no-useless-return': 'error',
      'object-shorthand': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', destructuredArrayIgnorePattern: '^_' },
      ],
      // A number in a text is what most messages are made of.
      '@typescript-eslint/restrict-template-expressions': [
        'error',
        { allowNumber: true, allowBoolean: true },
      ],
      '@typescript-eslint/no-confusing-void-expression': ['error', { ignoreArrowShorthand: true }],
      // An index that a loop or a length keeps inside its array is marked so.
      '@typescript-eslint/no-non-null-assertion': 'off',
      // Records are written as they read: Record for a map, an interface for a thing.
      '@typescript-eslint/consistent-type-definitions': 'off',
    },
  },
  {
    files: ['functions/**', 'server/**'],
    // Tables of data are as long as what they tabulate.
    ignores: ['functions/data/**'],
    rules: { 'max-lines': ['error', 250] },
  },
  {
    files: ['functions/**'],
    rules: {
      'no-restricted-syntax': [
        'error',
        { selector: 'BinaryExpression[operator="**"]', message: `** ${UNEQUAL_BITS}` },
        { selector: 'AssignmentExpression[operator="**="]', message: `**= ${UNEQUAL_BITS}` },
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'pow', message: `Math.pow ${UNEQUAL_BITS}` },
        { object: 'Math', property: 'random', message: NOT_PURE },
      ],
      'no-restricted-globals': [
        'error',
        ...['Date', 'performance', 'crypto', 'process', 'console', 'globalThis', 'fetch', 'setTimeout'].map(
          (name) => ({
            name,
            message: NOT_PURE,
          }),
        ),
      ],
    },
  },
  {
    // The two places that touch the engine's untyped edge.
    files: ['functions/plugin.ts', 'server/engine/**'],
    rules: {
      '@typescript-eslint/no-explicit-any': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
    },
  },
  {
    // Scripts read JSON and hold what they read to no type; the compiler still checks the rest.
    files: ['**/*.mjs', '**/*.js'],
    rules: {
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
    },
  },
);
