import type { Page } from 'playwright-core';
import { beforeAll, describe, expect, it } from 'vitest';
import { inBrowser } from './support/in-browser';
import { seedLink, seedSharedReport } from './support/shared-report';
import { unrolled } from './support/unrolled';

// A report is laid out piece by piece: whoever asks for a place in it, or comes back to one, must find it there.
const PATIENT = { timeout: 20_000 };

const there = inBrowser();
let address: string;

beforeAll(async () => {
  address = there.server.address + (await seedLink(there.server, await seedSharedReport(there.server))).path;
});

const topOf = (page: Page, id: string): Promise<number> =>
  page.locator(id).evaluate((part) => Math.round(part.getBoundingClientRect().top));

describe('a place in a report', () => {
  it.each(['#tails', '#nuisances', '#quote'])('is where its address leads: %s', async (hash) => {
    const page = await there.browser.newPage({
      viewport: { width: 1280, height: 900 },
      reducedMotion: 'reduce'
    });
    await page.goto(address + hash);
    await unrolled(page);
    await expect.poll(async () => Math.abs(await topOf(page, hash)), PATIENT).toBeLessThan(60);
    await page.close();
  });

  it('is where a link of the page leads, before all is laid out', async () => {
    const page = await there.browser.newPage({
      viewport: { width: 1280, height: 900 },
      reducedMotion: 'reduce'
    });
    await page.goto(address);
    await page.locator('a[href="#method"]').first().click();
    await unrolled(page);
    await expect.poll(async () => Math.abs(await topOf(page, '#method')), PATIENT).toBeLessThan(60);
    await page.close();
  });

  it('is found again by the way back', async () => {
    const page = await there.browser.newPage({
      viewport: { width: 1280, height: 900 },
      reducedMotion: 'reduce'
    });
    await page.goto(address, { waitUntil: 'networkidle' });
    await unrolled(page);
    await page.evaluate(() => document.querySelector('#cumulants')!.scrollIntoView());
    const before = await topOf(page, '#cumulants');
    await page.waitForTimeout(300);
    // By the keyboard: a mouse would have to scroll to the link first.
    await page
      .locator('a[href="/plan"]')
      .first()
      .evaluate((link) => link.focus({ preventScroll: true }));
    await page.keyboard.press('Enter');
    await page.waitForURL('**/plan');
    await page.getByRole('heading', { level: 1 }).waitFor();
    await page.goBack();
    await page.locator('#cumulants').waitFor();
    await expect
      .poll(async () => Math.abs((await topOf(page, '#cumulants')) - before), PATIENT)
      .toBeLessThan(60);
    await page.close();
  });
});

describe('a chart of a report', () => {
  it.each([390, 1920])('is drawn anew when the window becomes %i wide', async (width) => {
    const page = await there.browser.newPage({
      viewport: { width: 1280, height: 900 },
      reducedMotion: 'reduce'
    });
    await page.goto(address, { waitUntil: 'networkidle' });
    await unrolled(page);
    const chart = page.locator('#tails figure svg[role="application"]');
    await chart.scrollIntoViewIfNeeded();
    await page.setViewportSize({ width, height: 900 });
    await chart.scrollIntoViewIfNeeded();
    const scale = (): Promise<number> =>
      chart.evaluate((svg: SVGSVGElement) => svg.getBoundingClientRect().width / svg.viewBox.baseVal.width);
    await expect.poll(async () => Math.abs((await scale()) - 1), PATIENT).toBeLessThan(0.02);
    await page.close();
  });
});
