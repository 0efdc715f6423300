import { membership } from '$lib/server/db/schema';
import type { TeamLink } from '$lib/model/link/team-link';
import { LINK_FILES } from '$lib/server/services/links/spend-file';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { plainLink } from '../support/links';
import { openBrowser } from './support/open-browser';
import { seedPerson, seedTeam, withDatabaseOf } from './support/seed-people';
import { seedLink, seedSharedReport, type SharedReport } from './support/shared-report';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let browser: Browser;
let there: SharedReport;
let page: Page;
let root: string;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
  there = await seedSharedReport(server);
  root = `${server.address}/team/${there.team.slug}/reports/${there.reportId}/links`;
  page = await (await browser.newContext()).newPage();
  await signIn(page, server.address, there.lead.email, there.lead.password);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

const make = (data: object, by = page) => by.request.post(root, { data });

describe('links of a report, by their JSON routes', () => {
  it('are made with an address that is told once and opens, listed, and closed', async () => {
    const made = await make({ ...plainLink, visitLimit: 5 });
    expect(made.status()).toBe(201);
    const { id, address } = (await made.json()) as { id: string; address: string };
    expect((await fetch(address)).status).toBe(200);
    const listed = await (await page.request.get(root)).text();
    expect(listed).not.toContain(address.split('/').at(-1));
    const { links } = JSON.parse(listed) as { links: TeamLink[] };
    expect(links).toMatchObject([{ id, state: 'open', visits: 1, visitLimit: 5 }]);
    expect((await page.request.delete(`${root}/${id}`)).status()).toBe(204);
    expect((await fetch(address)).status).toBe(410);
    const log = (await (await page.request.get(`${root}/${id}`)).json()) as { visits: { outcome: string }[] };
    expect(log.visits.map(({ outcome }) => outcome)).toEqual(['refused', 'opened']);
    expect(server.output()).not.toContain(address.split('/').at(-1));
  });

  it('name each field that does not fit', async () => {
    const answer = await make({ ...plainLink, label: '', audience: 'named', people: ['nobody'] });
    expect(answer.status()).toBe(422);
    expect(answer.headers()['content-type']).toBe('application/problem+json');
    const { fields } = (await answer.json()) as { fields: { at: string }[] };
    expect(fields.map(({ at }) => at)).toEqual(['label', 'people.0']);
    expect((await make({ ...plainLink, expiresAt: 1 })).status()).toBe(422);
  });

  it('are mailed to those they name, without the team where they are blind', async () => {
    const answer = await make({ ...plainLink, audience: 'named', people: ['two@example.org'], blind: true });
    expect(await answer.json()).toMatchObject({ missed: [] });
    const outbox = await (await page.request.get(`${server.address}/outbox`)).text();
    expect(outbox).toContain('A report of counts for you to look at');
  });

  it('are refused to observers, and unknown to other teams and to visitors', async () => {
    const { id } = await seedLink(server, there);
    const as = async (role: 'observer' | 'stranger') => {
      const person = await seedPerson(server);
      if (role === 'stranger') await seedTeam(server, `t-${person.id.slice(0, 8)}`, [[person, 'lead']]);
      else await addObserver(person.id);
      const other = await (await browser.newContext()).newPage();
      await signIn(other, server.address, person.email, person.password);
      return [
        await make(plainLink, other),
        await other.request.get(root),
        await other.request.get(`${root}/${id}`),
        await other.request.delete(`${root}/${id}`)
      ].map((answer) => answer.status());
    };
    expect(await as('observer')).toEqual([403, 403, 403, 403]);
    expect(await as('stranger')).toEqual([404, 404, 404, 404]);
    expect((await fetch(root)).status).toBe(401);
  });
});

describe('the PDF and the zip of a link', () => {
  it('are made so many times a minute, then refused until later; the page stays, and no visit is used up', async () => {
    const { path, id } = await seedLink(server, there, { shows: 'report' });
    const get = (file: string) => fetch(`${server.address}${path}/${file}`);
    const visits = async () => {
      const { links } = (await (await page.request.get(root)).json()) as { links: TeamLink[] };
      return links.find((link) => link.id === id)?.visits;
    };
    for (let made = 0; made < LINK_FILES.quota; made++)
      expect((await get(made % 2 ? 'bundle.zip' : 'report.pdf')).status, `file ${made}`).toBe(200);
    const before = await visits();
    for (const file of ['report.pdf', 'bundle.zip']) {
      const refused = await get(file);
      expect(refused.status).toBe(429);
      expect(refused.headers.get('content-type')).toBe('application/problem+json');
      const seconds = Number(refused.headers.get('retry-after'));
      expect(seconds).toBeGreaterThanOrEqual(1);
      expect(seconds).toBeLessThanOrEqual(LINK_FILES.window);
      const told = (await refused.json()) as { code: string; title: string };
      expect([told.code, told.title]).toEqual([
        'too-many-requests',
        `Too many files were made through this link. Wait ${seconds} s and ask again.`
      ]);
    }
    expect(await visits()).toBe(before);
    expect((await get('report.json')).status).toBe(200);
    expect((await fetch(server.address + path)).status).toBe(200);
    const other = await seedLink(server, there, { shows: 'report' });
    expect((await fetch(`${server.address}${other.path}/report.pdf`)).status).toBe(200);
  });
});

describe('links on the page of a report', () => {
  it('are made by a form that says what they will do, with an address to copy, and closed', async () => {
    await page.goto(root.replace(/\/links$/, ''), { waitUntil: 'networkidle' });
    const links = page.locator('#links');
    await links.getByRole('button', { name: 'Make a link' }).click();
    await links.getByRole('button', { name: 'Make this link' }).click();
    await links.getByText('Give the link a name').waitFor();
    await links.getByLabel('Your name for it').fill('referee 7');
    await links.getByLabel('Blind: hide team').check();
    await links.getByLabel('Visits at most').fill('2');
    await links.getByText('or after 2 visits').waitFor();
    await links.getByRole('button', { name: 'Make this link' }).click();
    const address = await links.getByLabel('Its address, shown this once').inputValue();
    const opened = await fetch(address);
    expect(opened.status).toBe(200);
    expect(await opened.text()).not.toContain(there.team.name);
    const row = links.locator('li', { hasText: 'referee 7' }).last();
    await row.getByRole('button', { name: 'Close this link …' }).click();
    await row.getByRole('button', { name: 'Close this link', exact: true }).click();
    await row.getByText('closed by the team').waitFor();
    expect((await fetch(address)).status).toBe(410);
  });
});

async function addObserver(personId: string): Promise<void> {
  await withDatabaseOf(server, (db) => {
    db.insert(membership).values({ teamId: there.team.id, personId, role: 'observer', createdAt: 1 }).run();
  });
}
