import type { Plugin } from 'vite';

/** What every page has: Svelte, Kit's client and the frame around pages. */
const BASE =
  /node_modules\/(svelte|@sveltejs\/kit|devalue|esm-env|clsx)\/|vite\/preload|\/src\/lib\/page\/(keys|light)\./;

/**
 * One file of what every page has. Left to themselves these modules come as a dozen small files, and each file costs a
 * slow processor several milliseconds before the first line of it runs.
 */
export const fewerFiles = (): Plugin => ({
  name: 'fewer-files',
  apply: 'build',
  applyToEnvironment: ({ name }) => name === 'client',
  outputOptions: (options) => ({ ...options, codeSplitting: { groups: [{ name: 'base', test: BASE }] } })
});
