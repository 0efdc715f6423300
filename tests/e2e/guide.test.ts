import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, openAuditPage } from './support/axe';
import { answerOf, fill, check, openCheck, WELDON_ADDRESS } from './support/check-page';
import { complaintsOf } from './support/complaints';
import { layoutFaults } from './support/layout-faults';
import { openBrowser } from './support/open-browser';
import { screenshots } from './support/screenshots';
import { startServer, type RunningServer } from './support/start-server';
import { watchShifts } from './support/watch-page';

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
  await page.goto(server.address + path, { waitUntil: 'networkidle' });
  return { page, complaints };
}

/** Opens every note of a term. */
const unfold = (page: Page): Promise<void> =>
  page.locator('.terms details').evaluateAll((all) => all.forEach((fold) => fold.setAttribute('open', '')));

/** Formulas that are wider than their column. */
const wideFormulas = (page: Page): Promise<(string | null)[]> =>
  page
    .locator('.term-formula')
    .evaluateAll((all) => all.filter((f) => f.scrollWidth > f.clientWidth + 1).map((f) => f.textContent));

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
    // The guide has an answer of its own, under the same heading.
    await page.waitForURL(/\/#(counts|shots)=/);
    await page.locator('#answer-heading', { hasText: /shots/ }).waitFor();
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
    await unfold(page);
    expect(await wideFormulas(page)).toEqual([]);
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

  describe.each(['/guide', '/guide/terms'])('%s', (path) => {
    it.each([320, 390, 1280, 1920])(
      'holds still while it loads and cuts nothing off, %i px wide',
      async (width) => {
        const page = await browser.newPage({ viewport: { width, height: 900 }, reducedMotion: 'reduce' });
        const shifts = await watchShifts(page);
        await page.goto(server.address + path, { waitUntil: 'networkidle' });
        if (path === '/guide') await page.locator('figure svg.drawn').last().waitFor();
        // What is far below the first screen counts as well.
        await page.evaluate(() => scrollTo(0, document.body.scrollHeight));
        await page.waitForTimeout(200);
        const { sum, what } = await shifts();
        expect(sum, what.join('\n')).toBeLessThan(0.01);
        await unfold(page);
        expect(await layoutFaults(page)).toEqual([]);
        expect(await wideFormulas(page)).toEqual([]);
        await page.close();
      }
    );
  });

  it.each(['/guide', '/guide/terms'])('%s passes axe', async (path) => {
    const page = await openAuditPage(browser);
    await page.goto(server.address + path, { waitUntil: 'networkidle' });
    await unfold(page);
    expect(await audit(page)).toEqual([]);
    await page.context().close();
    await screenshots(browser, server.address + path, path.slice(1).replace('/', '-'));
  });
});

describe('the notes of a result', () => {
  it.each([390, 1280, 1920])('fit their margin, every formula whole, %i px wide', async (width) => {
    const { page, complaints } = await openCheck(browser, `${server.address}/#${WELDON_ADDRESS}`, {
      viewport: { width, height: 900 }
    });
    await answerOf(page);
    await unfold(page);
    expect(await page.locator('.term-formula').count()).toBeGreaterThan(40);
    expect(await wideFormulas(page)).toEqual([]);
    expect(await layoutFaults(page)).toEqual([]);
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('open from a table header by the keyboard and keep counts too many for an address', async () => {
    const { page } = await openCheck(browser, server.address);
    // A list of 1 500 shots, about 3 000 characters: an address carries 2 000.
    const shots = Array.from({ length: 1500 }, (_, i) => [3, 5, 4, 2, 6, 4, 1, 3, 4, 5, 7][(i * i) % 11]);
    await fill(page, shots.join('\n'), '20');
    await check(page);
    const answer = await answerOf(page);
    const address = page.url();
    const link = page.locator('#tests thead a', { hasText: 'smallest p' });
    await link.focus();
    await page.keyboard.press('Enter');
    const note = page.locator('#term-smallest-p');
    expect(await note.isVisible()).toBe(true);
    await page.keyboard.press('Escape');
    expect(await note.isVisible()).toBe(false);
    expect(await link.evaluate((element) => element === document.activeElement)).toBe(true);
    const beside = page.context().waitForEvent('page');
    await page
      .locator('#tests')
      .getByRole('link', { name: /More in the guide/ })
      .click();
    const guide = await beside;
    await guide.waitForURL(/\/guide#tests$/);
    expect(page.url()).toBe(address);
    expect(await answerOf(page)).toBe(answer);
    await page.getByText('Change the counts or the options').click();
    const kept = await page.getByLabel('The counts', { exact: true }).inputValue();
    expect(kept.split('\n')).toHaveLength(1500);
    await page.context().close();
  });
});
