import { team } from '$lib/server/db/schema';
import { putSweepAside } from '$lib/server/services/sweeps/put-sweep-aside';
import { eq } from 'drizzle-orm';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { asked, free, makeQuench, saved } from '../support/sweeps';
import { readPdf } from '../unit/pdf/read-pdf';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
import { seedPerson, seedTeam, withDatabaseOf, type SeededPerson } from './support/seed-people';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let browser: Browser;
let lead: SeededPerson;
let sweepId: string;
let ids: string[];
const TEAM = 'Quaggalab';

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
  lead = await seedPerson(server, { name: 'Ibexia Numbat' });
  const own = await seedTeam(server, 'quaggas', [[lead, 'lead']]);
  const actor = { personId: lead.id, teamId: own.id, role: 'lead' as const };
  [sweepId, ids] = await withDatabaseOf(server, (db) => {
    db.update(team).set({ name: TEAM }).where(eq(team.id, own.id)).run();
    const made = makeQuench(db, actor, free, 1);
    return [saved(db, actor, asked(made, { name: 'Wombat decades' })), made];
  });
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

/** Makes a link on the page of the sweep, as a person would, and gives its address. */
async function madeOnPage(blind: boolean): Promise<string> {
  const context = await browser.newContext({ reducedMotion: 'reduce' });
  const page = await context.newPage();
  const complaints = complaintsOf(page);
  await signIn(page, server.address, lead.email, lead.password);
  await page.goto(`${server.address}/team/quaggas/sweeps/${sweepId}`, { waitUntil: 'networkidle' });
  await page.getByRole('button', { name: 'Make a link' }).click();
  await page.getByLabel('Your name for it').fill(blind ? 'blind' : 'open');
  if (blind) await page.getByLabel(/Blind: hide/).check();
  expect(await page.getByLabel(/Remark on/).count()).toBe(0);
  await page.getByRole('button', { name: 'Make this link' }).click();
  const address = await page.getByLabel('Its address, shown this once').inputValue();
  await page.getByRole('button', { name: 'I have kept the address' }).click();
  await page
    .getByText(/Shows the sweep: times, shots, cumulants/)
    .first()
    .waitFor();
  expect(complaints).toEqual([]);
  await context.close();
  return address;
}

describe('a link to a sweep, made on its page', () => {
  it('opens it for a stranger, with its document and points', async () => {
    const address = await madeOnPage(false);
    const page = await browser.newPage({ reducedMotion: 'reduce' });
    const complaints = complaintsOf(page);
    await page.goto(address, { waitUntil: 'networkidle' });
    expect(page.url()).toBe(`${address}/sweep`);
    expect(await page.getByRole('heading', { level: 1 }).textContent()).toBe('Wombat decades');
    expect(await page.content()).toContain(TEAM);
    expect(complaints).toEqual([]);
    const document = await fetch(`${address}/sweep/document.json`);
    expect(document.headers.get('content-disposition')).toContain('filename="severalty-sweep.json"');
    expect(await document.json()).toMatchObject({ format: 'severalty.sweep/1' });
    const points = await (await fetch(`${address}/sweep/points.csv`)).text();
    expect(points.trim().split('\r\n')).toHaveLength(10);
    const print = Buffer.from(await (await fetch(`${address}/sweep/sweep.pdf`)).arrayBuffer());
    expect(readPdf(print).text).toContain('Wombat decades');
    for (const file of ['report.pdf', 'report.json', 'bundle.zip', 'tails.csv'])
      expect((await fetch(`${address}/${file}`)).status, file).toBe(404);
    await page.close();
  });

  it('tells nothing of whose it is when it is blind', async () => {
    const address = await madeOnPage(true);
    const secrets = [
      TEAM,
      'quaggas',
      'Ibexia',
      'Wombat',
      'Invented ring',
      'quench 1',
      lead.id,
      sweepId,
      ...ids
    ];
    const page = await browser.newPage({ reducedMotion: 'reduce' });
    await page.goto(address, { waitUntil: 'networkidle' });
    const given = [await page.content()];
    for (const path of ['', '/__data.json', '/document.json', '/points.csv']) {
      const answer = await fetch(`${address}/sweep${path}`);
      expect(answer.status, path).toBe(200);
      given.push(await answer.text(), JSON.stringify([...answer.headers]));
    }
    const print = await fetch(`${address}/sweep/sweep.pdf`);
    expect(print.status).toBe(200);
    given.push(readPdf(Buffer.from(await print.arrayBuffer())).text, JSON.stringify([...print.headers]));
    for (const text of given) for (const secret of secrets) expect(text, secret).not.toContain(secret);
    expect(given[0]).toContain('dataset 9');
    await page.close();
  });

  it('is closed while the sweep is put aside', async () => {
    const address = await madeOnPage(false);
    expect((await fetch(`${address}/sweep`)).status).toBe(200);
    await withDatabaseOf(server, (db) => {
      const { id: teamId } = db.select().from(team).where(eq(team.slug, 'quaggas')).get()!;
      putSweepAside(db, { personId: lead.id, teamId, role: 'lead' }, sweepId);
    });
    expect((await fetch(`${address}/sweep`)).status).toBe(410);
    expect((await fetch(`${address}/sweep/document.json`)).status).toBe(410);
  });
});
