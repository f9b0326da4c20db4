import js from '@eslint/js';
import vue from 'eslint-plugin-vue';
import globals from 'globals';
import tseslint from 'typescript-eslint';
import { importDirection } from './server/dev/import-direction.mjs';

const length = (max) => ({ 'max-lines': ['error', { max }] });

/** What Prettier decides; the Vue plugin would argue with it. */
const layoutIsPrettiers = Object.fromEntries(
  [
    'html-closing-bracket-newline',
    'html-indent',
    'html-self-closing',
    'max-attributes-per-line',
    'multiline-html-element-content-newline',
    'singleline-html-element-content-newline',
  ].map((rule) => [`vue/${rule}`, 'off']),
);

export default tseslint.config(
  { ignores: ['dist/', 'node_modules/', '.data/', 'coverage/'] },
  js.configs.recommended,
  ...tseslint.configs.recommended,
  ...vue.configs['flat/recommended'],
  {
    plugins: { backmark: { rules: { 'import-direction': importDirection } } },
    languageOptions: { ecmaVersion: 2023, sourceType: 'module' },
    rules: {
      ...length(300),
      'backmark/import-direction': 'error',
      eqeqeq: ['error', 'always'],
      'no-eval': 'error',
      'no-new-func': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      // TypeScript itself finds unknown names, and knows the types that this rule does not.
      'no-undef': 'off',
    },
  },
  {
    files: ['**/*.vue'],
    languageOptions: { parserOptions: { parser: tseslint.parser } },
  },
  {
    files: ['src/**/*.{ts,vue}', 'tests/client/**/*.ts'],
    languageOptions: { globals: globals.browser },
    rules: {
      ...layoutIsPrettiers,
      'vue/no-v-html': 'error',
      // Our words (Wordmark, Lookup) are no element names; the reserved ones have a rule of their own.
      'vue/multi-word-component-names': 'off',
      'vue/require-default-prop': 'off',
      // Table slots are named after their column: `#item.capacity`.
      'vue/valid-v-slot': ['error', { allowModifiers: true }],
      'no-console': 'error',
    },
  },
  {
    files: ['server/**/*.{ts,mjs}', 'shared/**/*.ts', 'catalog/**/*.ts'],
    languageOptions: { globals: globals.node },
    rules: { 'no-console': 'error' },
  },
  {
    files: ['server/cli/**', 'server/dev/**', 'server/main.ts', 'server/migrate.ts', 'server/demo.ts'],
    rules: { 'no-console': 'off' },
  },
  { files: ['**/*.{js,mjs}'], languageOptions: { globals: globals.node }, rules: { 'no-undef': 'error' } },
  { files: ['tests/**'], rules: { ...length(400), 'vue/one-component-per-file': 'off' } },
  { files: ['shared/verification/**'], rules: length(400) },
  { files: ['catalog/**'], rules: { 'max-lines': 'off' } },
);
