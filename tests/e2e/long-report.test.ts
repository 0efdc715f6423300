import { saveReport } from '$lib/server/services/reports/save-report';
import { documentText } from '$lib/model/document-text';
import type { Diagnosis } from '$lib/stats/types';
import type { Browser, BrowserContext } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { diagnoseInvented, makeDataset } from '../support/saved-reports';
import { readPdf } from '../unit/pdf/read-pdf';
import { complaintsOf } from './support/complaints';
import { layoutFaults } from './support/layout-faults';
import { openBrowser } from './support/open-browser';
import { seedPerson, seedTeam, withDatabaseOf } from './support/seed-people';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

/** Invented: every count from 1 000 to 10 999 was seen. */
const COUNTS: [number, number][] = Array.from({ length: 10_000 }, (_, i) => [
  1000 + i,
  1 + Math.round(60 * Math.exp(-(((i - 5000) / 1700) ** 2) / 2))
]);

let server: RunningServer;
let browser: Browser;
let context: BrowserContext;
let document: Diagnosis;
let address: string;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
  const lead = await seedPerson(server);
  const team = await seedTeam(server, 'long', [[lead, 'lead']]);
  const data = { kind: 'histogram' as const, counts: COUNTS, lump: null };
  const made = await diagnoseInvented({ trials: 40_000 }, data);
  document = made.document;
  const id = await withDatabaseOf(server, (db) => {
    const datasetId = makeDataset(db, team.id, lead.id, {
      ...{ name: 'Ten thousand counts', trials: 40_000, counts: JSON.stringify(data) }
    });
    return db.transaction((tx) => saveReport(tx, { teamId: team.id, datasetId, createdBy: lead.id, ...made }))
      .id;
  });
  address = `${server.address}/team/${team.slug}/reports/${id}`;
  context = await browser.newContext({ viewport: { width: 390, height: 900 }, reducedMotion: 'reduce' });
  const page = await context.newPage();
  await signIn(page, server.address, lead.email, lead.password);
  await page.close();
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

describe('a report of 10 000 counts', () => {
  it('is shown whole: charts thinned and saying so, tables a page at a time', async () => {
    expect(document.distribution.length).toBeGreaterThan(9_999);
    const page = await context.newPage();
    const complaints = complaintsOf(page);
    const answer = await page.goto(address, { waitUntil: 'networkidle', timeout: 60_000 });
    // What is sent is a third of the document, which is 9 MB.
    expect((await answer!.body()).length).toBeLessThan(0.35 * documentText(document).length);
    // Charts are made live as one comes near.
    for (const figure of await page.locator('figure').all()) {
      await figure.scrollIntoViewIfNeeded();
      await figure.getByRole('application').hover();
      await figure.locator('svg.drawn').waitFor();
    }
    expect(await layoutFaults(page)).toEqual([]);
    const main = page.locator('main');
    expect(await main.innerText()).toContain('Ten thousand counts');
    // Marks are fewer than counts: a phone has no room for ten thousand.
    const paths = await page
      .locator('figure svg path')
      .evaluateAll((all) => all.reduce((sum, path) => sum + (path.getAttribute('d') ?? '').length, 0));
    expect(paths).toBeLessThan(600_000);
    expect(await page.locator('#counts-and-law figure').innerText()).toMatch(
      /Too many counts for one mark each: a heavy stroke covers \d+ neighbouring counts/
    );

    const figure = page.locator('#counts-and-law figure');
    await figure.locator('summary').click();
    const rows = figure.locator('tbody tr');
    await rows.last().waitFor();
    expect(await rows.count()).toBe(100);
    expect(await figure.innerText()).toMatch(/Rows 1 to 100 of 10.00\d\. The CSV file\s+has all\./);
    await figure.getByRole('button', { name: /^Last rows/ }).click();
    const last = document.distribution.at(-1)!;
    expect((await rows.last().innerText()).replace(/[\u2009\u202f]/g, '')).toContain(String(last.count));
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('is a PDF of under 300 kB that says which rows it leaves out', async () => {
    const page = await context.newPage();
    const answer = await page.request.get(`${address}/report.pdf`);
    expect(answer.status()).toBe(200);
    const bytes = await answer.body();
    expect(bytes.length).toBeLessThan(300_000);
    const { text, pages, unmarked } = readPdf(bytes);
    expect(unmarked).toEqual([]);
    expect(pages).toBeLessThan(14);
    expect(text).toMatch(/Every \d+(st|nd|rd|th) row\. The document and the CSV files have all 10 00\d\./);
    expect(text).toContain(document.answer.statement.replace(/[\s\u2009\u202f]+/g, ' '));
    await page.close();
  });

  it('has all rows in its files', async () => {
    const page = await context.newPage();
    const csv = await (await page.request.get(`${address}/distribution.csv`)).text();
    expect(csv.trimEnd().split('\r\n')).toHaveLength(document.distribution.length + 1);
    const whole = await (await page.request.get(`${address}/document.json`)).text();
    expect(whole).toBe(documentText(document));
    await page.close();
  });
});
