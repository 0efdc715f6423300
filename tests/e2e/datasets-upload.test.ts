import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { longTable } from './support/long-table';
import { openBrowser } from './support/open-browser';
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

const table = { name: 'sweep.csv', mimeType: 'text/csv', buffer: Buffer.from(longTable()) };

describe('adding datasets', () => {
  it('a long table becomes 12 datasets, shown before they are saved; the same bytes again are known', async () => {
    const { people, root } = await teamOf(server, 'twelve', ['experimenter']);
    const { page, complaints } = await visitor(browser, server, people[0]);
    await page.goto(`${root}/datasets/new`, { waitUntil: 'networkidle' });
    await page.getByLabel('Files of counts').setInputFiles(table);
    await page.getByText('it becomes 12 datasets').waitFor();
    const rows = page.getByRole('region', { name: 'Datasets of sweep.csv' }).locator('tbody > tr');
    expect(await rows.count()).toBe(12);
    expect(await rows.first().textContent()).toContain(
      'Kelp, ebb 3.1, quench 1.5\u202fµs, N = 24, 14 Mar 2026'
    );
    // Conditions can be changed, one by one and for all.
    await rows.first().locator('summary').click();
    await rows.first().getByLabel('Name').fill('the first of twelve');
    await page.getByRole('combobox', { name: 'Condition' }).selectOption('postSelection');
    await page.locator('[id="all.postSelection"]').fill('none');
    await page.getByRole('button', { name: 'Set it on all' }).click();
    await page.getByRole('button', { name: 'Save 12 datasets to the team' }).click();
    await page.getByText('12 datasets are saved.').waitFor();
    await page.getByText('1 to 12 of 12').waitFor();
    await page.getByRole('link', { name: 'the first of twelve' }).click();
    await page.getByText('from a file').or(page.getByText('of the file')).first().waitFor();
    expect(await page.locator('dl').textContent()).toContain('none');
    // The original comes back byte for byte.
    const original = await page.request.get(`${page.url()}/original`);
    expect(Buffer.compare(await original.body(), table.buffer)).toBe(0);
    expect(original.headers()['content-disposition']).toContain('sweep.csv');
    // The same bytes once more.
    await page.goto(`${root}/datasets/new`, { waitUntil: 'networkidle' });
    await page.getByLabel('Files of counts').setInputFiles(table);
    await page.getByText('Saved already from the same bytes').first().waitFor();
    // Named in its line, and where the button to save would be.
    expect(await page.getByRole('link', { name: 'the first of twelve' }).count()).toBe(2);
    await page.getByText('They are all in the team already').waitFor();
    expect(await page.getByRole('button', { name: /^Save .* to the team/ }).count()).toBe(0);
    // Saving anyway takes a name of its own.
    await rows.first().getByRole('checkbox').check();
    const button = page.getByRole('button', { name: 'Save this dataset to the team' });
    await button.click();
    await page.getByText('These are saved already, from the same bytes.').waitFor();
    await page.getByLabel(/Save again what is there/).check();
    await rows.first().locator('summary').click();
    await rows.first().getByLabel('Name').fill('the first, again');
    await button.click();
    await page.getByRole('heading', { name: 'the first, again' }).waitFor();
    expect(complaintsBut(complaints, 409)).toEqual([]);
    await page.context().close();
  });

  it('a bad file: every problem with its line, nothing of it is saved, a good one beside it is', async () => {
    const { people, root } = await teamOf(server, 'bad-file', ['lead']);
    const { page, complaints } = await visitor(browser, server, people[0]);
    await page.goto(`${root}/datasets/new`, { waitUntil: 'networkidle' });
    await page
      .getByLabel('Files of counts')
      .setInputFiles([
        'fixtures/bad/many-problems.csv',
        'fixtures/bad/binary.csv',
        'fixtures/weldon-dice.csv'
      ]);
    const problems = page.getByRole('group', { name: 'Problems of many-problems.csv' });
    await problems.waitFor();
    expect(await problems.locator('li').first().textContent()).toMatch(/^\s*Line \d+/);
    expect(await problems.locator('li').count()).toBeGreaterThan(2);
    await page.getByRole('group', { name: 'Problems of binary.csv' }).waitFor();
    await page.getByRole('button', { name: 'Save this dataset to the team' }).click();
    await page.getByRole('heading', { name: /weldon-dice/ }).waitFor();
    expect(complaintsBut(complaints)).toEqual([]);
    await page.context().close();
  });

  it('without JavaScript the same takes two steps, and loses nothing typed', async () => {
    const { people, root } = await teamOf(server, 'no-script', ['experimenter']);
    const { page } = await visitor(browser, server, people[0], { javaScriptEnabled: false });
    await page.goto(`${root}/datasets/new`);
    await page.getByLabel('Files of counts').setInputFiles(table);
    await page.getByRole('button', { name: 'Read these files' }).click();
    await page.getByText('it becomes 12 datasets').waitFor();
    const rows = page.getByRole('region', { name: 'Datasets of sweep.csv' }).locator('tbody > tr');
    await rows.nth(1).locator('summary').click();
    await rows.nth(1).getByLabel('Trials in a shot, N').fill('many');
    await rows.nth(0).getByRole('checkbox').uncheck();
    await page.getByRole('button', { name: /^Save .* to the team/ }).click();
    await page.getByText('Some conditions do not fit').waitFor();
    expect(await rows.nth(1).getByLabel('Trials in a shot, N').inputValue()).toBe('many');
    expect(await rows.nth(0).getByRole('checkbox').isChecked()).toBe(false);
    await rows.nth(1).getByLabel('Trials in a shot, N').fill('24');
    await page.getByRole('button', { name: /^Save .* to the team/ }).click();
    await page.getByText('11 datasets are saved.').waitFor();
    await page.context().close();
  });

  it('an observer is refused, in the page and in JSON alike', async () => {
    const { people, root } = await teamOf(server, 'looking', ['observer']);
    const { page } = await visitor(browser, server, people[0]);
    await page.goto(`${root}/datasets`, { waitUntil: 'networkidle' });
    expect(await page.getByRole('link', { name: 'Add datasets' }).count()).toBe(0);
    const refused = await page.goto(`${root}/datasets/new`);
    expect(refused?.status()).toBe(403);
    expect(await page.locator('main').textContent()).toContain('Your role in this team does not allow that.');
    const headers = { origin: server.address };
    const multipart = { file: table };
    for (const route of ['preview', 'save', 'bulk']) {
      const answer = await page.request.post(`${root}/datasets/${route}`, {
        headers,
        ...(route === 'preview' ? { multipart } : { data: { files: [] } })
      });
      expect(answer.status(), route).toBe(403);
      expect(answer.headers()['content-type']).toBe('application/problem+json');
      expect(await answer.json()).toMatchObject({ code: 'not-allowed', status: 403 });
    }
    for (const action of ['read', 'save']) {
      const answer = await page.request.post(`${root}/datasets/new?/${action}`, {
        headers: { ...headers, accept: 'text/html' },
        multipart: { files: table }
      });
      expect(answer.status(), action).toBe(403);
    }
    const list = await page.request.get(`${root}/datasets/list`);
    expect(await list.json()).toMatchObject({ all: 0, rows: [] });
    await page.context().close();
  });

  it('bad bodies are refused in words: too large, not JSON, wrong shape, wrong type', async () => {
    const { people, root } = await teamOf(server, 'bodies', ['lead']);
    const { page } = await visitor(browser, server, people[0]);
    const headers = { origin: server.address };
    const buffer = Buffer.alloc(21 * 1024 * 1024, 48);
    const post = (route: string, options: Parameters<typeof page.request.post>[1]) =>
      page.request.post(`${root}/datasets/${route}`, {
        ...options,
        headers: { ...headers, ...options?.headers }
      });
    const large = await post('preview', { multipart: { file: { ...table, buffer } } });
    expect([large.status(), (await large.json()).title]).toEqual([413, expect.stringContaining('20 MB')]);
    const json = { 'content-type': 'application/json' };
    const answers = [
      await post('save', { data: Buffer.from('{"files":'), headers: json }),
      await post('save', { data: { files: [{ fileId: 7 }] } }),
      await post('save', { data: Buffer.from('files'), headers: { 'content-type': 'text/csv' } }),
      await post('bulk', { data: { datasets: [], set: {} } }),
      await post('preview', { data: { fileId: 'unknown', choices: {} } })
    ];
    expect(answers.map((answer) => answer.status())).toEqual([400, 422, 415, 422, 404]);
    for (const answer of answers) expect(answer.headers()['content-type']).toBe('application/problem+json');
    await page.context().close();
  });
});
