import type { Plugin } from 'vite';

/** What makes pages live. */
const LIVE = /node_modules\/(svelte|esm-env|clsx)\//;

/** Kit's client and the frame around pages. */
const FRAME = /node_modules\/(@sveltejs\/kit|devalue)\/|vite\/preload|\/src\/lib\/page\/(keys|light)\./;

/** What asks the server again: lists that follow others' work, on pages of a team. */
const ASK = /node_modules\/@tanstack\//;

/**
 * What the two pages of a report begin with. Kit names the files of a page in its head, but forgets those which it met
 * before behind an `import()`, and most of these it did: they were asked for one after another once the page ran, a
 * quarter of a second on a processor of a quarter of the speed.
 */
const REPORT =
  /\/src\/lib\/(page\/(kept\/[^.]*|result\/beside|remarks\/(OpenAtHash|open-at-hash)|terms\/(open-term|unfold-notes)|team\/datasets\/fetch-json)|model\/(team\/remarks\/sections|link\/shown-report|older-document))\./;

/**
 * Files of what every page has. Left to themselves these modules come as a dozen small files, and each file costs a
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
        { name: 'frame', test: FRAME, priority: 1 },
        { name: 'ask', test: ASK, priority: 1 },
        { name: 'report', test: REPORT, priority: 0 }
      ]
    }
  })
});
