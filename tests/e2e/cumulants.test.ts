import { gzipSync } from 'node:zlib';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, openAuditPage } from './support/axe';
import { complaintsOf } from './support/complaints';
import { layoutFaults } from './support/layout-faults';
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

async function open(path: string, width = 1280): Promise<{ page: Page; complaints: string[] }> {
  const page = await browser.newPage({ viewport: { width, height: 900 }, reducedMotion: 'reduce' });
  const complaints = complaintsOf(page);
  await page.goto(server.address + path, { waitUntil: 'networkidle' });
  return { page, complaints };
}

const focused = (page: Page): Promise<string> => page.evaluate(() => document.activeElement?.id ?? '');

const OVER =
  '/cumulants#mean=4&mean-error=0.05&variance=4.9&variance-error=0.1&third=7&third-error=0.6&trials=64';

describe('published cumulants', () => {
  it('are judged from the keyboard alone, and the address opens the same answer', async () => {
    const { page, complaints } = await open('/cumulants');
    await page.locator('#mean').focus();
    for (const text of ['4', '0.05', '4.9', '0.1', '7', '0.6']) {
      await page.keyboard.type(text);
      await page.keyboard.press('Tab');
    }
    await page.locator('#trials').fill('64');
    await page.keyboard.press('Enter');
    const heading = page.locator('#answer-heading');
    await heading.waitFor();
    expect(await heading.textContent()).toMatch(
      /No independent trials have these cumulants: the variance is above/
    );
    await expect.poll(() => focused(page)).toBe('answer-heading');
    expect(page.url()).toBe(server.address + OVER);
    const again = await open(OVER);
    await again.page.locator('#answer-heading').waitFor();
    expect(await again.page.locator('#answer-heading').textContent()).toBe(await heading.textContent());
    expect(await again.page.locator('#answer .verdict').textContent()).toMatch(/ruled out/i);
    await expect.poll(() => again.page.locator('#answer figure svg.drawn').count()).toBe(1);
    expect([...complaints, ...again.complaints]).toEqual([]);
    await again.page.close();
    await page.close();
  });

  it('asks nobody: judging sends nothing', async () => {
    const { page } = await open('/cumulants');
    const asked: string[] = [];
    await page.getByRole('button', { name: /as an example/ }).click();
    await page.locator('#answer-heading').waitFor();
    page.on('request', (request) => asked.push(request.url()));
    await page.locator('#variance').fill('0.5');
    await page.keyboard.press('Enter');
    await expect.poll(() => page.locator('#answer-heading').textContent()).toMatch(/Some|outside/);
    expect(asked).toEqual([]);
    await page.close();
  });

  it('refuses beside the field, keeps what was typed, and goes to the first mistake', async () => {
    const { page } = await open('/cumulants');
    await page.locator('#mean').fill('70');
    await page.locator('#mean-error').fill('0.1');
    await page.locator('#variance').fill('-3');
    await page.locator('#trials').fill('64');
    await page.keyboard.press('Enter');
    await expect.poll(() => focused(page)).toBe('mean');
    expect(await page.locator('#mean-problem').textContent()).toMatch(/above N = 64/);
    expect(await page.locator('#variance-problem').textContent()).toMatch(/negative variance/);
    // An error may be left out: rounding stands for it.
    expect(await page.locator('#variance-error-problem').count()).toBe(0);
    expect(await page.locator('#variance').inputValue()).toBe('-3');
    expect(await page.locator('#answer-heading').count()).toBe(0);
    await page.close();
  });

  it('without errors take the printed rounding for them, and say so', async () => {
    // Equal trials, N = 12, p = 0.1: variance 1.08 and third cumulant 0.864, which rounding puts over their limits.
    const { page } = await open('/cumulants#mean=1.2&variance=1.1&third=0.9&trials=12');
    await page.locator('#answer-heading').waitFor();
    const said = (await page.locator('#answer').textContent()) ?? '';
    expect(said).toContain('Some independent trials may have had these cumulants before they were rounded');
    expect(said).toContain('half a unit of the last digit typed is taken');
    expect(said).toContain('no p is told');
    await page.close();
  });

  it('that no counts have are answered in words', async () => {
    const { page } = await open(
      '/cumulants#mean=3&mean-error=0.01&variance=1&variance-error=0.01&third=0&third-error=0.05&fourth=-5&fourth-error=0.1'
    );
    await page.locator('#answer-heading').waitFor();
    expect(await page.locator('#answer-heading').textContent()).toMatch(/No counts at all have these/);
    await page.close();
  });

  it('say of an address that it has parts they cannot read', async () => {
    const { page } = await open('/cumulants#skew=3&mean=2');
    expect(await page.locator('main [role=alert]').textContent()).toContain('skew=3');
    expect(await page.locator('#mean').inputValue()).toBe('2');
    await page.close();
  });
});

describe.each([['cumulants', OVER, '#answer figure svg.drawn']])('/%s', (name, path, ready) => {
  it.each([320, 390, 1280, 1920])('cuts nothing off, %i px wide', async (width) => {
    const { page } = await open(path, width);
    await page.locator(ready).waitFor();
    expect(await layoutFaults(page)).toEqual([]);
    await page.close();
  });

  it('loads less than 90 kB of JavaScript before anyone does anything', async () => {
    const page = await browser.newPage();
    const scripts: Promise<number>[] = [];
    page.on('response', (response) => {
      if (/javascript/.test(response.headers()['content-type'] ?? ''))
        scripts.push(response.body().then((body) => gzipSync(body).length));
    });
    await page.goto(`${server.address}/${name}`, { waitUntil: 'networkidle' });
    const sizes = await Promise.all(scripts);
    expect(sizes.length).toBeGreaterThan(0);
    expect(sizes.reduce((sum, size) => sum + size, 0)).toBeLessThan(90_000);
    await page.close();
  });

  it('passes axe with an answer and with mistakes', async () => {
    const page = await openAuditPage(browser);
    await page.goto(server.address + path, { waitUntil: 'networkidle' });
    await page.locator(ready).waitFor();
    expect(await audit(page)).toEqual([]);
    await page.locator('#mean').fill('x');
    await page.keyboard.press('Enter');
    await page.locator('#mean-problem').waitFor();
    expect(await audit(page)).toEqual([]);
    await page.context().close();
    await screenshots(browser, server.address + path, name);
  });
});

describe('the head of every page', () => {
  it('leads to both', async () => {
    const { page } = await open('/');
    await page.getByRole('link', { name: 'Published cumulants' }).click();
    await page.waitForURL(/\/cumulants$/);
    await page.getByRole('link', { name: 'Plan the shots' }).click();
    await page.waitForURL(/\/plan$/);
    await page.close();
  });
});
