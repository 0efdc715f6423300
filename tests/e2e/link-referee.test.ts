import { remarksOf } from '$lib/server/services/remarks/remarks-of';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, openAuditPage } from './support/axe';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
import { withDatabaseOf } from './support/seed-people';
import { screenshots } from './support/screenshots';
import { seedLink, seedSharedReport, type SharedReport } from './support/shared-report';
import { startServer, type RunningServer } from './support/start-server';

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

async function open(path: string, options = {}): Promise<{ page: Page; complaints: string[] }> {
  const page = await browser.newPage({ reducedMotion: 'reduce', ...options });
  const complaints = complaintsOf(page);
  await page.goto(server.address + path, { waitUntil: 'networkidle' });
  return { page, complaints };
}

const recompute = (page: Page) => page.getByRole('button', { name: 'Recompute this report' }).click();

describe('the referee’s page', () => {
  it('recomputes the report in this browser, the same byte for byte', async () => {
    const { path } = await seedLink(server, there, { blind: true });
    const { page, complaints } = await open(path);
    const sent: string[] = [];
    page.on('request', (request) => sent.push(`${request.method()} ${new URL(request.url()).pathname}`));
    await recompute(page);
    await page.getByText('The same, byte for byte.').waitFor();
    const sum = await page.locator('#recompute code').first().textContent();
    expect(sum).toMatch(/^[0-9a-f]{64}$/);
    expect(await page.locator('#provenance').textContent()).toContain(sum);
    expect(sent.filter((line) => !/^GET .*\.js$/.test(line))).toEqual([]);
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('names the values of a document that was tampered with', async () => {
    const forged = await seedSharedReport(server, (document) => {
      document.moments.variance.value = 1.5;
      document.answer.because.push('Trust us.');
      document.engine.version = '0.0.9';
    });
    const { path } = await seedLink(server, forged);
    const { page } = await open(path);
    await recompute(page);
    await page.getByText('Not the same: 3 values differ.').waitFor();
    expect(await page.locator('#recompute tbody th').allTextContents()).toEqual([
      'engine.version',
      'moments.variance.value',
      'answer.because.length'
    ]);
    const cells = await page.locator('#recompute tbody tr').nth(1).locator('td').allTextContents();
    expect(cells[0]).toBe('1.5');
    expect(Number(cells[1])).toBeGreaterThan(2);
    expect(await page.locator('#recompute').textContent()).toMatch(/made by engine 0\.0\.9; this page runs/);
    await page.close();
  });

  it('explains why it cannot recompute where the counts are kept back', async () => {
    const { path } = await seedLink(server, there, { shows: 'report' });
    const { page, complaints } = await open(path);
    expect(await page.getByRole('button', { name: 'Recompute this report' }).isDisabled()).toBe(true);
    expect(await page.locator('#recompute').textContent()).toMatch(/keeps the counts back/);
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('tells claims that agree from one that fails, and from one the data cannot tell', async () => {
    const { path } = await seedLink(server, there, { blind: true });
    const { page, complaints } = await open(path);
    const row = (i: number) => page.locator('#claims fieldset').nth(i);
    const type = async (i: number, value: string, uncertainty = '') => {
      await row(i).getByLabel('Claimed value').fill(value);
      await row(i).getByLabel('Stated uncertainty').fill(uncertainty);
    };
    // 5930 defects in 2273 shots: 2.609.
    await type(0, '2.61', '0.05');
    await type(1, '4,9', '0.1');
    await page.getByRole('button', { name: 'Add a claim' }).click();
    await type(3, '1.0', '0.2');
    await page.getByRole('button', { name: 'Check these claims' }).click();
    await page.getByText('3 claims: 1 agreed with, 1 disagreed with, 1 that the data cannot tell.').waitFor();
    expect(await row(0).textContent()).toMatch(/Agrees\./);
    expect(await row(1).textContent()).toMatch(/Does not agree\. The report has/);
    expect(await row(3).textContent()).toMatch(/Cannot tell\./);
    await type(1, 'four');
    await page.getByRole('button', { name: 'Check these claims' }).click();
    await expect.poll(() => row(1).textContent()).toMatch(/The claimed value\s+is not a number/);
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('takes a remark, under the name a stranger gives, that the team can read', async () => {
    const { path } = await seedLink(server, there, { allowsRemarks: true });
    const { page, complaints } = await open(path);
    await page.getByLabel('Sign your remarks as').fill('Referee Two');
    const remarks = page.locator('#remarks-tails');
    await remarks.locator('summary').first().click();
    await remarks.getByLabel('A new remark').fill('Why is the last count so frequent?');
    await remarks.getByRole('button', { name: 'Make this remark' }).click();
    await remarks.getByText('1 remark on').waitFor();
    expect(await remarks.textContent()).toMatch(/Referee Two/);
    // Kit stops reading a page's data once it has them all; the browser calls that aborted.
    expect(complaints.filter((line) => !/__data\.json\S* net::ERR_ABORTED/.test(line))).toEqual([]);
    const kept = await withDatabaseOf(server, (db) =>
      remarksOf(db, { reportId: there.reportId, via: 'team', actor: there.actor })
    );
    expect(kept.map(({ section, remarks }) => [section, remarks[0].by])).toContainEqual([
      'tails',
      'Referee Two'
    ]);
    await page.close();
  });

  it('takes remarks without JavaScript too', async () => {
    const { path } = await seedLink(server, there, { allowsRemarks: true, blind: true });
    const context = await browser.newContext({ javaScriptEnabled: false });
    const page = await context.newPage();
    await page.goto(server.address + path);
    const remarks = page.locator('#remarks-answer');
    await remarks.locator('summary').first().click();
    await remarks.locator('textarea').fill('Plain as paper.');
    await remarks.getByRole('button', { name: 'Make this remark' }).click();
    await page.getByText('Plain as paper.').waitFor();
    await context.close();
  });

  it('takes no remarks where the link allows none, not even from a script', async () => {
    const { path } = await seedLink(server, there);
    const { page } = await open(path);
    expect(await page.locator('[id^=remarks-]').count()).toBe(0);
    const answer = await page.request.post(`${server.address}${path}?/remark`, {
      form: { section: 'answer', threadId: '', body: 'I was here.' },
      headers: { origin: server.address, accept: 'application/json' }
    });
    expect(await answer.text()).toMatch(/not-allowed/);
    await page.close();
  });

  it.each(['report-and-counts', 'report'] as const)('axe finds nothing, %s', async (shows) => {
    const { path } = await seedLink(server, there, { shows, allowsRemarks: true });
    const page = await openAuditPage(browser, { reducedMotion: 'reduce' });
    await page.goto(server.address + path, { waitUntil: 'networkidle' });
    await page.locator('#claims fieldset').first().getByLabel('Claimed value').fill('x');
    await page.getByRole('button', { name: 'Check these claims' }).click();
    if (shows === 'report-and-counts') {
      await recompute(page);
      await page.getByText('The same, byte for byte.').waitFor();
    }
    expect(await audit(page)).toEqual([]);
    await page.context().close();
  });

  it('does not scroll sideways at 390 px', async () => {
    const { path } = await seedLink(server, there, { allowsRemarks: true });
    const { page } = await open(path, { viewport: { width: 390, height: 900 } });
    await recompute(page);
    await page.getByText('The same, byte for byte.').waitFor();
    await page.locator('#claims fieldset').first().getByLabel('Claimed value').fill('1');
    await page.getByRole('button', { name: 'Check these claims' }).click();
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(390);
    await page.close();
  });

  it('is looked at by people where SCREENSHOTS asks for it', async () => {
    let files = 0;
    for (const shows of ['report-and-counts', 'report'] as const) {
      const { path } = await seedLink(server, there, {
        shows,
        blind: shows === 'report',
        allowsRemarks: true
      });
      const made = await screenshots(browser, server.address + path, `link-${shows}`, async (page) => {
        await page.locator('#claims fieldset').first().getByLabel('Claimed value').fill('3.1');
        await page.getByRole('button', { name: 'Check these claims' }).click();
      });
      files += made.length;
    }
    expect(files).toBe(process.env.SCREENSHOTS ? 8 : 0);
  });
});
