import tseslint from 'typescript-eslint';
import jsxA11y from 'eslint-plugin-jsx-a11y';
import reactHooks from 'eslint-plugin-react-hooks';

const noContractsAtRunTime = {
  '@typescript-eslint/no-restricted-imports': [
    'error',
    {
      patterns: [
        {
          group: ['**/shared/contracts/*', 'zod', 'zod/*'],
          allowTypeImports: true,
          message: 'zod must not reach the browser: import types only.',
        },
        { group: ['**/server/**'], message: 'src never imports from server, not even types.' },
      ],
    },
  ],
};

export default tseslint.config(
  { ignores: ['dist/**', 'node_modules/**', 'data/**', '.cache/**', 'coverage/**', 'test-results/**'] },
  ...tseslint.configs.strict,
  {
    files: ['**/*.ts', '**/*.tsx'],
    languageOptions: {
      parserOptions: {
        project: ['shared/tsconfig.json', 'server/tsconfig.json', 'src/tsconfig.json', 'tests/tsconfig.json'],
        tsconfigRootDir: new URL('..', import.meta.url).pathname,
      },
    },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/switch-exhaustiveness-check': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      'no-restricted-syntax': [
        'error',
        { selector: 'ExportDefaultDeclaration', message: 'Named exports only.' },
        { selector: 'ExportAllDeclaration', message: 'No re-exporting.' },
      ],
      'max-lines': ['error', { max: 330, skipBlankLines: true, skipComments: true }],
      eqeqeq: 'error',
    },
  },
  {
    files: ['shared/**/*.ts'],
    ignores: ['**/*.test.ts'],
    rules: {
      'no-restricted-globals': ['error', 'Date', 'process', 'window', 'document', 'fetch', 'crypto', 'setTimeout'],
      'no-restricted-properties': ['error', { object: 'Math', property: 'random' }],
    },
  },
  {
    files: ['src/**/*.ts', 'src/**/*.tsx'],
    ignores: ['**/*.test.ts', '**/*.test.tsx'],
    plugins: { 'jsx-a11y': jsxA11y, 'react-hooks': reactHooks },
    rules: {
      ...jsxA11y.flatConfigs.recommended.rules,
      ...reactHooks.configs.recommended.rules,
      ...noContractsAtRunTime,
    },
  },
  {
    files: ['*.config.ts', 'tests/browser/global-setup.ts', 'tests/setup/untyped-packages.d.ts', '.config/**'],
    rules: { 'no-restricted-syntax': 'off' },
  },
  {
    files: ['.config/**/*.js', '.config/**/*.mjs', '.config/**/*.cjs'],
    extends: [tseslint.configs.disableTypeChecked],
    rules: { '@typescript-eslint/no-require-imports': 'off' },
  },
);
