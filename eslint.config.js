import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript';
import importX from 'eslint-plugin-import-x';
import reactHooks from 'eslint-plugin-react-hooks';
import globals from 'globals';
import tseslint from 'typescript-eslint';

const BACKEND_FEATURES = [
  'auth',
  'users',
  'teams',
  'parts',
  'library',
  'ranking',
  'conditions',
  'health',
  'prices',
  'audit',
  'imports',
  'plans',
  'billing',
  'mail',
  'notices',
];
const FRONTEND_FEATURES = [
  'account',
  'audit',
  'billing',
  'session',
  'team',
  'parts',
  'ranking',
  'conditions',
  'imports',
  'prices',
];

const PAYMENTS_SDK = { name: 'stripe', message: 'Only backend/src/billing talks to the payment service.' };

/** A feature may use another's service, never its DTOs; its own DTOs use no other feature at all. */
const backendZones = BACKEND_FEATURES.flatMap((feature) => {
  const others = BACKEND_FEATURES.filter((other) => other !== feature).map(
    (other) => `./backend/src/${other}`,
  );
  return [
    { target: `./backend/src/${feature}`, from: others.map((other) => `${other}/dto`) },
    { target: `./backend/src/${feature}/dto`, from: others },
  ];
});

const frontendZones = FRONTEND_FEATURES.map((feature) => ({
  target: `./frontend/src/features/${feature}`,
  from: './frontend/src/features',
  except: [`./${feature}`],
  message: 'A feature never imports another feature: a page puts them together.',
}));

export default tseslint.config(
  { ignores: ['**/dist/**', '**/coverage/**', '.local/**', 'frontend/src/api/schema.d.ts'] },
  js.configs.recommended,
  ...tseslint.configs.recommended,
  {
    plugins: { 'import-x': importX },
    settings: {
      'import-x/resolver-next': [
        createTypeScriptImportResolver({
          project: ['common/tsconfig.json', 'backend/tsconfig.json', 'frontend/tsconfig.json'],
          noWarnOnMultipleProjects: true,
        }),
      ],
    },
    rules: {
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', ignoreRestSiblings: true }],
      'import-x/no-cycle': 'error',
      'import-x/no-default-export': 'error',
      'import-x/no-restricted-paths': [
        'error',
        {
          zones: [
            { target: './common', from: ['./backend', './frontend'] },
            { target: './backend', from: './frontend' },
            { target: './frontend', from: './backend' },
            { target: './backend/src', from: './backend/fakes' },
            { target: './backend/fakes', from: './backend/src' },
            { target: './frontend/src/features', from: './frontend/src/pages' },
            {
              target: './frontend/src/components',
              from: ['./frontend/src/pages', './frontend/src/features'],
            },
            { target: './frontend/src/api', from: ['./frontend/src/pages', './frontend/src/features'] },
            {
              target: './backend/src/shared',
              from: BACKEND_FEATURES.map((feature) => `./backend/src/${feature}`),
            },
            ...backendZones,
            ...frontendZones,
          ],
        },
      ],
    },
  },
  {
    files: ['common/src/**/*.ts'],
    ignores: ['**/*.test.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        { patterns: [{ regex: '^[^.]', message: 'common depends on nothing.' }] },
      ],
    },
  },
  {
    files: ['backend/src/**/*.ts'],
    ignores: ['backend/src/config/**'],
    rules: {
      'no-restricted-properties': [
        'error',
        { object: 'process', property: 'env', message: 'Only backend/src/config reads the environment.' },
      ],
    },
  },
  {
    files: ['backend/src/**/*.ts'],
    ignores: ['backend/src/mail/**'],
    rules: {
      '@typescript-eslint/no-restricted-imports': [
        'error',
        { paths: [{ name: 'nodemailer', message: 'E-mail goes out through MailQueue.' }] },
      ],
    },
  },
  {
    files: ['backend/src/**/*.ts'],
    ignores: ['backend/src/billing/**'],
    rules: { 'no-restricted-imports': ['error', { paths: [PAYMENTS_SDK] }] },
  },
  {
    files: ['backend/**/*.controller.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          paths: ['typeorm', '@nestjs/typeorm', PAYMENTS_SDK],
          patterns: ['**/entities/*', '**/*.entity.js'],
        },
      ],
    },
  },
  {
    files: ['frontend/src/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    languageOptions: { globals: globals.browser },
    rules: {
      ...reactHooks.configs.recommended.rules,
    },
  },
  {
    files: ['frontend/src/**/*.{ts,tsx}'],
    ignores: ['frontend/src/api/**'],
    rules: {
      'no-restricted-globals': ['error', { name: 'fetch', message: 'Only src/api calls the server.' }],
    },
  },
  {
    files: ['**/*.mjs', '**/*.config.{js,ts}', 'backend/**/*.ts', 'frontend/e2e/**/*.ts'],
    languageOptions: { globals: globals.node },
  },
  {
    files: ['**/*.config.{js,ts}', '**/jest.config.js', 'eslint.config.js'],
    rules: { 'import-x/no-default-export': 'off' },
  },
  prettier,
);
