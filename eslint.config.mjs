import { defineConfig, globalIgnores } from 'eslint/config';
import next from 'eslint-config-next/core-web-vitals';
import typescript from 'eslint-config-next/typescript';

/** What the same input must always give the same answer in: no clock, no environment, no random source. */
const PURE = [
  'lib/{schedule,network,estimates,audit,corrections,comparison,contract}/**/*.ts',
  'parsers/**/*.ts',
];

const clock = 'The clock is an argument here.';
const random = 'The random source (a seed) is an argument here.';

export default defineConfig([
  globalIgnores([
    '.next/**',
    '.plumbrow/**',
    '.plumbrow-test/**',
    'drizzle/**',
    'fixtures/**',
    'next-env.d.ts',
  ]),
  next,
  typescript,
  {
    rules: {
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-empty': ['error', { allowEmptyCatch: false }],
      'no-warning-comments': ['error', { terms: ['todo', 'fixme', 'xxx'], location: 'start' }],
      'prefer-const': 'error',
      'max-lines': ['error', { max: 300 }],
    },
  },
  {
    files: ['**/*.ts', '**/*.tsx'],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/ban-ts-comment': 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/await-thenable': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/no-unused-expressions': 'error',
    },
  },
  {
    files: PURE,
    rules: {
      'no-restricted-globals': ['error', 'process', 'fetch', 'setTimeout', 'setInterval', 'performance'],
      'no-restricted-properties': [
        'error',
        { object: 'Date', property: 'now', message: clock },
        { object: 'Math', property: 'random', message: random },
        { object: 'crypto', property: 'randomUUID', message: random },
        { object: 'crypto', property: 'getRandomValues', message: random },
      ],
      'no-restricted-syntax': [
        'error',
        { selector: "NewExpression[callee.name='Date'][arguments.length=0]", message: clock },
      ],
    },
  },
  {
    // Index arithmetic on typed arrays that these modules make themselves; nothing from outside is read so.
    files: ['lib/network/**'],
    rules: { '@typescript-eslint/no-non-null-assertion': 'off' },
  },
  {
    // Tests read what they have just put there; a table of cases may be long.
    files: ['tests/**'],
    rules: { '@typescript-eslint/no-non-null-assertion': 'off', 'max-lines': ['error', { max: 500 }] },
  },
]);
