import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, openAuditPage } from './support/axe';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
import { startServer, type RunningServer } from './support/start-server';
import { watchScripts, watchShifts } from './support/watch-page';

let server: RunningServer;
let browser: Browser;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

describe('the first page', () => {
  it('answers, breaks no content security policy and logs no error', async () => {
    const page = await browser.newPage();
    const complaints = complaintsOf(page);
    const response = await page.goto(server.address, { waitUntil: 'networkidle' });
    expect(response?.status()).toBe(200);
    const headers = response?.headers() ?? {};
    expect(headers['content-security-policy']).toMatch(/script-src 'self' 'nonce-/);
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['referrer-policy']).toBe('same-origin');
    expect(await page.locator('h1').count()).toBe(1);
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('would notice a breach of the policy', async () => {
    const page = await browser.newPage();
    const complaints = complaintsOf(page);
    await page.goto(server.address);
    await page.evaluate(() => {
      const script = document.createElement('script');
      script.textContent = 'window.breached = true';
      document.body.append(script);
    });
    await expect.poll(() => complaints.join('\n')).toMatch(/Content Security Policy/i);
    expect(await page.evaluate(() => 'breached' in window)).toBe(false);
    await page.close();
  });

  it('passes axe', async () => {
    const page = await openAuditPage(browser);
    await page.goto(server.address, { waitUntil: 'networkidle' });
    expect(await audit(page)).toEqual([]);
    await page.context().close();
  });

  it('loads less than 90 kB of JavaScript before anyone does anything', async () => {
    const page = await browser.newPage();
    // The worker's files come when a histogram is checked.
    const scripts = watchScripts(page);
    await page.goto(server.address, { waitUntil: 'networkidle' });
    const { files, bytes } = await scripts();
    expect(files.length).toBeGreaterThan(0);
    expect(files.filter((url) => /worker/i.test(url))).toEqual([]);
    expect(bytes).toBeLessThan(90_000);
    await page.close();
  });

  it.each([390, 1280])('does not move while a histogram is checked, %i px wide', async (width) => {
    const page = await browser.newPage({ viewport: { width, height: 900 } });
    const shifts = await watchShifts(page);
    await page.goto(server.address, { waitUntil: 'networkidle' });
    await page.locator('#counts').fill('0 120\n1 300\n2 310\n3 170\n4 70\n5 20\n6 5');
    await page.getByRole('button', { name: 'Check this histogram' }).click();
    await page.locator('#answer-heading').waitFor();
    await page.waitForTimeout(500);
    const { sum, what } = await shifts();
    expect(sum, what.join('\n')).toBeLessThan(0.1);
    await page.close();
  });

  it.each([320, 390, 1280])('does not scroll sideways at %i px', async (width) => {
    const page = await browser.newPage({ viewport: { width, height: 900 } });
    await page.goto(server.address, { waitUntil: 'networkidle' });
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width);
    await page.close();
  });
});
