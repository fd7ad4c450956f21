import expo from 'eslint-config-expo/flat.js';
import prettier from 'eslint-config-prettier';
import globals from 'globals';

const bareTransaction = {
  selector: "CallExpression[callee.property.name='transaction']",
  message: 'Use transact(): a deferred transaction fails at once under two writers.',
};

export default [
  { ignores: ['dist/', 'build/', 'data/', 'drizzle/', '.expo/', 'expo-env.d.ts', 'tests/fixtures/'] },
  ...expo,
  prettier,
  {
    files: ['**/*.{ts,tsx}'],
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      'import/no-default-export': 'off',
      'max-lines': ['error', { max: 300 }],
      'max-params': ['error', 4],
      'no-console': 'error',
      // A zod schema and the type inferred from it share one name.
      '@typescript-eslint/no-redeclare': 'off',
      'no-restricted-syntax': ['error', bareTransaction],
      eqeqeq: ['error', 'always', { null: 'ignore' }],
    },
  },
  {
    files: ['{analysis,contract,figures,server,db,hooks}/**/*.ts'],
    rules: { 'max-lines-per-function': ['error', { max: 60, skipBlankLines: true, skipComments: true }] },
  },
  {
    files: ['{app,components}/**/*.{ts,tsx}'],
    rules: { 'max-lines-per-function': ['error', { max: 110, skipBlankLines: true, skipComments: true }] },
  },
  { files: ['db/transact.ts'], rules: { 'no-restricted-syntax': 'off' } },
  { files: ['tests/**'], rules: { 'max-lines-per-function': 'off' } },
  { files: ['scripts/**', '*.config.*', '*.cjs'], languageOptions: { globals: globals.node }, rules: { 'no-console': 'off' } },
];
