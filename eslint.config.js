import { builtinModules } from 'node:module';
import { defineConfig } from 'eslint/config';
import hooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

const TYPESCRIPT = ['**/*.{ts,tsx}'];
const SCRIPTS = ['scripts/**/*.mjs', '*.js', '*.cjs'];
const CONFIGS = ['*.config.{ts,js}', '*.cjs', 'tests/support/database.ts'];

/** Anything that only a browser or only Node has: shared code runs in both. */
const PLATFORM_GLOBALS = [
  'window',
  'document',
  'navigator',
  'location',
  'localStorage',
  'sessionStorage',
  'fetch',
  'process',
  'Buffer',
  'require',
  'global',
  '__dirname',
  'setImmediate',
];

const NODE_GLOBALS = [
  'process',
  'console',
  'Buffer',
  'URL',
  'URLSearchParams',
  'setTimeout',
  'clearTimeout',
  'setInterval',
  'clearInterval',
  'setImmediate',
  'fetch',
  'AbortController',
  'AbortSignal',
  'performance',
  'structuredClone',
  'TextEncoder',
  'TextDecoder',
  'module',
];

export default defineConfig(
  { ignores: ['dist', 'dist-server', 'node_modules', '.data', '.test-data', 'pictures', 'docs'] },
  { linterOptions: { reportUnusedDisableDirectives: 'error', noInlineConfig: true } },
  {
    files: [...TYPESCRIPT, ...SCRIPTS],
    rules: {
      'max-lines': ['error', { max: 350 }],
      eqeqeq: ['error', 'always'],
      'no-var': 'error',
      'prefer-const': 'error',
      'object-shorthand': 'error',
      'no-throw-literal': 'error',
      'no-restricted-syntax': [
        'error',
        { selector: 'ExportDefaultDeclaration', message: 'Name what is exported.' },
        { selector: 'TSEnumDeclaration', message: 'Use a union of string literals and a table.' },
      ],
    },
  },
  {
    files: TYPESCRIPT,
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/ban-ts-comment': [
        'error',
        { 'ts-expect-error': true, 'ts-ignore': true, 'ts-nocheck': true },
      ],
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
      // How other packages' types are widened.
      '@typescript-eslint/no-empty-object-type': ['error', { allowInterfaces: 'with-single-extends' }],
      '@typescript-eslint/only-throw-error': 'error',
      '@typescript-eslint/return-await': ['error', 'in-try-catch'],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      // Numbers in texts are what this product is made of.
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      // Express handlers and form callbacks may be async where the library awaits or ignores them knowingly.
      '@typescript-eslint/no-misused-promises': [
        'error',
        { checksVoidReturn: { arguments: false, attributes: false } },
      ],
    },
  },
  {
    files: ['src/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': hooks },
    rules: { ...hooks.configs.recommended.rules, 'no-console': 'error' },
  },
  { files: ['server/**/*.ts', 'shared/**/*.ts', 'labels/**/*.ts'], rules: { 'no-console': 'error' } },
  {
    files: ['shared/**/*.ts'],
    rules: {
      'no-restricted-globals': ['error', ...PLATFORM_GLOBALS],
      'no-restricted-imports': [
        'error',
        {
          paths: builtinModules,
          patterns: [{ group: ['node:*'], message: 'shared/ runs in the browser too.' }],
        },
      ],
    },
  },
  {
    files: SCRIPTS,
    languageOptions: { globals: Object.fromEntries(NODE_GLOBALS.map((name) => [name, 'readonly'])) },
    rules: {
      'no-undef': 'error',
      'no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      'no-unreachable': 'error',
      'no-dupe-keys': 'error',
      'no-const-assign': 'error',
      'no-fallthrough': 'error',
      'no-unsafe-finally': 'error',
    },
  },
  // The tools that read these ask for a default export.
  { files: CONFIGS, rules: { 'no-restricted-syntax': 'off' } },
);
