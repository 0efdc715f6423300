import { sveltekit } from '@sveltejs/kit/vite';
import tailwindcss from '@tailwindcss/vite';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  plugins: [tailwindcss(), sveltekit()],
  worker: { format: 'es' },
  test: {
    include: ['tests/**/*.test.ts'],
    // Two cores: browser tests start a server each, and statistics tests are long.
    testTimeout: 60_000,
    hookTimeout: 120_000
  }
});
