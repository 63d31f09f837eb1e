import withNuxt from './.nuxt/eslint.config.mjs'
import { eslintRules, impureGlobals, impureProperties } from './tests/architecture/rules.mjs'

const product = ['app/**/*.{ts,vue}', 'server/**/*.ts', 'shared/**/*.ts']

// The most general folder first: a later entry for the same file replaces an earlier one.
const byDepth = [...eslintRules].sort((a, b) => a.files[0].split('/').length - b.files[0].split('/').length)

export default withNuxt(
  { ignores: ['.data/**', 'drizzle/**'] },
  {
    files: product,
    rules: {
      'max-lines': ['error', { max: 300 }],
      'max-lines-per-function': ['error', { max: 50, skipBlankLines: true, skipComments: true }],
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/ban-ts-comment': ['error', { 'ts-expect-error': true, 'ts-ignore': true, 'ts-nocheck': true }],
    },
  },
  {
    files: ['**/*.{ts,vue}'],
    rules: {
      // Unions are listed one a line below the name.
      '@stylistic/operator-linebreak': ['error', 'before', { overrides: { '=': 'after' } }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true }],
    },
  },
  {
    files: ['**/*.vue'],
    rules: { 'vue/html-self-closing': 'off', 'vue/no-v-html': 'error', 'vue/multi-word-component-names': 'off' },
  },
  {
    files: ['shared/**/*.ts'],
    rules: {
      'no-restricted-globals': ['error', ...impureGlobals],
      'no-restricted-properties': ['error', ...impureProperties.map(([object, property]) => ({ object, property }))],
    },
  },
  ...byDepth,
)
