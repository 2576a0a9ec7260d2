import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import reactHooks from 'eslint-plugin-react-hooks';
import reactRefresh from 'eslint-plugin-react-refresh';
import globals from 'globals';
import tseslint from 'typescript-eslint';

const pureCoreOnly = {
  patterns: [
    {
      regex: '^(@nestjs/|sequelize|node:|rxjs|umzug|sqlite3|nodemailer|express)',
      message: 'src/analysis holds pure functions: no framework, database or node import.',
    },
  ],
};

/** Imports in the dashboard run one way: lib, utils, types, theme ← components ← features/x ← app. */
const dashboardLayer = (files, forbidden, message) => ({
  files,
  rules: { 'no-restricted-imports': ['error', { patterns: [{ regex: forbidden, message }] }] },
});

export default tseslint.config(
  { ignores: ['**/dist/**', '**/node_modules/**', '**/coverage/**', '**/*.generated.ts', 'data/**'] },
  js.configs.recommended,
  { files: ['**/*.{js,mjs,cjs}'], languageOptions: { globals: globals.node, sourceType: 'module' } },
  { files: ['ingest-api/jest.config.js'], languageOptions: { sourceType: 'commonjs' } },
  {
    files: ['**/*.{ts,tsx}'],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', ignoreRestSiblings: true }],
    },
  },
  {
    files: ['**/*.spec.ts', '**/*.e2e-spec.ts', '**/*.test.ts', '**/*.test.tsx', 'ingest-api/test/**'],
    rules: {
      // supertest bodies and ECharts options are `any`; asserting on them is the point of a test.
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
    },
  },
  { files: ['ingest-api/src/analysis/**/*.ts'], rules: { 'no-restricted-imports': ['error', pureCoreOnly] } },
  {
    files: ['dashboard/**/*.{ts,tsx}'],
    languageOptions: { globals: globals.browser },
    plugins: { 'react-hooks': reactHooks, 'react-refresh': reactRefresh },
    rules: { ...reactHooks.configs.recommended.rules, 'react-refresh/only-export-components': 'warn' },
  },
  dashboardLayer(
    ['dashboard/src/{lib,utils,theme}/**/*.{ts,tsx}'],
    '/(components|features|app)/',
    'lib, utils and theme stand below components, features and app.',
  ),
  dashboardLayer(
    ['dashboard/src/components/**/*.{ts,tsx}'],
    '/(features|app)/',
    'components know no feature.',
  ),
  dashboardLayer(
    ['dashboard/src/features/**/*.{ts,tsx}'],
    '/(features/|app/)|^\\.\\./\\.\\./\\.\\./[a-z-]+/(api|components)',
    'features know neither each other nor the app; routes compose them.',
  ),
  prettier,
);
