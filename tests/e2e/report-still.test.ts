import { readFileSync } from 'node:fs';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from './support/open-browser';
import { complaintsOf } from './support/complaints';
import { seedSharedReport, type SharedReport } from './support/shared-report';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

// A report stands as the server drew it, and a few parts of it are made live. Who comes to it from another page of the
// application has it drawn by the browser: both must be the same report.
/** For what comes when a busy machine gets to it. */
const PATIENT = { timeout: 20_000 };

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
async function openReport(
  way: 'drawn' | 'by the list',
  prepare: (page: Page) => Promise<void> = () => Promise.resolve()
): Promise<{ page: Page; complaints: string[] }> {
  const context = await browser.newContext({
    reducedMotion: 'reduce',
    viewport: { width: 1280, height: 900 }
  });
  const page = await context.newPage();
  await signIn(page, server.address, there.lead.email, there.lead.password);
  const complaints = complaintsOf(page);
  await prepare(page);
  const list = `/team/${there.team.slug}/reports`;
  if (way === 'drawn') await page.goto(`${server.address}${list}/${there.reportId}`);
  else {
    await page.goto(server.address + list, { waitUntil: 'networkidle' });
    await page.locator(`main a[href$="${there.reportId}"]`).first().click();
    await page.waitForURL(new RegExp(there.reportId));
  }
  await page.locator('#provenance').waitFor();
  // The notes of terms are written out last.
  await expect.poll(() => page.locator('.terms details > noscript').count(), PATIENT).toBe(0);
  return { page, complaints };
}

/** Requests for the script of remarks, which wait to be told whether it comes. */
const held = new WeakMap<Page, ((comes: boolean) => void)[]>();

/** The file of the built application that makes remarks live. */
function scriptOfRemarks(): string {
  const manifest = JSON.parse(
    readFileSync('.svelte-kit/output/client/.vite/manifest.json', 'utf8')
  ) as Record<string, { file: string }>;
  return manifest['src/lib/page/remarks/Remarks.svelte'].file;
}

/** The report as the server draws it, where what makes remarks live does not come until it is released. */
const slowReport = (): Promise<{ page: Page }> =>
  openReport('drawn', async (page) => {
    held.set(page, []);
    await page.route(`**/${scriptOfRemarks()}`, async (route) => {
      const comes = await new Promise<boolean>((tell) => held.get(page)!.push(tell));
      await (comes ? route.continue() : route.abort()).catch(() => undefined);
    });
  });

async function release(page: Page): Promise<void> {
  await expect.poll(() => held.get(page)!.length, PATIENT).toBeGreaterThan(0);
  const here = page.waitForResponse(`**/${scriptOfRemarks()}`);
  for (const tell of held.get(page)!.splice(0)) tell(true);
  await here;
  // Until it has run; nothing on the page tells of that.
  await page.waitForTimeout(500);
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

  it('keeps what is typed, and where, before a part is live', async () => {
    const { page } = await slowReport();
    await page.locator('#remarks-cumulants > summary').click();
    await page.locator('#remark-cumulants').click();
    await page.keyboard.type('Typed before live');
    await page.keyboard.press('ArrowLeft');
    await release(page);
    expect(await page.locator('#remark-cumulants').inputValue()).toBe('Typed before live');
    await page.keyboard.type('!');
    expect(await page.locator('#remark-cumulants').inputValue()).toBe('Typed before liv!e');
    const before = page.url();
    await page.locator('#remarks-cumulants').getByRole('button', { name: 'Make this remark' }).click();
    await page.locator('#remarks-cumulants').getByText('Typed before liv!e').waitFor();
    expect(page.url()).toBe(before);
    await page.context().close();
  });

  it('says that a part did not load when it is asked, and stays as it is', async () => {
    const { page } = await slowReport();
    await page.locator('#remarks-cumulants > summary').click();
    await page.locator('#remark-cumulants').fill('Typed without a network.');
    await expect.poll(() => held.get(page)!.length, PATIENT).toBeGreaterThan(0);
    for (const tell of held.get(page)!.splice(0)) tell(false);
    await page.getByText('This part of the page did not load').first().waitFor();
    expect(await page.locator('#remark-cumulants').inputValue()).toBe('Typed without a network.');
    await page.context().close();
  });
});
