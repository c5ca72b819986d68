import js from '@eslint/js';
import { defineConfig, globalIgnores } from 'eslint/config';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

export default defineConfig([
  globalIgnores(['dist/', 'node_modules/', 'public/', 'test-results/', 'playwright-report/']),
  { linterOptions: { noInlineConfig: true, reportUnusedDisableDirectives: 'error' } },
  js.configs.recommended,
  {
    files: ['**/*.{ts,tsx,mts}'],
    extends: [tseslint.configs.strictTypeChecked, tseslint.configs.stylisticTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      eqeqeq: 'error',
      // A number in a sentence needs no String() around it; what has no sensible text stays an error.
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      // `noUncheckedIndexedAccess` makes every read of a typed array possibly undefined. The loops that read them run
      // over the array's own length, where `!` says so at no cost; a check there would be dead code in the hot path.
      '@typescript-eslint/no-non-null-assertion': 'off',
      // `() => store.undo()` is clearer than the same with braces; what the rule guards against is caught elsewhere.
      '@typescript-eslint/no-confusing-void-expression': ['error', { ignoreArrowShorthand: true }],
      // Contracts describe data with interfaces where they are extended and with types where they are unions.
      '@typescript-eslint/consistent-type-definitions': 'off',
      '@typescript-eslint/consistent-type-imports': 'error',
      // mathjs builds its units from classes handed to it, most of which only have to be there.
      '@typescript-eslint/no-extraneous-class': ['error', { allowStaticOnly: true, allowEmpty: true }],
      '@typescript-eslint/switch-exhaustiveness-check': ['error', { considerDefaultExhaustiveForUnions: true }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      // A branded quantity is a number, and its sign may be turned; the rule takes the brand for something else.
      '@typescript-eslint/no-unsafe-unary-minus': 'off',
      // The compiler knows every name, types included, which this rule does not.
      'no-undef': 'off',
    },
  },
  {
    files: ['src/**/*.{ts,tsx}'],
    rules: { 'no-console': 'error' },
  },
  {
    files: ['src/ui/**/*.{ts,tsx}', 'src/main.tsx'],
    extends: [reactHooks.configs.flat.recommended],
  },
  {
    files: ['**/*.{js,mjs}'],
    extends: [tseslint.configs.disableTypeChecked],
    languageOptions: {
      globals: {
        console: 'readonly', performance: 'readonly', process: 'readonly', setTimeout: 'readonly', URL: 'readonly',
      },
    },
  },
]);
