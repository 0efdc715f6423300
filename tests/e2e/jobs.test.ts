import { execFileSync } from 'node:child_process';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { until } from '../support/jobs';
import { audit, openAuditPage } from './support/axe';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
import { screenshots } from './support/screenshots';
import { askForJobs, DICE, ENDLESS, jobsOf, jobsTeam, LOADED, seedDice } from './support/seed-datasets';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

/** Resamples that make a diagnosis of the loaded dice last some seconds, long enough to be watched. */
const LONG = 200_000;

let server: RunningServer;
let browser: Browser;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

const setting = (options: Parameters<Browser['newContext']>[0] = {}) => jobsTeam(server, browser, options);

describe('a diagnosis by the server', () => {
  it('shows its progress as it comes along, and the report when it is done', async () => {
    const { slug, team, page, jobs } = await setting();
    const complaints = complaintsOf(page);
    const [datasetId] = await seedDice(server, team.id, ['Dice, long'], 12, LOADED);
    await page.goto(jobs);
    await page.getByText('No diagnosis was asked for yet.').waitFor();
    let loads = 0;
    page.on('load', () => loads++);
    await askForJobs(page, server.address, slug, { dataset: [datasetId], resamples: LONG });
    const bar = page.getByRole('progressbar', { name: 'Share done of Dice, long' });
    await bar.waitFor();
    const share = async () => Number(await bar.getAttribute('value'));
    const first = await until(share, (value) => value > 0);
    await until(share, (value) => value > first);
    await page.getByText(/ s left|second left/).waitFor();
    await page.getByRole('link', { name: 'Open report 1' }).waitFor({ timeout: 40_000 });
    expect(await page.getByRole('status').textContent()).toBe('Nothing waits or runs.');
    expect(loads).toBe(0);
    expect(complaints).toEqual([]);
    await page.context().close();
  });

  it('gives the bytes that the command line gives', async () => {
    const { slug, team, page } = await setting();
    const [datasetId] = await seedDice(server, team.id, ['Dice']);
    await askForJobs(page, server.address, slug, { dataset: [datasetId], resamples: 199, seed: 5 });
    const { reports } = await until(
      () => jobsOf(server, team.id),
      (all) => all.reports.length === 1
    );
    const file = DICE.map((row) => row.join(',')).join('\n');
    const args = [
      'build-cli/diagnose.js',
      '-',
      '--trials',
      '12',
      '--resamples',
      '199',
      '--seed',
      '5',
      '--json'
    ];
    const printed = execFileSync(process.execPath, args, { input: file, encoding: 'utf8' });
    expect(reports[0].document).toBe(printed);
    await page.context().close();
  });

  it.each([
    ['counts kept', { kept: '0-11' }, ['--kept', '0-11']],
    [
      'a misread rate with its uncertainty',
      { geometry: 'open-bonds', misread: 0.01, misreadUncertainty: 0.002 },
      ['--geometry', 'open-bonds', '--misread', '0.01', '--misread-uncertainty', '0.002']
    ]
  ] as const)('gives the bytes of the command line for %s', async (_, stated, options) => {
    const { slug, team, page } = await setting();
    const [datasetId] = await seedDice(server, team.id, ['Dice so stated'], 12, DICE, stated);
    await askForJobs(page, server.address, slug, { dataset: [datasetId], resamples: 99, seed: 5 });
    const { reports } = await until(
      () => jobsOf(server, team.id),
      (all) => all.reports.length === 1
    );
    const file = DICE.map((row) => row.join(',')).join('\n');
    const known = [
      'build-cli/diagnose.js',
      '-',
      '--trials',
      '12',
      '--resamples',
      '99',
      '--seed',
      '5',
      '--json'
    ];
    const printed = execFileSync(process.execPath, [...known, ...options], { input: file, encoding: 'utf8' });
    expect(reports[0].document).toBe(printed);
    await page.context().close();
  });

  it('is cancelled within a second, and can be asked for again', async () => {
    const { slug, team, page, jobs } = await setting();
    const [datasetId] = await seedDice(server, team.id, ['Dice to cancel'], 12, LOADED);
    const [id] = await askForJobs(page, server.address, slug, { dataset: [datasetId], resamples: ENDLESS });
    await page.goto(jobs);
    await page.getByRole('progressbar').waitFor();
    await page.getByRole('button', { name: 'Cancel the diagnosis of Dice to cancel' }).click();
    await page.getByText('was cancelled').waitFor({ timeout: 1_500 });
    await page.getByRole('button', { name: 'Diagnose again Dice to cancel' }).click();
    await page.getByRole('progressbar').waitFor();
    const { jobs: rows, reports } = await jobsOf(server, team.id);
    expect(rows).toHaveLength(2);
    expect(rows.find((row) => row.id === id)).toMatchObject({ status: 'cancelled', reportId: null });
    expect(reports).toEqual([]);
    await page.getByRole('button', { name: 'Cancel the diagnosis of Dice to cancel' }).click();
    await page.getByText('Nothing waits or runs.').waitFor();
    await page.context().close();
  });

  it('that fails says why, and is mended in the conditions', async () => {
    const { slug, team, page, jobs } = await setting();
    const [datasetId] = await seedDice(server, team.id, ['Dice with one trial'], 1);
    await askForJobs(page, server.address, slug, { dataset: [datasetId] });
    await page.goto(`${jobs}?show=failed`);
    await page.getByText(/trials/).waitFor();
    expect(await page.getByRole('listitem').filter({ hasText: 'Dice with one trial' }).textContent()).toMatch(
      /failed/
    );
    await page.context().close();
  });

  it('is asked for, watched and cancelled without JavaScript', async () => {
    const { team, page, jobs } = await setting({ javaScriptEnabled: false });
    const [one, two] = await seedDice(server, team.id, ['Dice one', 'Dice two'], 12, LOADED);
    const asked = await page.request.post(jobs, {
      form: { dataset: one, resamples: String(ENDLESS) },
      headers: { origin: server.address, accept: 'text/html' },
      maxRedirects: 0
    });
    expect([asked.status(), asked.headers().location]).toEqual([303, `/team/${team.slug}/jobs`]);
    await page.goto(jobs);
    await page.getByRole('link', { name: 'Look again' }).click();
    await page.getByRole('button', { name: 'Cancel the diagnosis of Dice one' }).click();
    await page.waitForURL(jobs);
    await page.getByText('was cancelled').waitFor();
    const nothing = await page.request.post(jobs, {
      form: { unknown: two },
      headers: { origin: server.address, accept: 'text/html' }
    });
    expect(nothing.status()).toBe(422);
    expect(await nothing.text()).toContain('Choose at least one dataset.');
    await page.context().close();
  });
});

describe('the page of jobs', () => {
  it('breaks no rule of accessibility, and is worth a look', async () => {
    const { slug, team, person, page, jobs } = await setting();
    const names = [
      'Chain of 12, firmware 3',
      'Chain of 12, firmware 4',
      'Ring of 24 at a quench time of 80 ns'
    ];
    const datasets = await seedDice(server, team.id, [...names, 'Read-out check'], 12, LOADED);
    const [wrong] = await seedDice(server, team.id, ['Trials not known yet'], 1);
    await askForJobs(page, server.address, slug, { dataset: [wrong, datasets[3]], resamples: 19 });
    await until(
      () => jobsOf(server, team.id),
      ({ jobs: rows }) => rows.every((row) => row.status === 'done' || row.status === 'failed')
    );
    await askForJobs(page, server.address, slug, { dataset: datasets.slice(0, 3), resamples: ENDLESS });
    const audited = await openAuditPage(browser);
    await signIn(audited, server.address, person.email, person.password);
    await audited.goto(jobs);
    await audited.getByRole('progressbar').first().waitFor();
    expect(await audit(audited)).toEqual([]);
    const cookies = await page.context().cookies();
    await screenshots(browser, `${server.address}/sign-in`, 'jobs', async (shown) => {
      await shown.context().addCookies(cookies);
      await shown.goto(jobs);
      await shown.getByRole('progressbar').first().waitFor();
    });
    const { jobs: rows } = await jobsOf(server, team.id);
    for (const { id, endedAt } of rows)
      if (endedAt === null)
        await page.request.post(`${jobs}/${id}/cancel`, { data: {}, headers: { origin: server.address } });
    await audited.context().close();
    await page.context().close();
  });
});
