import { makeLink } from '$lib/server/services/links/make-link';
import { addRemark } from '$lib/server/services/remarks/add-remark';
import { saveReport } from '$lib/server/services/reports/save-report';
import { REMARK_SECTIONS } from '$lib/model/team/remarks/sections';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { mkdirSync } from 'node:fs';
import { writeFile } from 'node:fs/promises';
import { join } from 'node:path';
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

/** Invented. Longer than the forms take: what came in by an archive or an older version may be. */
const LONG = 'Q7'.repeat(150);
const MARKUP = '</script><img src=x onerror="alert(1)"><svg onload=alert(2)>';
const LATEX = '\\input{/etc/passwd}\\write18{ls} $\\frac{1}{0}$ %_&#~^ {';
const TURNED = 'ring\u202egnir\u202c \u2066left\u2069';
/** A script that a Latin font has nothing of in each field, beside the long, the marked up and the turned. */
const CONDITIONS = {
  name: `${LONG} 低温リング第三号機`,
  device: `سلسلة الباردة ٣ ${TURNED}`,
  firmware: `ठंडी शृंखला ६० ${MARKUP}`,
  trialsWhy: `${LATEX} 🧊👩🏽‍🔬.`,
  postSelection: `${MARKUP} עם שרשרת קרה.`,
  notes: `${LONG}\n${MARKUP}\n${LATEX}\nשרשרת קרה 3 ${TURNED}\n低温リング`
};
const REMARK = `${LONG} ${MARKUP} ${LATEX} سلسلة 低温 🧊`;

let server: RunningServer;
let browser: Browser;
let paths: { report: string; compare: string; link: string; reports: string; datasets: string };
let person: { email: string; password: string };

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
  const lead = await seedPerson(server, { name: 'Ibexia Invented' });
  person = lead;
  const team = await seedTeam(server, 'hostile-all', [[lead, 'lead']]);
  const made = await Promise.all([diagnoseInvented(), diagnoseInvented({ trials: null })]);
  await withDatabaseOf(server, (db) => {
    const datasetId = makeDataset(db, team.id, lead.id, {
      ...CONDITIONS,
      trials: 12,
      counts: JSON.stringify(inventedCounts)
    });
    const ids = made.map(
      ({ document, options }) =>
        db.transaction((tx) =>
          saveReport(tx, { teamId: team.id, datasetId, createdBy: lead.id, document, options })
        ).id
    );
    const actor = { personId: lead.id, teamId: team.id, role: 'lead' as const };
    for (const section of REMARK_SECTIONS.slice(0, 3)) {
      const input = { section, threadId: null, body: REMARK, reportId: ids[0] };
      expect(addRemark(db, { kind: 'member', actor }, input).ok).toBe(true);
    }
    const link = makeLink(
      db,
      actor,
      { report: ids[0] },
      { ...plainLink, label: CONDITIONS.device },
      Date.now()
    );
    if (!link.ok) throw new Error(link.reason);
    const root = `/team/${team.slug}`;
    paths = {
      report: `${root}/reports/${ids[0]}`,
      compare: `${root}/reports/compare?a=${ids[0]}&b=${ids[1]}`,
      link: `/link/${link.token}`,
      reports: `${root}/reports`,
      datasets: `${root}/datasets`
    };
  });
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

/** A page of the lead that keeps what it complains about and every dialog it opens. */
async function openPage(
  width: number,
  colorScheme: 'light' | 'dark'
): Promise<{ context: BrowserContext; page: Page; complaints: string[] }> {
  const context = await browser.newContext({
    viewport: { width, height: 900 },
    colorScheme,
    reducedMotion: 'reduce'
  });
  const page = await context.newPage();
  await signIn(page, server.address, person.email, person.password);
  const complaints = complaintsOf(page);
  page.on('dialog', (dialog) => {
    complaints.push(`dialog: ${dialog.message()}`);
    void dialog.dismiss();
  });
  return { context, page, complaints };
}

/** Where SCREENSHOTS names a folder: a picture to look at. */
async function keep(name: string, bytes: () => Promise<Uint8Array>): Promise<void> {
  const folder = process.env.SCREENSHOTS;
  if (!folder) return;
  mkdirSync(folder, { recursive: true });
  await writeFile(join(folder, name), await bytes());
}

const oneBlank = (text: string) => text.replace(/\s+/g, ' ');

describe.each([
  [390, 'light'],
  [390, 'dark'],
  [1280, 'light'],
  [1280, 'dark']
] as const)('at %i px, %s, every field full of hostile words', (width, scheme) => {
  it.each(['report', 'link', 'compare', 'reports', 'datasets'] as const)(
    'the %s page shows them as text, runs nothing, and fits',
    async (which) => {
      const { context, page, complaints } = await openPage(width, scheme);
      await page.goto(server.address + paths[which], { waitUntil: 'networkidle' });
      // Folded parts lay out too, and charts are made live as one comes near.
      await page.locator('main details').evaluateAll((all: HTMLDetailsElement[]) => {
        for (const one of all) one.open = true;
      });
      for (const figure of await page.locator('main figure').all()) await figure.scrollIntoViewIfNeeded();
      await page.waitForLoadState('networkidle');
      await unrolled(page);
      await keep(`hostile-${which}-${width}-${scheme}.png`, () => page.screenshot({ fullPage: true }));

      const text = oneBlank(await page.locator('main').innerText());
      const asTyped = which === 'report' || which === 'link' ? Object.values(CONDITIONS) : [CONDITIONS.name];
      // Signs that turn direction are taken out of what stands within a sentence; the letters stay.
      const letters = (words: string) => oneBlank(words.replace(/[\u202a-\u202e\u2066-\u2069]/g, ''));
      for (const words of asTyped) expect(letters(text)).toContain(letters(words));
      if (which === 'report') expect(text).toContain(REMARK);
      expect(await page.locator('main img').count()).toBe(0);
      expect(await page.locator('main svg[onload]').count()).toBe(0);
      expect(await layoutFaults(page)).toEqual([]);
      expect(complaints).toEqual([]);
      await context.close();
    }
  );
});

describe('the PDF of that report', () => {
  it.each(['report', 'link'] as const)(
    'of the %s is there, with every letter of every field',
    async (which) => {
      const { context, page } = await openPage(1280, 'light');
      const answer = await page.request.get(`${server.address}${paths[which]}/report.pdf`);
      expect(answer.status()).toBe(200);
      const bytes = await answer.body();
      await keep(`hostile-${which}.pdf`, async () => bytes);
      expect(bytes.length).toBeLessThan(300_000);
      const { text, unmarked } = readPdf(bytes);
      expect(unmarked).toEqual([]);
      expect(text).not.toMatch(/[\ufffd\0\u202a-\u202e\u2066-\u2069]/);
      const unbroken = text.replaceAll(' ', '');
      for (const words of [LONG, MARKUP, LATEX, '低温リング第三号機'])
        expect(unbroken).toContain(words.replaceAll(' ', ''));
      // Lines from the right stand turned on paper: each letter by itself.
      for (const letter of new Set('سلسلةالباردةשרשרתקרהठंडीशृंखला६०')) expect(text).toContain(letter);
      await context.close();
    }
  );
});
