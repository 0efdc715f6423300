import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from './support/open-browser';
import { complaintsOf } from './support/complaints';
import { seedSharedReport, type SharedReport } from './support/shared-report';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

// A report stands as the server drew it, and a few parts of it are made live. Who comes to it from another page of the
// application has it drawn by the browser: both must be the same report.
let server: RunningServer;
let browser: Browser;
let there: SharedReport;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
  there = await seedSharedReport(server);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

/** Opens the report as the server draws it, or by the list of reports. */
async function openReport(way: 'drawn' | 'by the list'): Promise<{ page: Page; complaints: string[] }> {
  const context = await browser.newContext({
    reducedMotion: 'reduce',
    viewport: { width: 1280, height: 900 }
  });
  const page = await context.newPage();
  await signIn(page, server.address, there.lead.email, there.lead.password);
  const complaints = complaintsOf(page);
  const list = `/team/${there.team.slug}/reports`;
  if (way === 'drawn') await page.goto(`${server.address}${list}/${there.reportId}`);
  else {
    await page.goto(server.address + list, { waitUntil: 'networkidle' });
    await page.locator(`main a[href$="${there.reportId}"]`).first().click();
    await page.waitForURL(new RegExp(there.reportId));
  }
  await page.locator('#provenance').waitFor();
  // The notes of terms are written out last.
  await expect.poll(() => page.locator('.terms details > noscript').count()).toBe(0);
  return { page, complaints };
}

const words = (page: Page): Promise<string> =>
  page.locator('main').evaluate((main) => {
    const copy = main.cloneNode(true) as HTMLElement;
    // What a side note leaves out at this width, and what only the browser's own drawing has: charts at its own size.
    copy
      .querySelectorAll('noscript, .fold, svg, [aria-live], [role="status"]')
      .forEach((one) => one.remove());
    return (copy.textContent ?? '').replace(/\s+/g, ' ');
  });

describe('a report', () => {
  it('says the same, drawn by the server or by the browser', async () => {
    const drawn = await openReport('drawn');
    const made = await openReport('by the list');
    for (const { page } of [drawn, made])
      for (const id of ['#quote', '#links', '#nuisances', '#tests']) {
        await page.locator(id).scrollIntoViewIfNeeded();
        await page.waitForLoadState('networkidle');
      }
    expect(await words(made.page)).toBe(await words(drawn.page));
    expect([...drawn.complaints, ...made.complaints]).toEqual([]);
    await drawn.page.context().close();
    await made.page.context().close();
  });

  it.each(['drawn', 'by the list'] as const)('answers its reader, %s', async (way) => {
    const { page, complaints } = await openReport(way);

    const word = page.locator('#tests a', { hasText: 'smallest p' }).first();
    await word.click();
    expect(await page.locator('#term-smallest-p').isVisible()).toBe(true);
    await page.keyboard.press('Escape');
    expect(await page.locator('#term-smallest-p').isVisible()).toBe(false);

    await page.evaluate(() =>
      Object.assign(window, { print: () => Object.assign(window, { printed: true }) })
    );
    await page.getByRole('button', { name: 'Print this report' }).click();
    expect(await page.evaluate(() => 'printed' in window)).toBe(true);

    await page.getByRole('radio', { name: 'LaTeX' }).click();
    await page.getByRole('button', { name: 'Copy the result in LaTeX' }).waitFor();

    await page.getByText('Remark on the tests').click();
    await page.locator('#remark-tests').fill(`Seen ${way}.`);
    await page.locator('#remarks-tests').getByRole('button', { name: 'Make this remark' }).click();
    await page.locator('#remarks-tests').getByText(`Seen ${way}.`).waitFor();

    await page.getByRole('button', { name: 'Make a link' }).click();
    await page.getByLabel('Blind').waitFor();
    expect(complaints).toEqual([]);
    await page.context().close();
  });
});
