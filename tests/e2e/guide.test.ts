import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, openAuditPage } from './support/axe';
import { answerOf } from './support/check-page';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
import { screenshots } from './support/screenshots';
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

async function open(path = '/guide', width = 1280): Promise<{ page: Page; complaints: string[] }> {
  const page = await browser.newPage({ viewport: { width, height: 900 }, reducedMotion: 'reduce' });
  const complaints = complaintsOf(page);
  await page.addInitScript(() => {
    Object.assign(window, { shift: 0 });
    new PerformanceObserver((list) => {
      for (const entry of list.getEntries() as unknown as { value: number; hadRecentInput: boolean }[])
        if (!entry.hadRecentInput) (window as unknown as { shift: number }).shift += entry.value;
    }).observe({ type: 'layout-shift', buffered: true });
  });
  await page.goto(server.address + path, { waitUntil: 'networkidle' });
  return { page, complaints };
}

describe('the guide', () => {
  it('has its headings in order, draws its charts with tables, and complains of nothing', async () => {
    const { page, complaints } = await open();
    const levels = await page
      .locator('main :is(h1, h2, h3)')
      .evaluateAll((all) => all.map((h) => +h.tagName[1]));
    expect(levels[0]).toBe(1);
    levels.slice(1).forEach((level, i) => expect(level - levels[i]).toBeLessThanOrEqual(1));
    expect(levels.filter((level) => level === 2)).toHaveLength(10);
    const charts = page.getByRole('application');
    expect(await charts.count()).toBe(9);
    const first = page.locator('figure').first();
    await first.locator('summary', { hasText: 'As table' }).click();
    expect(await first.getByRole('row').count()).toBeGreaterThan(20);
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('tells of each dataset that it is invented, and opens it on the first page', async () => {
    const { page } = await open();
    for (const title of await page.locator('figcaption').allTextContents())
      expect(title).toContain('invented');
    await page.getByRole('link', { name: /Check “Forty shots” yourself/ }).click();
    expect(await answerOf(page)).toMatch(/cannot tell/);
    await page.close();
  });

  it('opens a term from the keyboard, and gives the focus back on Escape', async () => {
    const { page } = await open();
    const link = page.locator('#tests table a', { hasText: 'smallest p' });
    await link.focus();
    await page.keyboard.press('Enter');
    const note = page.locator('#term-smallest-p');
    expect(await note.isVisible()).toBe(true);
    expect(await page.evaluate(() => document.activeElement?.tagName)).toBe('SUMMARY');
    await page.keyboard.press('Escape');
    expect(await note.isVisible()).toBe(false);
    expect(await link.evaluate((element) => element === document.activeElement)).toBe(true);
    await page.close();
  });

  it('sets every formula as MathML inside its column, and every link to a term leads somewhere', async () => {
    const { page } = await open();
    await page
      .locator('.terms details')
      .evaluateAll((all) => all.forEach((fold) => fold.setAttribute('open', '')));
    const wide = await page
      .locator('.formula')
      .evaluateAll((all) => all.filter((f) => f.scrollWidth > f.clientWidth + 1).map((f) => f.textContent));
    expect(wide).toEqual([]);
    const space = await page
      .locator('math mi')
      .first()
      .evaluate((element) => element.namespaceURI);
    expect(space).toBe('http://www.w3.org/1998/Math/MathML');
    const lost = await page
      .locator('main a[href^="#"]')
      .evaluateAll((all) =>
        all.map((a) => a.getAttribute('href')!).filter((h) => !document.getElementById(h.slice(1)))
      );
    expect(lost).toEqual([]);
    await page.close();
  });

  it.each([320, 390, 1280])('does not scroll sideways or move while it loads at %i px', async (width) => {
    const { page } = await open('/guide', width);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width);
    // 0.1 is the limit of a good page by the measure of web vitals.
    expect(await page.evaluate(() => (window as unknown as { shift: number }).shift)).toBeLessThan(0.1);
    await page.close();
  });

  it.each(['/guide', '/guide/terms'])('%s passes axe', async (path) => {
    const page = await openAuditPage(browser);
    await page.goto(server.address + path, { waitUntil: 'networkidle' });
    await page
      .locator('.terms details')
      .evaluateAll((all) => all.forEach((fold) => fold.setAttribute('open', '')));
    expect(await audit(page)).toEqual([]);
    await page.context().close();
    await screenshots(browser, server.address + path, path.slice(1).replace('/', '-'));
  });
});
