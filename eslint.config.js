// What the linter checks: the language rules, and which way imports may point.
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript';
import importX from 'eslint-plugin-import-x';
import angular from 'angular-eslint';
import { defineConfig, globalIgnores } from 'eslint/config';
import tseslint from 'typescript-eslint';
import { directions, packageWalls } from './scripts/lint/directions.js';
import { language, nothingLeftOut, strictness } from './scripts/lint/language.js';

const typescript = ['{shared,api,client}/**/*.ts'];
const specs = ['**/*.spec.ts', 'client/e2e/**/*.ts'];

export default defineConfig(
  globalIgnores(['**/dist/', '**/.angular/', '**/coverage/', '.data/', 'client/e2e/results/', 'test-data/']),
  {
    linterOptions: { noInlineConfig: true, reportUnusedDisableDirectives: 'error' },
  },
  {
    files: ['**/*.{ts,js}'],
    plugins: { 'import-x': importX },
    settings: {
      'import-x/resolver-next': [
        createTypeScriptImportResolver({
          project: ['shared/tsconfig.json', 'api/tsconfig.json', 'client/tsconfig*.json'],
          noWarnOnMultipleProjects: true,
        }),
      ],
      'import-x/parsers': { '@typescript-eslint/parser': ['.ts'] },
      'import-x/extensions': ['.ts', '.js'],
      'import-x/ignore': ['/dist/', '/node_modules/'],
    },
    rules: language,
  },
  {
    files: typescript,
    extends: [tseslint.configs.strict, tseslint.configs.stylistic],
    rules: strictness,
  },
  {
    files: ['client/src/**/*.ts'],
    extends: [angular.configs.tsRecommended],
    processor: angular.processInlineTemplates,
    rules: {
      '@angular-eslint/prefer-on-push-component-change-detection': 'error',
      '@typescript-eslint/explicit-module-boundary-types': 'off',
    },
  },
  {
    files: ['client/src/**/*.html'],
    extends: [angular.configs.templateRecommended, angular.configs.templateAccessibility],
    rules: {
      '@angular-eslint/template/button-has-type': 'error',
      '@angular-eslint/template/no-duplicate-attributes': 'error',
      '@angular-eslint/template/prefer-control-flow': 'error',
      '@angular-eslint/template/prefer-self-closing-tags': 'error',
    },
  },
  {
    files: specs,
    rules: {
      'no-restricted-syntax': ['error', ...nothingLeftOut],
      'max-lines-per-function': 'off',
      '@typescript-eslint/no-non-null-assertion': 'off',
    },
  },
  {
    files: ['scripts/**/*.js', '*.js'],
    rules: { 'no-console': 'off' },
  },
  directions(),
  packageWalls,
);
