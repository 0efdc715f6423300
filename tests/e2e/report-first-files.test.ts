import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { openBrowser } from './support/open-browser';
import { seedLink, seedSharedReport, type SharedReport } from './support/shared-report';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';
import { unrolled } from './support/unrolled';

// What a report begins with is named in its head, so that it comes while the page is being drawn. Scripts found out
// about only when the page runs come a quarter of a second later on a slow processor.

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

/** The page for what cannot be shown, which Kit fetches beside every page and waits for with none. */
const OF_ERRORS = /This page could not be made|Go to your teams/;

it.each(['the team', 'a link'])(
  'a report of %s names all the scripts it begins with in its head',
  async (whose) => {
    const page = await (await browser.newContext({ viewport: { width: 1280, height: 900 } })).newPage();
    if (whose === 'the team') await signIn(page, server.address, there.lead.email, there.lead.password);
    const path =
      whose === 'the team'
        ? `/team/${there.team.slug}/reports/${there.reportId}`
        : (await seedLink(server, there)).path;
    const asked: string[] = [];
    await page.goto('about:blank');
    page.on('request', (request) => {
      if (request.resourceType() === 'script') asked.push(new URL(request.url()).pathname);
    });
    const answer = await page.goto(server.address + path, { waitUntil: 'networkidle' });
    await unrolled(page);
    const head = `${answer!.headers()['link'] ?? ''}\n${await answer!.text()}`;
    const named = (file: string): boolean => head.includes(file.split('/').at(-1)!);
    expect(asked.filter(named).length).toBeGreaterThan(5);
    const late = asked.filter((file) => !named(file));
    const texts = await Promise.all(late.map(async (file) => (await fetch(server.address + file)).text()));
    expect(late.filter((_, i) => !OF_ERRORS.test(texts[i]!))).toEqual([]);
    await page.context().close();
  }
);
