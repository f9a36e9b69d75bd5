import { readdirSync } from 'node:fs';
import js from '@eslint/js';
import globals from 'globals';
import tseslint from 'typescript-eslint';
import { createNodeResolver, importX } from 'eslint-plugin-import-x';
import reactHooks from 'eslint-plugin-react-hooks';

const folders = (path) =>
  readdirSync(new URL(path, import.meta.url), { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .map((entry) => entry.name);

/** Data walks one way; every zone names a folder and what it may not reach. */
const zones = [
  { target: './shared', from: ['./server', './src', './scripts', './tests'] },
  { target: './server', from: ['./src', './scripts', './tests'] },
  { target: './src', from: ['./server', './scripts', './tests'] },
  { target: './src/ui', from: ['./src/pages', './src/features', './src/charts'] },
  { target: './src/charts', from: ['./src/pages', './src/features'] },
  { target: './src/lib', from: ['./src/pages', './src/features', './src/charts', './src/ui'] },
  { target: './src/features', from: ['./src/pages'] },
  ...folders('src/features/').map((name) => ({
    target: `./src/features/${name}`,
    from: './src/features',
    except: [`./${name}`],
    message: 'A feature never imports a feature: a page composes them.',
  })),
  {
    target: './server/dicom',
    from: './server',
    except: ['./dicom'],
    message: 'server/dicom is pure: bytes in, report out.',
  },
  ...folders('server/')
    .filter((name) => !['http', 'db', 'dicom'].includes(name))
    .map((name) => ({
      target: `./server/${name}/**/!(*.routes).ts`,
      from: ['./server/http/session.ts', './server/app.ts', './server/main.ts'],
    })),
];

const only = (files, patterns) => ({
  files: [files].flat(),
  rules: { 'no-restricted-imports': ['error', { patterns }] },
});
const noExpress = {
  regex: '^(express|multer|passport)(-|/|$)',
  message: 'Only routes and http/ know Express.',
};
const noTypeorm = {
  group: ['typeorm', 'pg', 'pg-*'],
  message: 'Only stores, entities and db/ know the database.',
};
const noDicom = { group: ['dicom-parser'], message: 'Only read-dicom knows the DICOM library.' };
const noRoutesAbroad = {
  group: ['../*/*.routes', '../*/*.store'],
  message: 'Routes and stores stay at home.',
};

export default tseslint.config(
  { ignores: ['dist', '.types', '.data', 'node_modules', 'coverage'] },
  js.configs.recommended,
  tseslint.configs.recommended,
  {
    files: ['**/*.{ts,tsx,mjs}'],
    plugins: { 'import-x': importX },
    settings: {
      'import-x/resolver-next': [createNodeResolver({ extensions: ['.ts', '.tsx', '.mjs', '.js', '.json'] })],
    },
    rules: {
      'import-x/no-restricted-paths': ['error', { zones }],
      'import-x/no-cycle': ['error', { ignoreExternal: true }],
      'import-x/no-default-export': 'off',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      'max-lines': ['error', { max: 250 }],
      eqeqeq: 'error',
    },
  },
  {
    files: ['server/**', 'scripts/**', 'tests/**', '*.config.*'],
    languageOptions: { globals: globals.node },
  },
  {
    files: ['src/**'],
    languageOptions: { globals: globals.browser },
    ...reactHooks.configs.flat.recommended,
  },
  only('shared/**/*.ts', [
    {
      group: ['react*', '@tanstack/*', 'node:*', 'luxon', 'pg', 'typeorm', 'express*'],
      message: 'shared/ imports zod and pure maths only.',
    },
  ]),
  only('server/**/*.ts', [noDicom, noExpress, noTypeorm]),
  only(['server/dicom/read-dicom.ts'], [noExpress, noTypeorm]),
  only(['server/**/*.routes.ts'], [noDicom, noTypeorm]),
  only(['server/http/**/*.ts', 'server/app.ts'], [noDicom]),
  only(['server/**/*.{store,entity}.ts'], [noDicom, noExpress]),
  only(
    ['server/db/**/*.ts', 'server/main.ts', 'server/demo/**/*.ts', 'server/jobs/**/*.ts'],
    [noDicom, noExpress],
  ),
  only(['server/*/*.routes.ts'], [noDicom, noTypeorm, noRoutesAbroad]),
  { files: ['**/*.test.{ts,tsx}', 'tests/**', 'scripts/**'], rules: { 'no-restricted-imports': 'off' } },
  {
    files: ['server/db/migrations/**', '**/*.table-data.ts', 'tests/reference/data/**'],
    rules: { 'max-lines': 'off' },
  },
);
