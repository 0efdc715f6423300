import { sveltekit } from '@sveltejs/kit/vite';
import tailwindcss from '@tailwindcss/vite';
import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';
import { fewerFiles } from './vite.chunks.config.ts';
import { devIssuer } from './vite.issuer.config.ts';
import { firstReading } from './vite.reading.config.ts';
import { jobWorker } from './vite.worker.config.ts';

export default defineConfig({
  plugins: [tailwindcss(), jobWorker(), firstReading(), devIssuer(), sveltekit(), fewerFiles()],
  resolve: {
    alias: {
      'sveltekit-superforms/adapters': fileURLToPath(
        new URL('./src/lib/model/superforms-adapters.ts', import.meta.url)
      ),
      'brotli/decompress.js': fileURLToPath(new URL('./src/lib/pdf/type/no-woff2.ts', import.meta.url))
    }
  },
  worker: { format: 'es' },
  test: {
    // Two cores, so two groups one after the other: the long statistics tests share both cores; a browser
    // test has them to itself, since its browser, its server and its worker want more than one already.
    projects: [
      {
        extends: true,
        test: {
          name: 'statistics',
          include: ['tests/unit/**/*.test.ts', 'tests/reference/**/*.test.ts'],
          environment: 'node',
          setupFiles: ['tests/support/property-seed.ts'],
          // What is told of each job is not what a failing test is searched for.
          env: { LOG_LEVEL: 'error' },
          pool: 'forks',
          maxWorkers: 2,
          testTimeout: 60_000,
          hookTimeout: 120_000,
          sequence: { groupOrder: 0 }
        }
      },
      {
        extends: true,
        test: {
          name: 'browser',
          include: ['tests/e2e/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/e2e/support/unpack-browser.ts'],
          pool: 'forks',
          maxWorkers: 1,
          testTimeout: 60_000,
          hookTimeout: 120_000,
          sequence: { groupOrder: 1 }
        }
      }
    ]
  }
});
