import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, openAuditPage } from './support/axe';
import { openBrowser } from './support/open-browser';
import { pageOf as open, real, reportsSetting, type ReportsSetting } from './support/reports-setting';
import type { SeededPerson } from './support/seed-people';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let browser: Browser;
let { lead, observer, root, reports } = {} as ReportsSetting;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
  ({ lead, observer, root, reports } = await reportsSetting(server));
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

const pageOf = (person: SeededPerson, options: Parameters<Browser['newContext']>[0] = {}) =>
  open(browser, server, person, options);

describe('the table of reports', () => {
  it('searches, filters and sorts on the server, and keeps it all in the address', async () => {
    const { page, complaints, context } = await pageOf(observer);
    await page.goto(root, { waitUntil: 'networkidle' });
    const rows = page.locator('main tbody tr');
    expect(await rows.count()).toBe(4);
    await page.getByLabel('Search').fill('tern');
    await expect.poll(() => rows.count()).toBe(3);
    expect(page.url()).toContain('q=tern');
    await page.getByRole('link', { name: 'Clear all filters' }).click();
    await expect.poll(() => rows.count()).toBe(4);
    // Newest first, Fast quench leads already; from Z to A it comes last.
    await page.getByRole('link', { name: 'Dataset', exact: true }).click();
    await page.waitForURL(/sort=dataset&order=up/);
    await page.getByRole('link', { name: 'Dataset', exact: true }).click();
    await expect.poll(() => rows.last().textContent()).toContain('Fast quench');
    await page.waitForLoadState('networkidle');
    await page.goto(`${root}?device=Knot`, { waitUntil: 'networkidle' });
    expect(await rows.count()).toBe(1);
    expect(real(complaints)).toEqual([]);
    await context.close();
  });

  it('works without JavaScript', async () => {
    const { page, context } = await pageOf(observer, { javaScriptEnabled: false });
    await page.goto(root);
    await page.getByLabel('Search').fill('fast');
    await page.getByRole('button', { name: 'Show' }).click();
    await page.waitForURL(/q=fast/);
    expect(await page.locator('main tbody tr').count()).toBe(1);
    await context.close();
  });
});

describe('two reports side by side', () => {
  it('show what changed first, and fold what did not', async () => {
    const { page, complaints, context } = await pageOf(observer);
    await page.goto(`${root}/${reports[1]}`, { waitUntil: 'networkidle' });
    await page.getByLabel('Set beside').selectOption(reports[0]);
    await page.getByRole('button', { name: 'Compare the two reports' }).click();
    await page.getByRole('heading', { name: 'What changed' }).waitFor();
    const options = page.getByRole('table', { name: 'Options' }).first();
    expect(await options.locator('tbody').innerText()).toMatch(/Trials in a shot, N\s+3\s+12/);
    expect(await page.getByText('Asked for differently: Trials in a shot, N.').count()).toBe(1);
    const folded = page.locator('details').filter({ hasText: 'the same in both' });
    expect(await folded.getAttribute('open')).toBeNull();
    expect(real(complaints)).toEqual([]);
    await context.close();
  });

  it('are refused with words when they are of two datasets, or one', async () => {
    const { page, context } = await pageOf(observer);
    const response = await page.goto(`${root}/compare?a=${reports[0]}&b=${reports[0]}`);
    expect(response!.status()).toBe(400);
    expect(await page.textContent('main')).toContain('Choose two different reports');
    await context.close();
  });
});

describe('access', () => {
  const places = (): [string, string][] => [
    ['reports', root],
    ['report', `${root}/${reports[0]}#remarks-law`],
    ['compare', `${root}/compare?a=${reports[0]}&b=${reports[1]}`]
  ];

  it.each(['light', 'dark'] as const)('axe finds nothing, %s', async (colorScheme) => {
    const page = await openAuditPage(browser, { colorScheme, reducedMotion: 'reduce' });
    await signIn(page, server.address, lead.email, lead.password);
    for (const [name, address] of places()) {
      await page.goto(address, { waitUntil: 'networkidle' });
      for (const fold of await page.locator('main > details > summary, section > details > summary').all())
        await fold.click();
      expect(await audit(page), name).toEqual([]);
    }
    await page.context().close();
  });

  it.each([320, 390, 1280])('nothing scrolls sideways at %i px', async (width) => {
    const { page, context } = await pageOf(lead, { viewport: { width, height: 900 } });
    for (const [name, address] of places()) {
      await page.goto(address, { waitUntil: 'networkidle' });
      expect(await page.evaluate(() => document.documentElement.scrollWidth), name).toBeLessThanOrEqual(
        width
      );
      if (process.env.SCREENSHOTS)
        await page.screenshot({ path: `${process.env.SCREENSHOTS}/${name}-${width}.png`, fullPage: true });
    }
    await context.close();
  });
});
