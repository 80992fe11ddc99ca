import next from 'eslint-config-next';
import nextTypescript from 'eslint-config-next/typescript';

const processEnv = {
  selector: "MemberExpression[object.name='process'][property.name='env']",
  message: 'Settings are read once, in lib/env.ts.',
};
const defaultExport = {
  selector: 'ExportDefaultDeclaration',
  message: 'Named exports only, except where the framework demands a default.',
};

const rules = [
  {
    ignores: [
      'node_modules/**',
      '.next/**',
      '.next-test/**',
      '.data/**',
      'drizzle/**',
      'public/**',
      'test-results/**',
      'playwright-report/**',
      'next-env.d.ts',
    ],
  },
  ...next,
  ...nextTypescript,
  {
    linterOptions: { reportUnusedDisableDirectives: 'error' },
    // Looks for a pages/ folder, which does not exist here, and says so on every run.
    rules: { '@next/next/no-html-link-for-pages': 'off' },
  },
  {
    files: ['**/*.ts', '**/*.tsx'],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      // An async handler on an event is how React is written; its refusals are caught by the query client.
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/consistent-type-imports': 'error',
      // `import { type X }` still loads the file; in the browser that may be half of the server.
      '@typescript-eslint/no-import-type-side-effects': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true, requireDefaultForNonUnion: true },
      ],
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true },
      ],
      'no-nested-ternary': 'error',
      'no-console': 'error',
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'max-params': ['error', 4],
      'max-lines': ['error', { max: 300, skipBlankLines: true, skipComments: true }],
      'max-lines-per-function': ['error', { max: 80, skipBlankLines: true, skipComments: true }],
      'no-restricted-syntax': ['error', processEnv, defaultExport],
    },
  },
  {
    // Markup is long without being complicated.
    files: ['**/*.tsx'],
    rules: { 'max-lines-per-function': ['error', { max: 150, skipBlankLines: true, skipComments: true }] },
  },
  {
    // Next and the tools ask for a default export here.
    files: ['app/**', 'proxy.ts', 'instrumentation.ts', '*.config.ts'],
    rules: { 'no-restricted-syntax': ['error', processEnv] },
  },
  {
    // These start, set up or watch processes: they speak to the terminal and hand the environment on.
    files: [
      'lib/env.ts',
      'lib/stack/**',
      'fakes/**',
      '*.config.ts',
      '*.config.mjs',
      'db/cluster.ts',
      'db/postgres-binaries.ts',
    ],
    rules: { 'no-restricted-syntax': 'off', 'no-console': 'off' },
  },
  {
    files: ['db/seed/**', 'lib/audit/verify-cli.ts', 'tests/**'],
    rules: { 'no-console': 'off' },
  },
  {
    // A test reads from top to bottom; a schema and a story are long lists.
    files: ['tests/**', 'db/seed/**', 'db/schema/**'],
    rules: { 'max-lines-per-function': 'off' },
  },
  {
    files: ['tests/**'],
    ignores: ['tests/**/global-*.ts'],
    rules: { 'no-restricted-syntax': ['error', defaultExport] },
  },
  {
    files: ['tests/**/global-*.ts'],
    rules: { 'no-restricted-syntax': 'off' },
  },
  {
    files: ['tests/**'],
    rules: { 'max-lines': 'off' },
  },
];

export default rules;
