import type { Plugin } from 'vite';

/** What makes pages live. */
const LIVE = /node_modules\/(svelte|esm-env|clsx)\//;

/** Kit's client and the frame around pages. */
const FRAME = /node_modules\/(@sveltejs\/kit|devalue)\/|vite\/preload|\/src\/lib\/page\/(keys|light)\./;

/**
 * Two files of what every page has. Left to themselves these modules come as a dozen small files, and each file costs a
 * slow processor several milliseconds before the first line of it runs; all in one they were compiled in one go, which
 * took a processor of a quarter of the speed 120 ms.
 */
export const fewerFiles = (): Plugin => ({
  name: 'fewer-files',
  apply: 'build',
  applyToEnvironment: ({ name }) => name === 'client',
  outputOptions: (options) => ({
    ...options,
    codeSplitting: {
      groups: [
        { name: 'live', test: LIVE, priority: 2 },
        { name: 'frame', test: FRAME, priority: 1 }
      ]
    }
  })
});
