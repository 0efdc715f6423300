import { readFile } from 'node:fs/promises';
import { dataset, event } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { and, eq } from 'drizzle-orm';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makeTrueDataset, textsOf } from '../support/archives';
import { inventedCounts, makeReport } from '../support/saved-reports';
import { complaintsOf } from './support/complaints';
import { audit, openAuditPage } from './support/axe';
import { notOvertaken } from './support/not-overtaken';
import { openBrowser } from './support/open-browser';
import { seedPerson, seedTeam, withDatabaseOf } from './support/seed-people';
import { screenshots } from './support/screenshots';
import { signIn } from './support/sign-in';
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

/** A lead with a team of two datasets and a report, and an empty team. */
async function twoTeams(tag: string) {
  const lead = await seedPerson(server, { name: 'Lena Invented' });
  const [full, empty] = [
    await seedTeam(server, `full-${tag}`, [[lead, 'lead']]),
    await seedTeam(server, `empty-${tag}`, [[lead, 'lead']])
  ];
  const actor: Actor = { personId: lead.id, teamId: full.id, role: 'lead' };
  const ids = await withDatabaseOf(server, async (db) => {
    const first = makeTrueDataset(db, actor, inventedCounts, { name: 'Heron, first run' });
    const second = makeTrueDataset(db, actor, inventedCounts, { name: 'Heron, second run' });
    await makeReport(db, { teamId: full.id, datasetId: first, createdBy: lead.id });
    return { first, second };
  });
  return { lead, full, empty, ids };
}

describe('a team', () => {
  it('is exported, imported into another, told the second time, and comes back whole', async () => {
    const { lead, full, empty } = await twoTeams('transfer');
    const page = await browser.newPage({ acceptDownloads: true });
    const complaints = complaintsOf(page);
    await signIn(page, server.address, lead.email, lead.password);
    const archiveOf = async (slug: string, name: string) => {
      await page.goto(`${server.address}/team/${slug}/settings`, { waitUntil: 'networkidle' });
      const [download] = await Promise.all([
        page.waitForEvent('download'),
        page.getByRole('button', { name: `Export ${name}` }).click()
      ]);
      expect(download.suggestedFilename()).toMatch(new RegExp(`^${slug}-\\d{4}-\\d\\d-\\d\\d\\.zip$`));
      return readFile(await download.path());
    };
    const archive = await archiveOf(full.slug, full.name);

    await page.goto(`${server.address}/team/${empty.slug}/settings`, { waitUntil: 'networkidle' });
    const choose = (buffer: Buffer) =>
      page
        .getByLabel('Archive', { exact: true })
        .setInputFiles({ name: 'a.zip', mimeType: 'application/zip', buffer });
    const send = () => page.getByRole('button', { name: `Import into ${empty.name}` }).click();
    await choose(Buffer.from(archive.subarray(0, 500)));
    await send();
    await page.getByText('Nothing was imported.').waitFor();
    await choose(archive);
    await send();
    await page.getByText(`Imported from “${full.name}”: 2 datasets, 1 report and 0 remarks`).waitFor();
    await choose(archive);
    await send();
    await page.getByText('This very archive was imported into this team').waitFor();
    const count = () =>
      withDatabaseOf(
        server,
        (db) => db.select().from(dataset).where(eq(dataset.teamId, empty.id)).all().length
      );
    expect(await count()).toBe(2);

    const [before, after] = [textsOf(archive), textsOf(await archiveOf(empty.slug, empty.name))];
    const same = Object.keys(before).filter((path) => /^(datasets|reports|originals)\//.test(path));
    expect(same).toHaveLength(7);
    for (const path of same) expect(after[path], path).toBe(before[path]);

    // Asked for: everything twice.
    await choose(archive);
    await send();
    await page.getByLabel('Import it again').check();
    await send();
    await page.getByText(`Imported from “${full.name}”`).waitFor();
    expect(await count()).toBe(4);

    await page.goto(`${server.address}/team/${empty.slug}`, { waitUntil: 'networkidle' });
    await page.getByRole('heading', { name: 'Newest reports' }).waitFor();
    expect(notOvertaken(complaints).filter((line) => !/status of 400/.test(line))).toEqual([]);
    await page.close();
  });

  it('imports without JavaScript', async () => {
    const { lead, full, empty } = await twoTeams('plain');
    const page = await browser.newPage({ javaScriptEnabled: false });
    await signIn(page, server.address, lead.email, lead.password);
    const exported = await page.request.post(`${server.address}/team/${full.slug}/settings/export`, {
      headers: { origin: server.address }
    });
    const buffer = await exported.body();
    await page.goto(`${server.address}/team/${empty.slug}/settings`);
    await page
      .getByLabel('Archive', { exact: true })
      .setInputFiles({ name: 'a.zip', mimeType: 'application/zip', buffer });
    await page.getByRole('button', { name: `Import into ${empty.name}` }).click();
    await page.getByText(`Imported from “${full.name}”`).waitFor();
    await page.close();
  });

  it('brings back what was put aside', async () => {
    const { lead, full, ids } = await twoTeams('aside');
    await withDatabaseOf(server, (db) =>
      db
        .update(dataset)
        .set({ deletedAt: Date.now() - 5 * 24 * 60 * 60 * 1000, deletedBy: lead.id })
        .where(eq(dataset.id, ids.first))
        .run()
    );
    const page = await openAuditPage(browser, { viewport: { width: 390, height: 800 } });
    await signIn(page, server.address, lead.email, lead.password);
    const at = `${server.address}/team/${full.slug}`;
    await page.goto(at, { waitUntil: 'networkidle' });
    expect(await page.getByText('Heron, first run').count()).toBe(0);
    await page.goto(`${at}/aside`, { waitUntil: 'networkidle' });
    expect(await page.locator('tbody td.amount').allTextContents()).toEqual(['25']);
    expect(await audit(page)).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(390);
    await page.getByRole('button', { name: 'Bring back Heron, first run' }).click();
    await page.getByText('“Heron, first run” is back, with its reports.').waitFor();
    await page.goto(at, { waitUntil: 'networkidle' });
    await page.getByRole('link', { name: 'Heron, first run, report 1' }).waitFor();
    expect(await audit(page)).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(390);
    await withDatabaseOf(server, (db) => {
      const ours = and(eq(event.teamId, full.id), eq(event.action, 'dataset.restore'));
      expect(db.select().from(event).where(ours).all()).toHaveLength(1);
    });
    await page.context().close();
    await screenshots(browser, at, 'team-full', async (one) => {
      await signIn(one, server.address, lead.email, lead.password);
      await one.goto(at, { waitUntil: 'networkidle' });
    });
  });
});
