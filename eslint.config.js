import svelte from 'eslint-plugin-svelte';
import globals from 'globals';
import ts from 'typescript-eslint';
import svelteConfig from './svelte.config.js';

export default ts.config(
  {
    ignores: [
      '.svelte-kit/',
      'build/',
      'build-cli/',
      'build-worker/',
      'node_modules/',
      'fixtures/',
      'drizzle/',
      'data/',
      '**/*.cjs'
    ]
  },
  ...ts.configs.recommended,
  ...svelte.configs.recommended,
  {
    languageOptions: { globals: { ...globals.browser, ...globals.node } },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      'no-console': 'error',
      eqeqeq: 'error',
      // The application always lives at the root of its address, and team addresses are put together.
      'svelte/no-navigation-without-resolve': 'off'
    }
  },
  { files: ['src/cli/**', 'tests/**', '.ci/**'], rules: { 'no-console': 'off' } },
  {
    files: ['**/*.svelte', '**/*.svelte.ts'],
    languageOptions: { parserOptions: { parser: ts.parser, extraFileExtensions: ['.svelte'], svelteConfig } }
  }
);
