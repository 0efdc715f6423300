import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, openAuditPage } from './support/axe';
import { openBrowser } from './support/open-browser';
import { screenshots } from './support/screenshots';
import { seedPerson, seedTeam } from './support/seed-people';
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

async function leadOf(slug: string) {
  const lead = await seedPerson(server, { name: 'Lena Invented' });
  const team = await seedTeam(server, slug, [[lead, 'lead']]);
  return { lead, team };
}

describe('access', () => {
  it.each(['light', 'dark'] as const)('axe finds nothing on the pages of a team, %s', async (colorScheme) => {
    const { lead, team } = await leadOf(`axe-${colorScheme}`);
    const page = await openAuditPage(browser, { colorScheme, reducedMotion: 'reduce' });
    await signIn(page, server.address, lead.email, lead.password);
    for (const path of ['', '/members', '/events', '/settings', '/scripts', '/devices', '/aside', '/leave']) {
      await page.goto(`${server.address}/team/${team.slug}${path}`, { waitUntil: 'networkidle' });
      expect(await audit(page), path).toEqual([]);
    }
    await page.context().close();
  });

  it('no page of a team scrolls sideways on a phone', async () => {
    const lead = await seedPerson(server, { name: 'Wilhelmina-Theodora Inventedlongname of the Other Side' });
    const team = await seedTeam(server, 'a-team-with-a-rather-long-word', [[lead, 'lead']]);
    const page = await browser.newPage({ viewport: { width: 390, height: 800 } });
    await signIn(page, server.address, lead.email, lead.password);
    for (const path of ['', '/members', '/events', '/settings', '/scripts', '/devices', '/aside', '/leave']) {
      await page.goto(`${server.address}/team/${team.slug}${path}`, { waitUntil: 'networkidle' });
      expect(await page.evaluate(() => document.documentElement.scrollWidth), path).toBeLessThanOrEqual(390);
    }
    await page.close();
  });
});

describe('pictures', () => {
  it('are made where SCREENSHOTS asks for them', async () => {
    if (!process.env.SCREENSHOTS) return;
    const { lead, team } = await leadOf('pictures');
    for (const path of ['', 'members', 'events', 'settings', 'scripts', 'devices', 'aside', 'leave'])
      await screenshots(
        browser,
        `${server.address}/team/${team.slug}/${path}`,
        `team-${path}`,
        async (page) => {
          await signIn(page, server.address, lead.email, lead.password);
          await page.goto(`${server.address}/team/${team.slug}/${path}`, { waitUntil: 'networkidle' });
        }
      );
  });
});
