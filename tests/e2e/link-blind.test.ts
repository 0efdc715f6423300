import { revokeLink } from '$lib/server/services/links/revoke-link';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readPdf } from '../unit/pdf/read-pdf';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
import { seedPerson, withDatabaseOf } from './support/seed-people';
import { secretsOf, seedLink, seedSharedReport, type SharedReport } from './support/shared-report';
import { signIn } from './support/sign-in';
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

/** Everything in a PDF that a reader could find, and the headers it comes with. */
async function pdfTextOf(address: string): Promise<string> {
  const answer = await fetch(address);
  expect(answer.headers.get('content-type')).toBe('application/pdf');
  expect(answer.headers.get('content-disposition')).toContain('filename="severalty-report.pdf"');
  const { marked, objects } = readPdf(new Uint8Array(await answer.arrayBuffer()));
  const text = marked.map(({ text }) => text).join('\n');
  expect(text).toMatch(/independent trials/);
  const info = [...objects.values()].filter((object) => /\/Producer|xpacket/.test(object));
  return [text, JSON.stringify([...answer.headers]), ...info].join('\n').replaceAll('\0', '');
}

describe('a blind link', () => {
  it.each(['report-and-counts', 'report'] as const)(
    'opened by a stranger shows the %s, and no name, id or slug of the team anywhere',
    async (shows) => {
      const { path, token } = await seedLink(server, there, { blind: true, allowsRemarks: true, shows });
      const page = await browser.newPage({ reducedMotion: 'reduce' });
      const complaints = complaintsOf(page);
      await page.goto(server.address + path, { waitUntil: 'networkidle' });
      expect(await page.locator('#answer-heading').textContent()).toMatch(/\S/);
      expect(await page.title()).toBe('A report · Severalty');
      expect(await page.getByRole('link', { name: /^Save (the report|what is shown) as PDF$/ }).count()).toBe(
        1
      );
      const given = [
        await page.content(),
        await (await fetch(`${server.address}${path}`)).text(),
        await (await fetch(`${server.address}${path}/__data.json`)).text(),
        await (await fetch(`${server.address}${path}/report.json`)).text(),
        JSON.stringify([...(await fetch(`${server.address}${path}/report.json`)).headers]),
        await pdfTextOf(`${server.address}${path}/report.pdf`)
      ];
      expect(given[2]).toContain('severalty-report');
      for (const text of given)
        for (const secret of secretsOf(there)) expect(text.includes(secret), secret).toBe(false);
      const counts = /\b(409|611|523|347|163)\b/;
      // The numbers of references in the page's data grow with it: only what they stand for can be a count.
      given[2] = valuesOf(given[2]);
      expect(given[2]).toContain('severalty-report');
      if (shows === 'report') for (const text of given) expect(text).not.toMatch(counts);
      else expect(given[2]).toMatch(counts);
      expect(complaints).toEqual([]);
      expect(server.output()).not.toContain(token);
      await page.close();
    }
  );

  it('says to nobody where its reader came from, is kept by no cache and found by no search', async () => {
    const { path } = await seedLink(server, there, { blind: true });
    for (const address of [
      path,
      `${path}/report.json`,
      `${path}/report.pdf`,
      `${path}/__data.json`,
      '/link/unknown'
    ]) {
      const { headers } = await fetch(server.address + address);
      expect(headers.get('referrer-policy')).toBe('no-referrer');
      expect(headers.get('x-robots-tag')).toMatch(/noindex/);
      expect(headers.get('cache-control')).toBe('no-store');
    }
    expect(await (await fetch(`${server.address}/robots.txt`)).text()).toMatch(/^Disallow: \/link\/$/m);
  });

  it('opens for the referee it names, who signs in from there', async () => {
    const referee = await seedPerson(server, { name: 'Referee Two' });
    const { path } = await seedLink(server, there, {
      blind: true,
      audience: 'named',
      people: [referee.email]
    });
    const page = await browser.newPage();
    const answer = await page.goto(server.address + path);
    expect(answer?.status()).toBe(401);
    await page.getByRole('link', { name: 'Sign in and open it' }).click();
    await page.waitForURL('**/sign-in?**');
    await page.getByLabel('Password').fill(referee.password);
    await page.locator('form:has([name=password]) [name=email]').fill(referee.email);
    await page.locator('form:has([name=password]) [name=email]').press('Enter');
    await page.waitForURL(`**${path}`);
    await page.locator('#answer-heading').waitFor();
    expect(await page.locator('header').first().textContent()).toContain('Referee Two');
    // The form to sign out is sent by the browser itself, from a page that says no-referrer.
    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.waitForURL((url) => !url.pathname.startsWith('/link/'));
    const again = await page.goto(server.address + path);
    expect(again?.status()).toBe(401);
    await page.close();
  });

  it('does not open for somebody else who is signed in', async () => {
    const other = await seedPerson(server);
    const { path } = await seedLink(server, there, { audience: 'named', people: ['someone@example.org'] });
    const page = await browser.newPage();
    await signIn(page, server.address, other.email, other.password);
    expect((await page.goto(server.address + path))?.status()).toBe(403);
    expect(await page.textContent('main')).toMatch(/somebody at another address/);
    await page.close();
  });

  it('is over after its revocation, its expiry and its visits, and says which', async () => {
    const closed = await seedLink(server, there, { blind: true });
    const late = await seedLink(
      server,
      there,
      { blind: true, expiresAt: Date.now() - 1000 },
      Date.now() - 5000
    );
    const once = await seedLink(server, there, { blind: true, visitLimit: 1 });
    const page = await browser.newPage();
    await page.goto(server.address + closed.path);
    await withDatabaseOf(server, (db) => revokeLink(db, there.actor, { report: there.reportId }, closed.id));
    const told = async (path: string, in_ = page) => {
      const answer = await in_.goto(server.address + path);
      return `${answer?.status()} ${await in_.textContent('main')}`;
    };
    expect(await told(closed.path)).toMatch(/^410 .*was closed/s);
    expect(await told(late.path)).toMatch(/^410 .*has expired/s);
    expect(await told(once.path)).toMatch(/^200 /);
    expect(await told(once.path)).toMatch(/^200 /);
    const other = await (await browser.newContext()).newPage();
    expect(await told(once.path, other)).toMatch(/^410 .*as often as it allows/s);
    expect(await told(`/link/${'x'.repeat(43)}`)).toMatch(/^404 /);
    expect(await told('/link/short')).toMatch(/^404 /);
    await other.context().close();
    await page.close();
  });

  it('with a limit of three lets three of thirty in, though two servers are raced', async () => {
    const second = await startServer({ SEVERALTY_DATA: server.data });
    try {
      const { path } = await seedLink(server, there, { visitLimit: 3 });
      const answers = await Promise.all(
        Array.from({ length: 30 }, (_, i) => fetch((i % 2 ? server : second).address + path))
      );
      const statuses = answers.map(({ status }) => status).sort();
      expect(statuses.slice(0, 3)).toEqual([200, 200, 200]);
      expect(new Set(statuses.slice(3))).toEqual(new Set([410]));
    } finally {
      await second.stop();
    }
  });
});

/** Every text and number that a page's data holds: in Kit's flat form, what is no list and no object. */
function valuesOf(data: string): string {
  const { nodes } = JSON.parse(data) as { nodes: ({ data?: unknown[] } | null)[] };
  return JSON.stringify(nodes.flatMap((node) => node?.data ?? []).filter((one) => typeof one !== 'object'));
}
