import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makeDataset } from '../support/datasets';
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

async function withOne(slug: string) {
  const { people, root } = await teamOf(server, slug, ['lead', 'experimenter', 'observer']);
  const id = await withDatabaseOf(server, (db) => {
    const team = db.query.team.findFirst({ where: (row, { eq }) => eq(row.slug, slug) }).sync();
    return makeDataset(
      db,
      { personId: people[0].id, teamId: team?.id ?? '', role: 'lead' },
      { name: 'the one' }
    );
  });
  return { people, root, at: `${root}/datasets/${id}` };
}

describe('editing conditions', () => {
  it.each([true, false])(
    'the second of two editors is told, and loses nothing typed (JavaScript: %s)',
    async (javaScriptEnabled) => {
      const { people, at } = await withOne(`two-editors-${javaScriptEnabled ? 'script' : 'plain'}`);
      const first = await visitor(browser, server, people[0]);
      const second = await visitor(browser, server, people[1], { javaScriptEnabled });
      for (const { page } of [first, second]) await page.goto(`${at}?edit`, { waitUntil: 'networkidle' });
      await first.page.getByLabel('Device').fill('Kelp');
      await first.page.getByLabel('Firmware version').fill('ebb 3.1');
      await first.page.getByRole('button', { name: 'Save these conditions' }).click();
      await first.page.getByText('The conditions are saved.').waitFor();
      await second.page.getByLabel('Device').fill('Marram');
      await second.page.getByLabel('Notes').fill('written by the second');
      await second.page.getByRole('button', { name: 'Save these conditions' }).click();
      const told = second.page.locator('#stale');
      await told.waitFor();
      const words = ((await told.textContent()) ?? '').replace(/\s+/g, ' ');
      expect(words).toContain('Invented lead saved other conditions');
      expect(words).toContain('Device: “nothing” became “Kelp”. You typed something else');
      expect(words).toContain('Firmware version: “nothing” became “ebb 3.1”. This is taken');
      expect(await second.page.getByLabel('Device').inputValue()).toBe('Marram');
      expect(await second.page.getByLabel('Notes').inputValue()).toBe('written by the second');
      expect(await second.page.getByLabel('Firmware version').inputValue()).toBe('ebb 3.1');
      await second.page.getByRole('button', { name: 'Save these conditions' }).click();
      await second.page.getByText('The conditions are saved.').waitFor();
      const list = await second.page.locator('dl').textContent();
      for (const text of ['Marram', 'ebb 3.1', 'written by the second']) expect(list).toContain(text);
      expect(complaintsBut(first.complaints)).toEqual([]);
      // With scripts switched off the browser complains of every script that a page names.
      if (javaScriptEnabled) expect(complaintsBut(second.complaints, 409)).toEqual([]);
      for (const { page } of [first, second]) await page.context().close();
    }
  );

  it('a wrong field is named and kept; an observer sees no form and is refused', async () => {
    const { people, at } = await withOne('wrong-field');
    const editor = await visitor(browser, server, people[1]);
    await editor.page.goto(`${at}?edit`, { waitUntil: 'networkidle' });
    await editor.page.getByLabel('Quench time', { exact: true }).fill('fast');
    await editor.page.getByRole('button', { name: 'Save these conditions' }).click();
    await editor.page.getByText('Write a time as a number').waitFor();
    expect(await editor.page.getByLabel('Quench time', { exact: true }).inputValue()).toBe('fast');
    // Counts kept and the uncertainty of the rate: refused in words by field and by counts, then saved.
    await editor.page.getByLabel('Quench time', { exact: true }).fill('');
    await editor.page.getByLabel('Trials in a shot, N').fill('12');
    await editor.page.getByLabel('Counts kept').fill('small ones');
    await editor.page.getByLabel('Uncertainty of the chance to misread').fill('0.002');
    await editor.page.getByRole('button', { name: 'Save these conditions' }).click();
    await editor.page.getByText('Write the smallest and the largest count kept').waitFor();
    expect(await editor.page.getByLabel('Counts kept').inputValue()).toBe('small ones');
    await editor.page.getByLabel('Counts kept').fill('5-9');
    await editor.page.getByRole('button', { name: 'Save these conditions' }).click();
    await editor.page.getByText('Write the chance to misread a site as well').waitFor();
    await editor.page.getByLabel('Chance to misread a site').fill('0.01');
    await editor.page.getByRole('button', { name: 'Save these conditions' }).click();
    await editor.page.getByText(/only counts from 5 to 9 are said to be kept/).waitFor();
    expect(await editor.page.getByLabel('Counts kept').inputValue()).toBe('5-9');
    await editor.page.getByLabel('Counts kept').fill('0-9');
    await editor.page.getByRole('button', { name: 'Save these conditions' }).click();
    await editor.page.getByText('The conditions are saved.').waitFor();
    const stated = await editor.page.locator('dl').textContent();
    for (const text of ['counts from 0 to 9', '0.0020']) expect(stated).toContain(text);
    const observer = await visitor(browser, server, people[2]);
    await observer.page.goto(at, { waitUntil: 'networkidle' });
    expect(await observer.page.getByRole('button', { name: /Save|aside|Diagnose/ }).count()).toBe(0);
    for (const action of ['edit', 'aside']) {
      const answer = await observer.page.request.post(`${at}?/${action}`, {
        headers: { origin: server.address, accept: 'text/html' },
        form: { confirm: 'the one' }
      });
      expect(answer.status(), action).toBe(403);
    }
    for (const { page } of [editor, observer]) await page.context().close();
  });

  it('is put aside after its name was typed, and brought back', async () => {
    const { people, root, at } = await withOne('aside');
    const { page, complaints } = await visitor(browser, server, people[0]);
    await page.goto(at, { waitUntil: 'networkidle' });
    await page.getByText('Put this dataset aside').click();
    await page.getByRole('button', { name: 'Put “the one” aside' }).click();
    await page.getByText('Type the name of the dataset, “the one”').waitFor();
    await page.getByLabel(/type its name/).fill('the one');
    await page.getByRole('button', { name: 'Put “the one” aside' }).click();
    await page.waitForURL(`${root}/datasets?aside=*`);
    await page.getByRole('button', { name: 'Bring it back' }).click();
    await page.waitForURL(at);
    await page.getByText('Edit the conditions').waitFor();
    expect(complaintsBut(complaints, 400)).toEqual([]);
    await page.context().close();
  });
});
