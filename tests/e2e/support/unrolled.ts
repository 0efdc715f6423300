import type { Page } from 'playwright-core';

/** Waits until a report is laid out to its end, which it is once it answers (page/kept/unroll.ts). */
export const unrolled = (page: Page): Promise<unknown> =>
  page.waitForFunction(() => !document.querySelector('.still:not([data-whole])'), null, {
    timeout: 20_000
  });
