import js from '@eslint/js'
import prettier from 'eslint-config-prettier'
import vue from 'eslint-plugin-vue'
import globals from 'globals'
import tseslint from 'typescript-eslint'
import vueParser from 'vue-eslint-parser'

const typed = ['shared/**/*.ts', 'server/**/*.ts', 'src/**/*.{ts,vue}', 'tests/**/*.ts', 'scripts/**/*.ts', 'vite.config.ts']

export default tseslint.config(
  { ignores: ['node_modules', 'dist', '.data', '**/*.timestamp-*'] },
  js.configs.recommended,
  ...tseslint.configs.recommended,
  ...vue.configs['flat/recommended'],
  {
    languageOptions: { globals: { ...globals.node } },
  },
  {
    files: ['src/**'],
    languageOptions: { globals: { ...globals.browser } },
  },
  {
    files: typed,
    languageOptions: {
      parser: vueParser,
      parserOptions: {
        parser: tseslint.parser,
        project: ['tsconfig.json', 'shared/tsconfig.json', 'src/tsconfig.json', 'tests/tsconfig.json'],
        tsconfigRootDir: new URL('..', import.meta.url).pathname,
        extraFileExtensions: ['.vue'],
      },
    },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: false }],
      '@typescript-eslint/await-thenable': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': ['error', { considerDefaultExhaustiveForUnions: true }],
      'no-undef': 'off',
      eqeqeq: 'error',
    },
  },
  {
    files: ['shared/**', 'server/**', 'src/**'],
    rules: { 'no-console': 'error', '@typescript-eslint/no-explicit-any': 'error' },
  },
  {
    files: ['tests/**'],
    rules: {
      'no-restricted-syntax': [
        'error',
        {
          selector: 'CallExpression[callee.property.name=/^(only|skip|todo)$/][callee.object.name=/^(it|test|describe)$/]',
          message: 'no focused or skipped tests',
        },
        {
          selector: "ExpressionStatement > CallExpression[callee.name='expect']",
          message: 'expect without a matcher checks nothing',
        },
      ],
    },
  },
  { files: ['**/*.vue'], rules: { 'vue/multi-word-component-names': 'off', 'vue/require-default-prop': 'off' } },
  prettier,
)
