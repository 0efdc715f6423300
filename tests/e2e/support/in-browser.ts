import type { Browser } from 'playwright-core';
import { afterAll, beforeAll } from 'vitest';
import { openBrowser } from './open-browser';
import { startServer, type RunningServer } from './start-server';

/** The built application and a browser for the tests of a file: there once these run, gone after the last. */
export function inBrowser(): { server: RunningServer; browser: Browser } {
  const there = {} as { server: RunningServer; browser: Browser };
  beforeAll(async () => {
    [there.server, there.browser] = await Promise.all([startServer(), openBrowser()]);
  });
  afterAll(async () => {
    await there.browser?.close();
    await there.server?.stop();
  });
  return there;
}
