import { sveltekit } from '@sveltejs/kit/vite';
import { defineConfig } from 'vitest/config';

/** `npm run bench:pages`: times of the built pages in the packaged browser. No part of `npm test`. */
export default defineConfig({
  plugins: [sveltekit()],
  test: {
    name: 'timing',
    include: ['tests/timing/**/*.ts'],
    environment: 'node',
    globalSetup: ['tests/e2e/support/unpack-browser.ts'],
    pool: 'forks',
    maxWorkers: 1,
    testTimeout: 300_000,
    hookTimeout: 120_000
  }
});
