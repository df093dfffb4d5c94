import importX from 'eslint-plugin-import-x';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

/** Who may import whom: docs/decisions/0001-parts.md. */
const zone = (files, forbidden) => ({
  files,
  rules: {
    'no-restricted-imports': [
      'error',
      { patterns: [{ group: forbidden, message: 'See who may import whom in DEVELOPERS.md.' }] },
    ],
  },
});
const ours = (...allowed) =>
  ['contracts', 'dsp', 'measure', 'fixtures', 'api', 'web', 'local-services']
    .filter((name) => !allowed.includes(name))
    .flatMap((name) => [`@thudline/${name}`, `@thudline/${name}/*`]);

export default tseslint.config(
  { ignores: ['**/dist/', '**/coverage/', '.data/', 'shots/', 'test-results/', 'playwright-report/'] },
  {
    files: ['**/*.ts', '**/*.tsx'],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: {
      parserOptions: {
        project: [
          './tsconfig.spec.json',
          './apps/api/checks/tsconfig.json',
          './apps/web/tsconfig.json',
          './apps/web/tsconfig.node.json',
        ],
        tsconfigRootDir: import.meta.dirname,
      },
    },
    plugins: { 'import-x': importX },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/consistent-type-imports': 'off',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      'import-x/no-default-export': 'error',
      'import-x/no-cycle': ['error', { ignoreExternal: true }],
    },
    settings: {
      'import-x/extensions': ['.ts', '.tsx'],
      'import-x/parsers': { '@typescript-eslint/parser': ['.ts', '.tsx'] },
      'import-x/resolver': { node: { extensions: ['.ts', '.tsx', '.js'] } },
    },
  },
  { files: ['apps/web/**/*.{ts,tsx}'], ...reactHooks.configs.flat.recommended },
  zone(['packages/dsp/**/*.ts'], [...ours(), 'node:*', 'fs', 'path']),
  zone(['packages/contracts/**/*.ts'], ours()),
  zone(['packages/measure/**/*.ts'], ours('contracts', 'dsp')),
  zone(['fixtures/**/*.ts'], ours('contracts', 'dsp')),
  zone(['apps/local-services/**/*.ts'], ours()),
  zone(['apps/api/src/**/*.ts'], ours('contracts', 'dsp', 'measure')),
  zone(['apps/web/src/**/*.{ts,tsx}'], ours('contracts', 'dsp')),
  { files: ['**/*.spec.ts', '**/*.spec.tsx', '**/*.e2e-spec.ts'], rules: { 'no-restricted-imports': 'off' } },
  {
    files: ['**/vite.config.ts', '**/playwright.config.ts', '**/e2e/harness/startApplication.ts'],
    rules: { 'import-x/no-default-export': 'off' },
  },
);
