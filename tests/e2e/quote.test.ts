import { createHash } from 'node:crypto';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, openAuditPage } from './support/axe';
import { answerOf, openCheck, savedDocument, WELDON_ADDRESS } from './support/check-page';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
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

const block = (page: Page, title: string) =>
  page.locator('#quote').getByRole('group', { name: title, exact: true });
const wordsOf = async (page: Page, title: string): Promise<string> =>
  (await block(page, title).locator('.words').textContent()) ?? '';

describe('words to quote', () => {
  it('of a result are copied in three notations by keyboard, and the copying is said', async () => {
    const { page, complaints } = await openCheck(browser, server.address);
    await page.context().grantPermissions(['clipboard-read', 'clipboard-write']);
    await page.goto(`${server.address}/#${WELDON_ADDRESS}`);
    await answerOf(page);
    const copied = () => page.evaluate(() => navigator.clipboard.readText());
    expect(await wordsOf(page, 'Result')).toMatch(
      /^The counts of 26\u202f306 shots of N = 12 trials each are compatible with independent trials\. The mean is 4\.052 \(/
    );
    const methods = block(page, 'Methods paragraph');
    await methods.getByRole('button', { name: 'Copy the methods paragraph', exact: true }).press('Enter');
    await expect.poll(() => methods.getByRole('status').textContent()).toBe('Copied: the methods paragraph.');
    expect(await copied()).toBe(await wordsOf(page, 'Methods paragraph'));

    await page.getByRole('radio', { name: 'plain text' }).focus();
    await page.keyboard.press('ArrowRight');
    // What was said was said of the other notation.
    await expect.poll(() => methods.getByRole('status').textContent()).toBe('');
    expect(await wordsOf(page, 'Result')).toContain('$26\\,306$ shots of $N = 12$ trials');
    await block(page, 'Result').getByRole('button', { name: 'Copy the result in LaTeX' }).press('Space');
    await expect.poll(copied).toBe(await wordsOf(page, 'Result'));
    await page.keyboard.press('Tab');
    await page.getByRole('radio', { name: 'LaTeX' }).focus();
    await page.keyboard.press('ArrowRight');
    expect(await wordsOf(page, 'Result')).toContain(
      '*N* = 12 trials each are *compatible with independent trials*'
    );

    // The entry names the very file that is saved.
    const { text } = await savedDocument(page);
    const sha256 = createHash('sha256').update(text).digest('hex');
    const entry = await wordsOf(page, 'Citation, for BibTeX');
    expect(entry.replaceAll('\\allowbreak{}', '')).toContain(`Document sha256 \\texttt{${sha256}}`);
    expect(entry).not.toMatch(/url|howpublished|year/);
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('are selected where the clipboard is refused', async () => {
    const page = await browser.newPage();
    // As on plain http, where browsers have no clipboard.
    await page.addInitScript(() => Object.defineProperty(navigator, 'clipboard', { value: undefined }));
    const { path } = await seedLink(server, there);
    await page.goto(server.address + path, { waitUntil: 'networkidle' });
    const citation = block(page, 'Citation, for BibTeX');
    await citation.getByRole('button', { name: 'Copy the citation' }).click();
    await expect
      .poll(() => citation.getByRole('status').textContent())
      .toMatch(/would not let it be copied: it is selected/);
    expect(await page.evaluate(() => String(getSelection()).trim())).toBe(
      await wordsOf(page, 'Citation, for BibTeX')
    );
    await page.close();
  });

  it('of a saved report name team and dataset, and no address that only the team can open', async () => {
    const page = await browser.newPage();
    await signIn(page, server.address, there.lead.email, there.lead.password);
    await page.goto(`${server.address}/team/${there.team.slug}/reports/${there.reportId}`);
    const entry = await wordsOf(page, 'Citation, for BibTeX');
    expect(entry).toContain(`author = {{${there.team.name}}}`);
    expect(entry).toContain('title = {Report 1 on {Wombat run}: counts');
    expect(entry).not.toMatch(/url|howpublished/);
    expect(await wordsOf(page, 'Methods paragraph')).toContain(
      '“Wombat run” of group Numbatzone from Okapitron with firmware fw-zebu-7'
    );
    await page.close();
  });

  it.each(['report-and-counts', 'report'] as const)(
    'of a blind link that shows the %s have its address and no name, and stand there without scripts',
    async (shows) => {
      const { path } = await seedLink(server, there, { blind: true, shows });
      const context = await browser.newContext({ javaScriptEnabled: false });
      const page = await context.newPage();
      await page.goto(server.address + path);
      const section = page.locator('#quote');
      expect(await section.getByRole('button').filter({ visible: true }).count()).toBe(0);
      expect(await section.getByRole('radio').filter({ visible: true }).count()).toBe(0);
      expect(await wordsOf(page, 'Result')).toMatch(/^The counts of 2\u202f273 shots of N = 24 trials each /);
      const entry = await wordsOf(page, 'Citation, for BibTeX');
      expect(entry).toContain(`url = {${server.address}${path}}`);
      expect(entry).toContain('author = {{Severalty report}}');
      expect(entry).not.toMatch(/year|month/);
      const all = (await section.textContent()) ?? '';
      for (const secret of secretsOf(there)) expect(all.includes(secret), secret).toBe(false);
      expect(/[0-9a-f]{16}/.test(all.replaceAll(path, ''))).toBe(shows === 'report-and-counts');
      await context.close();
    }
  );

  it.each([390, 1280])('meet WCAG 2.2 AA at %i px, and fit', async (width) => {
    const { path } = await seedLink(server, there);
    const page = await openAuditPage(browser, { viewport: { width, height: 900 }, reducedMotion: 'reduce' });
    const complaints = complaintsOf(page);
    await page.goto(server.address + path, { waitUntil: 'networkidle' });
    await page.getByRole('radio', { name: 'LaTeX' }).check();
    expect(await audit(page)).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width);
    expect(complaints).toEqual([]);
    await page.context().close();
  });
});
