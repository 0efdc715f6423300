import type { BrowserContext } from 'playwright-core';

/** How soon a page of charts can be used, milliseconds after its address was asked for. */
export interface InteractiveTime {
  /** The first chart says a reading when an arrow key is pressed. */
  answers: number;
  /** Largest thing of the first screen drawn (Largest Contentful Paint). */
  drawn: number;
  /**
   * End of the last task of more than 50 ms before half a second without one, while nobody asks anything; the first
   * drawing where there is none.
   */
  quiet: number;
  /** How far things moved meanwhile (cumulative layout shift). */
  shift: number;
  /** What tasks took beyond 50 ms each, from the first drawing until the chart answers (total blocking time). */
  blocking: number;
}

interface Noted {
  answers: number;
  drawn: number;
  first: number;
  shift: number;
  tasks: { start: number; duration: number }[];
}

/**
 * Opens a page twice without a cache on a processor slowed `slower` times. The first time an arrow key is pressed in its
 * first chart over and over until it answers. The presses are the page's own events, since each of the browser's would
 * wait for a round trip; they come every 20 ms, so a time is late by that much at most, and by what the pressing costs.
 * The second time it is left alone: fifty presses a second keep a slow processor busy by themselves.
 */
export async function interactiveTime(
  context: BrowserContext,
  address: string,
  slower = 4
): Promise<InteractiveTime> {
  const asked = await opening(context, address, slower, true);
  const { quiet } = await opening(context, address, slower, false);
  return { ...asked, quiet };
}

async function opening(
  context: BrowserContext,
  address: string,
  slower: number,
  pressed: boolean
): Promise<InteractiveTime> {
  const page = await context.newPage();
  const tools = await context.newCDPSession(page);
  await tools.send('Network.setCacheDisabled', { cacheDisabled: true });
  await tools.send('Emulation.setCPUThrottlingRate', { rate: slower });
  await page.addInitScript((pressed) => {
    const noted: Noted = { answers: 0, drawn: 0, first: 0, shift: 0, tasks: [] };
    Object.assign(window, { noted });
    const watch = (type: string, note: (entry: PerformanceEntry) => void): void =>
      new PerformanceObserver((list) => list.getEntries().forEach(note)).observe({ type, buffered: true });
    watch('longtask', ({ startTime, duration }) => noted.tasks.push({ start: startTime, duration }));
    watch('largest-contentful-paint', ({ startTime }) => (noted.drawn = startTime));
    watch('layout-shift', (entry) => (noted.shift += (entry as PerformanceEntry & { value: number }).value));
    watch('paint', ({ name, startTime }) => {
      if (name === 'first-contentful-paint') noted.first = startTime;
    });
    if (!pressed) return;
    const press = setInterval(() => {
      const figure = [...document.querySelectorAll('figure')].find((one) =>
        one.querySelector('[role="application"]')
      );
      if (!figure) return;
      if (figure.querySelector('[aria-live]')?.textContent?.trim()) {
        noted.answers = performance.now();
        clearInterval(press);
        return;
      }
      figure
        .querySelector('[role="application"]')
        ?.dispatchEvent(new KeyboardEvent('keydown', { key: 'ArrowRight', bubbles: true, cancelable: true }));
    }, 20);
  }, pressed);
  await page.goto(address, { waitUntil: 'load' });
  if (pressed) await page.waitForFunction(() => (window as unknown as { noted: Noted }).noted.answers > 0);
  // Half a second of quiet, slowed as everything here is, and the last long task is told a moment after it ended.
  await page.waitForTimeout(1500);
  const noted = await page.evaluate(() => (window as unknown as { noted: Noted }).noted);
  await page.close();
  const blocking = noted.tasks
    .filter(({ start }) => start >= noted.first && start <= noted.answers)
    .reduce((sum, { duration }) => sum + Math.max(0, duration - 50), 0);
  let quiet = noted.first;
  for (const { start, duration } of noted.tasks)
    if (start - quiet < 500) quiet = Math.max(quiet, start + duration);
  return { answers: noted.answers, drawn: noted.drawn, quiet, shift: noted.shift, blocking };
}
