import { gzipSync } from 'node:zlib';
import type { Page } from 'playwright-core';

/** Kept on the page by `watchShifts`. */
interface Watched {
  shifts: { value: number; what: string }[];
}

/**
 * Adds up how far things move on a page while it loads (Layout Instability API), for every page opened from now on.
 * Chromium leaves out what follows within half a second of a press.
 *
 * @returns the shifts so far, with what moved
 */
export async function watchShifts(page: Page): Promise<() => Promise<{ sum: number; what: string[] }>> {
  await page.addInitScript(() => {
    const watched: Watched = { shifts: [] };
    Object.assign(window, { watched });
    new PerformanceObserver((list) => {
      for (const entry of list.getEntries()) {
        const { value, hadRecentInput, sources } = entry as PerformanceEntry & {
          value: number;
          hadRecentInput: boolean;
          sources: { node: Node | null; previousRect: DOMRect; currentRect: DOMRect }[];
        };
        if (hadRecentInput) continue;
        const what = sources.map(
          ({ node, previousRect, currentRect }) =>
            `${node?.nodeName} ${node?.textContent?.trim().slice(0, 30)} from ${previousRect.y} to ${currentRect.y}`
        );
        watched.shifts.push({ value, what: `${value.toFixed(4)}: ${what.join('; ')}` });
      }
    }).observe({ type: 'layout-shift', buffered: true });
  });
  return () =>
    page.evaluate(() => {
      const { shifts } = (window as unknown as { watched: Watched }).watched;
      return { sum: shifts.reduce((sum, { value }) => sum + value, 0), what: shifts.map(({ what }) => what) };
    });
}

/** Bytes of JavaScript that a page asks for from now on, as a server that compresses would send them. */
export function watchScripts(page: Page): () => Promise<{ files: string[]; bytes: number }> {
  const scripts: Promise<[string, number]>[] = [];
  page.on('response', (response) => {
    if (/javascript/.test(response.headers()['content-type'] ?? ''))
      scripts.push(response.body().then((body) => [response.url(), gzipSync(body).length]));
  });
  return async () => {
    const loaded = await Promise.all(scripts);
    return { files: loaded.map(([url]) => url), bytes: loaded.reduce((sum, [, size]) => sum + size, 0) };
  };
}
