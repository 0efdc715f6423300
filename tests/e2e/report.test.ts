import { dataset, report } from '$lib/server/db/schema';
import { eq } from 'drizzle-orm';
import { createHash } from 'node:crypto';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { saved } from './support/check-page';
import { openBrowser } from './support/open-browser';
import { pageOf as open, real, reportsSetting, type ReportsSetting } from './support/reports-setting';
import { withDatabaseOf, type SeededPerson } from './support/seed-people';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let browser: Browser;
let { lead, observer, stranger, root, datasetId, reports } = {} as ReportsSetting;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
  ({ lead, observer, stranger, root, datasetId, reports } = await reportsSetting(server));
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

const pageOf = (person: SeededPerson, options: Parameters<Browser['newContext']>[0] = {}) =>
  open(browser, server, person, options);

describe('one report', () => {
  it('gives its stored bytes, and tells which conditions changed since', async () => {
    await withDatabaseOf(server, (db) =>
      db.update(dataset).set({ device: 'Heron' }).where(eq(dataset.id, datasetId)).run()
    );
    const { page, complaints, context } = await pageOf(observer);
    await page.goto(`${root}/${reports[0]}`, { waitUntil: 'networkidle' });
    const provenance = page.locator('#provenance');
    expect(await provenance.textContent()).toMatch(/Tern\s*Changed since: now Heron/);
    const file = await saved(page, () =>
      page.getByRole('link', { name: 'Save the document as JSON' }).click()
    );
    const row = await withDatabaseOf(server, (db) =>
      db.select().from(report).where(eq(report.id, reports[0])).get()
    );
    expect(file.name).toBe('Slow quench, report 1.json');
    expect(file.text).toBe(row!.document);
    expect(await provenance.textContent()).toContain(createHash('sha256').update(file.text).digest('hex'));
    const csv = await saved(page, () => page.getByRole('link', { name: 'Save its numbers as CSV' }).click());
    expect(csv.text).toContain(`answer,verdict,,${row!.verdict},,`);
    expect(real(complaints)).toEqual([]);
    await context.close();
  });

  it('is answered with 404 to people of another team, as is every route of it', async () => {
    const { page, context } = await pageOf(stranger);
    const id = reports[0];
    for (const path of ['', '/document.json', '/document.csv', '/remarks']) {
      // By its own team's address and by theirs.
      for (const base of [root, `${server.address}/team/elsewhere/reports`]) {
        const answer = await page.request.get(`${base}/${id}${path}`);
        expect(answer.status(), `${base}${path}`).toBe(404);
        expect(await answer.text()).not.toMatch(/Slow quench|sha256/);
      }
    }
    const compared = await page.request.get(
      `${server.address}/team/elsewhere/reports/compare?a=${id}&b=${reports[1]}`
    );
    expect(compared.status()).toBe(404);
    const said = await page.request.post(`${server.address}/team/elsewhere/reports/${id}/remarks`, {
      data: { section: 'law', body: 'x' }
    });
    expect(said.status()).toBe(404);
    expect(said.headers()['content-type']).toBe('application/problem+json');
    await context.close();
  });

  it('may be remarked on by an observer, but not put aside; its maker may, and may bring it back', async () => {
    const { page, context } = await pageOf(observer);
    const address = `${root}/${reports[2]}`;
    await page.goto(address, { waitUntil: 'networkidle' });
    expect(await page.getByRole('button', { name: 'Put this report aside' }).count()).toBe(0);
    const forced = await page.request.post(`${address}?/aside`, {
      form: {},
      headers: { origin: server.address, accept: 'text/html' },
      maxRedirects: 0
    });
    expect(forced.status()).toBe(403);
    const said = await page.request.post(`${address}/remarks`, { data: { section: 'law', body: 'By API.' } });
    expect(said.status()).toBe(201);
    await context.close();

    const makers = await pageOf(lead);
    await makers.page.goto(address, { waitUntil: 'networkidle' });
    await makers.page.getByRole('button', { name: 'Put this report aside' }).click();
    await makers.page.getByText('The report was put aside').waitFor();
    expect((await makers.page.request.get(address)).status()).toBe(404);
    await makers.page.getByRole('button', { name: 'Bring it back' }).click();
    await makers.page.locator('#answer-heading').waitFor();
    expect(makers.page.url()).toContain(reports[2]);
    expect(real(makers.complaints)).toEqual([]);
    await makers.context.close();
  });

  it('prints without controls and remarks', async () => {
    const { page, context } = await pageOf(observer);
    await page.goto(`${root}/${reports[1]}`, { waitUntil: 'networkidle' });
    await page.emulateMedia({ media: 'print' });
    for (const hidden of ['#remarks-law', '#provenance .acts', 'header .acts', 'nav'])
      for (const part of await page.locator(hidden).all()) expect(await part.isVisible(), hidden).toBe(false);
    expect(await page.locator('h1').isVisible()).toBe(true);
    expect(await page.locator('figure svg[role=application]').first().isVisible()).toBe(true);
    if (process.env.SCREENSHOTS)
      await page.pdf({ path: `${process.env.SCREENSHOTS}/report.pdf`, format: 'A4' });
    await context.close();
  });
});
