import { makeLink } from '$lib/server/services/links/make-link';
import { saveReport } from '$lib/server/services/reports/save-report';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { plainLink } from '../support/links';
import { diagnoseInvented, inventedCounts, makeDataset } from '../support/saved-reports';
import { readPdf } from '../unit/pdf/read-pdf';
import { complaintsOf } from './support/complaints';
import { layoutFaults } from './support/layout-faults';
import { openBrowser } from './support/open-browser';
import { seedPerson, seedTeam, withDatabaseOf } from './support/seed-people';
import { signIn } from './support/sign-in';
import { unrolled } from './support/unrolled';
import { startServer, type RunningServer } from './support/start-server';

/** Invented: what people may type, each in every field that takes words. */
const TYPED = {
  long: 'x'.repeat(180),
  arabic: 'سلسلة الباردة ٣',
  hebrew: 'שרשרת קרה 3 \u202eabc',
  devanagari: 'ठंडी शृंखला ६०',
  cjk: '低温リング第三号機量子研究室',
  combining: 'Z\u0338\u0322a\u0356l\u0336go\u0308 n̈ ħ̂ run',
  emoji: '🧊👩🏽‍🔬 run 7',
  markup: '<script>window.hurt = 1</script><img src=x onerror="window.hurt = 2">'
};

let server: RunningServer;
let browser: Browser;
let context: BrowserContext;
const paths: Record<string, { report: string; compare: string; link: string }> = {};

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
  const lead = await seedPerson(server, { name: 'Ibexia Invented' });
  const team = await seedTeam(server, 'hostile', [[lead, 'lead']]);
  const { document, options } = await diagnoseInvented();
  // As an engine wrote it that did not have every field yet.
  const older = JSON.parse(JSON.stringify(document)) as typeof document;
  older.engine.version = '0.0.1';
  Reflect.deleteProperty(older, 'notRun');
  Reflect.deleteProperty(older.fit, 'omitted');
  await withDatabaseOf(server, (db) => {
    for (const [key, typed] of Object.entries(TYPED)) {
      const datasetId = makeDataset(db, team.id, lead.id, {
        ...{
          name: typed,
          device: typed,
          firmware: typed,
          group: typed,
          trialsWhy: typed,
          postSelection: typed
        },
        notes: `${typed}\n${typed}`,
        trials: 12,
        counts: JSON.stringify(inventedCounts)
      });
      const ids = [older, document].map(
        (kept) =>
          db.transaction((tx) =>
            saveReport(tx, { teamId: team.id, datasetId, createdBy: lead.id, document: kept, options })
          ).id
      );
      const actor = { personId: lead.id, teamId: team.id, role: 'lead' as const };
      const link = makeLink(db, actor, { report: ids[0] }, plainLink, Date.now());
      if (!link.ok) throw new Error(link.reason);
      const root = `/team/${team.slug}/reports`;
      paths[key] = {
        report: `${root}/${ids[0]}`,
        compare: `${root}/compare?a=${ids[0]}&b=${ids[1]}`,
        link: `/link/${link.token}`
      };
    }
  });
  context = await browser.newContext({ viewport: { width: 390, height: 900 }, reducedMotion: 'reduce' });
  const page = await context.newPage();
  await signIn(page, server.address, lead.email, lead.password);
  await page.close();
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

const PAGES = ['report', 'compare', 'link'] as const;
const shown = async (page: Page) => {
  await unrolled(page);
  return (await page.locator('main').innerText()).replace(/\s+/g, ' ');
};

describe.each(Object.entries(TYPED))('words of kind %s', (key, typed) => {
  it.each(PAGES)('on the %s page are shown as typed, do nothing, and fit a telephone', async (which) => {
    const page = await context.newPage();
    const complaints = complaintsOf(page);
    await page.goto(server.address + paths[key][which], { waitUntil: 'networkidle' });
    // The sign that turns direction is there or not, but what it holds is.
    expect(await shown(page)).toContain(typed.replace(/\s+/g, ' '));
    expect(await page.title()).toContain(which === 'link' ? 'Severalty' : typed.slice(0, 20));
    expect(await page.evaluate(() => 'hurt' in window)).toBe(false);
    expect(await page.locator('img[src="x"]').count()).toBe(0);
    if (which !== 'compare') expect(await shown(page)).toContain('Made by engine 0.0.1');
    expect(await layoutFaults(page)).toEqual([]);
    expect(complaints).toEqual([]);
    await page.close();
  });
});

describe.each(Object.entries(TYPED))('words of kind %s in the PDF', (key, typed) => {
  it.each(['report', 'link'] as const)(
    'of the %s are there, letter by letter, and no larger file for it',
    async (which) => {
      const page = await context.newPage();
      const answer = await page.request.get(`${server.address}${paths[key][which]}/report.pdf`);
      expect(answer.status()).toBe(200);
      const bytes = await answer.body();
      expect(bytes.length).toBeLessThan(300_000);
      const { text, unmarked } = readPdf(bytes);
      expect(unmarked).toEqual([]);
      expect(text).not.toMatch(/[\ufffd\0\u202a-\u202e\u2066-\u2069]/);
      // Lines from the right stand turned on paper, and long words are cut: each letter by itself.
      const letters = [
        ...new Set(typed.normalize('NFC').match(/[\p{L}\p{N}\p{Extended_Pictographic}<>=]/gu))
      ];
      const missing = letters.filter((letter) => !text.includes(letter));
      // A picture that no font has is spelled out: ⟨U+1F9CA⟩.
      const spelled = (sign: string) => `⟨U+${sign.codePointAt(0)!.toString(16).toUpperCase()}⟩`;
      expect(missing.filter((sign) => /[\p{L}\p{N}]/u.test(sign) || !text.includes(spelled(sign)))).toEqual(
        []
      );
      if (key === 'markup') expect(text).toContain('<img src=x onerror="window.hurt = 2">');
      if (key === 'long') expect(text.replaceAll(' ', '')).toContain(typed);
      await page.close();
    }
  );
});

it('words from right to left are set from the right, and the report’s own words around them are not', async () => {
  const page = await context.newPage();
  await page.goto(server.address + paths.hebrew.link, { waitUntil: 'networkidle' });
  const fact = (what: string) =>
    page
      .locator('header dt', { hasText: what })
      .locator('xpath=following-sibling::dd[1]')
      .evaluate((element) => getComputedStyle(element).direction);
  expect(await fact('Notes')).toBe('rtl');
  expect(await fact('Made on')).toBe('ltr');
  const own = page.locator('#nuisances dd', { hasText: 'Stated: “' });
  expect(await own.evaluate((element) => getComputedStyle(element).direction)).toBe('ltr');
  // What turns direction is taken out of what stands within a sentence.
  expect(await own.innerText()).not.toContain('\u202e');
  await page.close();
});
