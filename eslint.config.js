import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

export default tseslint.config(
  { ignores: ['dist/', 'data/', 'coverage/', 'test-results/', 'playwright-report/', '.cache/', 'drizzle/'] },
  ...tseslint.configs.recommended,
  {
    files: ['**/*.{ts,tsx}'],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/await-thenable': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': ['error', { considerDefaultExhaustiveForUnions: true }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      eqeqeq: 'error',
      'max-lines': ['error', 400],
      'no-restricted-syntax': [
        'error',
        {
          selector: 'ExportDefaultDeclaration',
          message: 'Named exports only, so that a thing has one name everywhere.',
        },
        { selector: 'ExportAllDeclaration', message: 'No barrels: import from the file that holds the thing.' },
      ],
    },
  },
  {
    // Where a line on the console is the product: commands, and the runners of the tests.
    files: ['server/**/*.ts', 'src/**/*.{ts,tsx}', 'shared/**/*.ts'],
    ignores: ['server/cli/**', 'server/main.ts'],
    rules: { 'no-console': 'error' },
  },
  { files: ['src/**/*.{ts,tsx}', 'tests/src/**/*.{ts,tsx}'], ...reactHooks.configs.flat.recommended },
  // Tools that ask for a default export.
  {
    files: ['*.config.{ts,js}', 'tests/setup/{serve-product,database}.ts', '**/*.d.ts'],
    rules: { 'no-restricted-syntax': 'off' },
  },
);
