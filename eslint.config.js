import js from '@eslint/js'
import globals from 'globals'
import jsxA11y from 'eslint-plugin-jsx-a11y'
import reactHooks from 'eslint-plugin-react-hooks'
import tseslint from 'typescript-eslint'
import { importRules } from './eslint.imports.js'

export default tseslint.config(
  { ignores: ['dist/**', '.scrim/**', 'screens/**', 'coverage/**', 'tests/fixtures/**'] },
  js.configs.recommended,
  ...tseslint.configs.recommended,
  {
    languageOptions: { globals: { ...globals.es2023 } },
    rules: {
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      'no-console': 'error',
      eqeqeq: ['error', 'always'],
    },
  },
  {
    files: ['src/**/*.{ts,tsx}'],
    ...jsxA11y.flatConfigs.recommended,
    languageOptions: { ...jsxA11y.flatConfigs.recommended.languageOptions, globals: { ...globals.browser } },
  },
  {
    files: ['src/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: { 'react-hooks/rules-of-hooks': 'error', 'react-hooks/exhaustive-deps': 'error' },
  },
  {
    files: ['server/**', 'scripts/**', 'tests/**', '*.config.*', '.ci/**'],
    languageOptions: { globals: { ...globals.node } },
  },
  { files: ['public/**'], languageOptions: { globals: { ...globals.browser } } },
  { files: ['scripts/**', 'server/index.ts', 'tests/e2e/**'], rules: { 'no-console': 'off' } },
  ...importRules,
)
