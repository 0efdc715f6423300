import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makeDataset, makeReport } from '../support/datasets';
import { audit } from './support/axe';
import { longTable } from './support/long-table';
import { openBrowser } from './support/open-browser';
import { withDatabaseOf } from './support/seed-people';
import { startServer, type RunningServer } from './support/start-server';
import { complaintsBut, teamOf, visitor } from './support/team-setting';

let server: RunningServer;
let browser: Browser;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

/** A team with datasets named one to sixty, and its people. */
async function filled(slug: string) {
  const { people, root } = await teamOf(server, slug, ['lead', 'experimenter', 'observer']);
  const ids = await withDatabaseOf(server, (db) => {
    const team = db.query.team.findFirst({ where: (row, { eq }) => eq(row.slug, slug) }).sync();
    const actor = { personId: people[0].id, teamId: team?.id ?? '', role: 'lead' as const };
    const made = Array.from({ length: 60 }, (_, i) =>
      makeDataset(db, actor, {
        name: `run ${String(i + 1).padStart(2, '0')}`,
        device: i % 2 ? 'Kelp' : 'Marram',
        quenchTime: i + 1,
        quenchUnit: 'µs',
        createdAt: 1_773_500_000_000 + i
      })
    );
    makeReport(db, actor, made[0], { verdict: 'ruled-out' });
    return made;
  });
  return { people, root, ids };
}

describe('the table of datasets', () => {
  it('filters, sorts and pages on the server, with all of it in the address', async () => {
    const { people, root } = await filled('table');
    const { page, complaints } = await visitor(browser, server, people[0]);
    await page.goto(`${root}/datasets`, { waitUntil: 'networkidle' });
    await page.getByText('1 to 50 of 60').first().waitFor();
    await page.getByRole('link', { name: 'Next' }).first().click();
    await page.getByText('51 to 60 of 60').first().waitFor();
    await page.getByRole('link', { name: /^Name/ }).click();
    await page.getByText('1 to 50 of 60').first().waitFor();
    await expect.poll(() => page.locator('tbody th').first().textContent()).toBe('run 01');
    await page.getByLabel('Search').fill('kelp');
    await page.getByText('1 to 30 of 30, out of 60 in the team').waitFor();
    await page.getByText(/^Filters/).click();
    await page.getByLabel('Quench time to').fill('10');
    await page.getByText('1 to 5 of 5, out of 60').waitFor();
    expect(page.url()).toContain('q=kelp');
    await page.reload({ waitUntil: 'networkidle' });
    await page.getByText('1 to 5 of 5, out of 60').waitFor();
    await page.goBack({ waitUntil: 'networkidle' });
    expect(complaintsBut(complaints)).toEqual([]);
    await page.context().close();
  });

  it('works as links and a form without JavaScript', async () => {
    const { people, root } = await filled('plain-table');
    const { page } = await visitor(browser, server, people[2], { javaScriptEnabled: false });
    await page.goto(`${root}/datasets`);
    expect(await page.getByRole('checkbox').count()).toBe(0);
    await page.getByLabel('Search').fill('kelp');
    await page.getByRole('button', { name: 'Show' }).click();
    await page.getByText('1 to 30 of 30, out of 60 in the team').waitFor();
    await page.getByRole('link', { name: /^Last answer/ }).click();
    await page.getByText('1 to 30 of 30').waitFor();
    await page.context().close();
  });

  it('many are chosen and their conditions changed at once', async () => {
    const { people, root } = await filled('bulk');
    const { page, complaints } = await visitor(browser, server, people[1]);
    await page.goto(`${root}/datasets?sort=name&order=up`, { waitUntil: 'networkidle' });
    await page.getByLabel('Choose run 01').check();
    await page.getByLabel('Choose run 02').check();
    await page.getByText('2 chosen').waitFor();
    await page.getByRole('button', { name: 'Change conditions of these' }).click();
    await page.getByRole('heading', { name: 'Change conditions' }).waitFor();
    await page.getByRole('textbox', { name: 'Firmware version' }).fill('ebb 4.0');
    expect(await page.getByLabel('Change: Firmware version').isChecked()).toBe(true);
    await page.getByRole('button', { name: 'Change these conditions' }).click();
    await page.getByText('2 datasets have the new conditions.').waitFor();
    await page.goto(`${root}/datasets?firmware=ebb+4.0`, { waitUntil: 'networkidle' });
    await page.getByText('1 to 2 of 2, out of 60').waitFor();
    expect(complaintsBut(complaints)).toEqual([]);
    await page.context().close();
  });

  it('an empty team says what to do first, with an example one click away', async () => {
    const { people, root } = await teamOf(server, 'empty', ['lead']);
    const { page, complaints } = await visitor(browser, server, people[0]);
    await page.goto(`${root}/datasets`, { waitUntil: 'networkidle' });
    await page.getByText('There are no datasets in this team yet.').waitFor();
    await page.getByRole('button', { name: 'Weldon’s dice', exact: true }).click();
    await page.getByRole('heading', { name: 'Weldon’s dice' }).waitFor();
    expect(complaintsBut(complaints)).toEqual([]);
    await page.context().close();
  });

  it('nothing breaks WCAG, the policy, or the width of a phone', async () => {
    const { people, root, ids } = await filled('audited');
    const options = { bypassCSP: true, viewport: { width: 390, height: 844 } };
    const { page } = await visitor(browser, server, people[0], options);
    const places = ['datasets', 'datasets/new', `datasets/${ids[0]}`, `datasets/edit?dataset=${ids[0]}`];
    for (const place of places) {
      await page.goto(`${root}/${place}`, { waitUntil: 'networkidle' });
      if (place.endsWith('new')) {
        const buffer = Buffer.from(longTable());
        await page.getByLabel('Files of counts').setInputFiles([
          { name: 'sweep.csv', mimeType: 'text/csv', buffer },
          { name: 'bad.csv', mimeType: 'text/csv', buffer: Buffer.from('count,shots\n0,x\n') }
        ]);
        await page.getByRole('group', { name: 'Problems of bad.csv' }).waitFor();
      }
      for (const summary of await page.locator('main details:not([open]) > summary').all())
        if (await summary.isVisible()) await summary.click();
      expect(await audit(page), place).toEqual([]);
      const wide = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect(wide, place).toBeLessThanOrEqual(0);
    }
    await page.context().close();
  });
});
