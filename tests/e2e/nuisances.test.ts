import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
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

/** Counts of a ring, all even: pairs of 20 places with p = 0.1, rounded to 1000 shots; invented. */
const RING = 'counts=0:122,2:270,4:285,6:190,8:90,10:32,12:11&trials=40&geometry=ring-bonds&sum=1000';

/** 400 shots in four batches whose rate jumps; invented. */
const SHOTS = Array.from({ length: 400 }, (_, i) => ((i * 7) % 5) + (i < 200 ? 0 : 5));
const DRIFT = `shots=${SHOTS.join(',')}&batches=${['a*100', 'b*100', 'c*100', 'd*100'].join(',')}&trials=40&sum=400`;

describe('what can look like interaction, on the page', () => {
  it('proposes pairs where every count is even, and one button checks them', async () => {
    const page = await browser.newPage();
    const complaints = complaintsOf(page);
    await page.goto(`${server.address}/#${RING}`);
    await page.getByRole('button', { name: 'Check again, counting pairs' }).click();
    await page.waitForFunction(() => location.hash.includes('unit=pair'));
    await page.getByRole('button', { name: 'Check again, counting pairs' }).waitFor({ state: 'detached' });
    expect(await page.locator('#answer .verdict').textContent()).not.toMatch(/Ruled out/i);
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('draws the mean over time of a shot list, and says what is left within batches', async () => {
    const page = await browser.newPage({ viewport: { width: 390, height: 800 } });
    const complaints = complaintsOf(page);
    await page.goto(`${server.address}/#${DRIFT}`);
    const section = page.locator('#nuisances');
    await section
      .getByRole('heading', { name: /The mean leaves its limits in \d+ of 40 stretches/ })
      .waitFor();
    expect(await section.textContent()).toMatch(/Tested batch by batch and pooled, the variance is/);
    await section.getByText('The batches one by one', { exact: true }).click();
    expect(await section.locator('table tbody tr').count()).toBeGreaterThanOrEqual(4);
    const wide = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
    expect(wide).toBeLessThanOrEqual(0);
    if (process.env.SCREENSHOTS)
      await section.screenshot({ path: `${process.env.SCREENSHOTS}/drift-390.png` });
    expect(complaints).toEqual([]);
    await page.close();
  });
});
