import type { Diagnosis } from '$lib/stats/types';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from './support/open-browser';
import { seedLink, seedSharedReport } from './support/shared-report';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let browser: Browser;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

describe('a chart', () => {
  it('keeps what a finger touched, walks to its ends by keys, and forgets it on Escape', async () => {
    const { path } = await seedLink(server, await seedSharedReport(server));
    // The largest count is 8; the law is drawn to 10, which it gives once in 19 000 shots.
    const atLast = /^Count 10:/;
    const page = await browser.newPage({ hasTouch: true, viewport: { width: 390, height: 800 } });
    await page.goto(server.address + path, { waitUntil: 'networkidle' });
    const figure = page.locator('figure', { has: page.locator('#distribution-title') });
    const said = figure.locator('[aria-live]');
    const chart = figure.getByRole('application');
    await chart.scrollIntoViewIfNeeded();
    const box = (await chart.boundingBox())!;
    await page.touchscreen.tap(box.x + box.width - 6, box.y + 60);
    await expect.poll(() => said.textContent()).toMatch(atLast);
    await page.waitForTimeout(200);
    expect(await said.textContent()).toMatch(atLast);
    await chart.focus();
    for (const [key, words] of [
      ['Home', /^Count 0:/],
      ['ArrowRight', /^Count 1:/],
      ['PageUp', atLast],
      ['ArrowLeft', /^Count 9:/],
      ['Escape', /^$/],
      ['End', atLast]
    ] as const) {
      await page.keyboard.press(key);
      await expect.poll(() => said.textContent(), { message: key }).toMatch(words);
    }
    await page.close();
  });

  it('of 10 000 counts shows a page of its table at a time and says so', async () => {
    const large = await seedSharedReport(server, tenThousand);
    const { path } = await seedLink(server, large);
    const page = await browser.newPage();
    await page.goto(server.address + path, { waitUntil: 'networkidle' });
    const figure = page.locator('figure', { has: page.locator('#distribution-title') });
    await figure.locator('summary').click();
    await figure.getByText('Rows 1 to 100 of 10\u202f000. The CSV file has all.').waitFor();
    await figure.getByRole('button', { name: /^Last rows/ }).click();
    await figure.getByText('Rows 9\u202f901 to 10\u202f000').waitFor();
    expect(await figure.getByRole('row').count()).toBe(101);
    // A hundred rows of ten or so cells, and a drawing that thins its marks.
    expect(await figure.locator('*').count()).toBeLessThan(1500);
    await figure.getByRole('application').focus();
    await page.keyboard.press('End');
    expect(await figure.locator('[aria-live]').textContent()).toMatch(/^Count 9\u202f999:/);
    await page.close();
  });
});

/** Makes a document one of 10 000 counts, with a bell of invented shares. */
function tenThousand(document: Diagnosis): void {
  const shots = 300_000_000;
  const share = (count: number): number => Math.exp(-(((count - 5000) / 900) ** 2) / 2) / 2256;
  const at = Array.from({ length: 10_000 }, (_, count) => ({
    count,
    density: count / 20_000,
    fitted: share(count)
  }));
  const spread = (value: number) => ({ low: value * 0.98, high: value * 1.02 + 1e-9 });
  Object.assign(document.data, { shots, trials: 20_000 });
  document.distribution = at.map(({ count, density, fitted }) => ({
    ...{ count, density, shots: 1 + Math.round(fitted * shots), observed: fitted, fitted, lump: false },
    ...spread(fitted)
  }));
  document.rate = {
    ...document.rate,
    scale: 20_000,
    horizon: Math.log(shots) / 20_000,
    points: at.map(({ count, density, fitted }) => {
      const rate = -Math.log(fitted + 1e-12) / 20_000;
      return { count, density, empirical: rate, ...spread(rate), fitted: rate, limit: rate, gaussian: rate };
    })
  };
  document.tails.points = at.map(({ count, fitted }) => ({
    ...{
      count,
      side: count < 5000 ? ('low' as const) : ('high' as const),
      shots: 1,
      observed: fitted,
      fitted
    },
    ...{ chernoff: fitted, meanChernoff: fitted, hoeffding: fitted * 2, ...spread(fitted) }
  }));
}
