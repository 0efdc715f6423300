import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit } from './support/axe';
import { openBrowser } from './support/open-browser';
import { seedLink, seedSharedReport, type SharedReport } from './support/shared-report';
import { signIn } from './support/sign-in';
import { spokenPage } from './support/spoken-page';
import { unrolled } from './support/unrolled';
import { startServer, type RunningServer } from './support/start-server';
import { watchScripts, watchShifts } from './support/watch-page';

let server: RunningServer;
let browser: Browser;
let there: SharedReport;
/** Addresses of the report as its team and as a referee sees it. */
let paths: { team: string; link: string };

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
  there = await seedSharedReport(server);
  const { path } = await seedLink(server, there);
  paths = { team: `/team/${there.team.slug}/reports/${there.reportId}`, link: path };
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

/** A page of the lead, where nothing is open yet. */
async function pageOfLead(
  options: Parameters<Browser['newContext']>[0] = {}
): Promise<{ page: Page; context: BrowserContext }> {
  const context = await browser.newContext({ reducedMotion: 'reduce', ...options });
  const page = await context.newPage();
  await signIn(page, server.address, there.lead.email, there.lead.password);
  return { page, context };
}

const CONTROLS = [
  'button',
  'link',
  'textbox',
  'combobox',
  'checkbox',
  'radio',
  'application',
  'DisclosureTriangle'
];

describe.each(['team', 'link'] as const)('the report page of the %s', (who) => {
  it.each([390, 1280])('does not move while it loads, %i px wide', async (width) => {
    const { page, context } = await pageOfLead({ viewport: { width, height: 900 } });
    const shifts = await watchShifts(page);
    await page.goto(server.address + paths[who], { waitUntil: 'networkidle' });
    // Charts are made live as one comes near or touches them: nothing may grow then, in view or below it.
    const figures = await page.locator('figure').all();
    expect(figures).toHaveLength(7);
    for (const figure of figures) {
      await figure.scrollIntoViewIfNeeded();
      // Where the server's drawing has the right size it stands until it is touched.
      await figure.getByRole('application').hover();
      await figure.locator('svg.drawn').waitFor();
      await page.waitForTimeout(100);
    }
    const { sum, what } = await shifts();
    expect(sum, what.join('\n')).toBeLessThan(0.01);
    await context.close();
  });

  it('loads less than 120 kB of JavaScript', async () => {
    const { page, context } = await pageOfLead();
    const scripts = watchScripts(page);
    await page.goto(server.address + paths[who], { waitUntil: 'networkidle' });
    const { files, bytes } = await scripts();
    expect(files.length).toBeGreaterThan(5);
    expect(bytes).toBeLessThan(120_000);
    await context.close();
  });

  it('is read out in a sceptic’s order, each control under a name of its own', async () => {
    const { page, context } = await pageOfLead();
    await page.goto(server.address + paths[who], { waitUntil: 'networkidle' });
    await unrolled(page);
    const spoken = await spokenPage(page);
    const headings = spoken.filter(({ role }) => role === 'heading');
    expect(headings.filter(({ level }) => level === 1)).toHaveLength(1);
    headings.reduce((before, { name, level }) => {
      expect(level ?? 0, name).toBeLessThanOrEqual(before + 1);
      return level ?? 0;
    }, 0);
    const order = [
      'What was given',
      'Counts against the best law',
      'Rate function',
      'Both tails',
      'Cumulants and the ceiling',
      'Tests',
      'What the counts point to',
      'Method and cautions',
      'Where this '
    ].map((title) => headings.findIndex(({ name, level }) => level === 2 && name.startsWith(title)));
    expect(order).not.toContain(-1);
    expect(order).toEqual([...order].sort((a, b) => a - b));

    for (const role of ['main', 'banner', 'contentinfo'])
      expect(spoken.filter((one) => one.role === role).length, role).toBe(1);
    const navigations = spoken.filter(({ role }) => role === 'navigation').map(({ name }) => name);
    expect(navigations).not.toContain('');
    expect(new Set(navigations).size).toBe(navigations.length);

    const figures = spoken.filter(({ role }) => role === 'figure').map(({ name }) => name);
    expect(figures).toHaveLength(7);
    for (const name of figures) {
      expect(name.split(' ').length).toBeGreaterThan(4);
      expect(spoken.filter((one) => one.role === 'application' && one.name === name)).toHaveLength(1);
    }
    const controls = spoken.filter(({ role }) => CONTROLS.includes(role));
    expect(controls.filter(({ name }) => name === '')).toEqual([]);
    const pressed = controls
      .filter(({ role }) => role !== 'link')
      .map(({ role, name, group }) => `${role} ${name}, ${group}`);
    expect(pressed.length).toBeGreaterThan(20);
    expect(pressed.filter((name, i) => pressed.indexOf(name) !== i)).toEqual([]);
    await context.close();
  });

  it('is walked by keyboard in its reading order, every stop seen, to the end', async () => {
    const { page, context } = await pageOfLead();
    await page.goto(server.address + paths[who], { waitUntil: 'networkidle' });
    const stops: string[] = [];
    for (let i = 0; i < 300; i++) {
      await page.keyboard.press('Tab');
      const stop = await page.evaluate(() => {
        const memory = window as unknown as { before: Element | null };
        const now = document.activeElement;
        if (!now || now === document.body) return null;
        const { before } = memory;
        memory.before = now;
        const style = getComputedStyle(now);
        return {
          name: `${now.nodeName} ${now.getAttribute('aria-label') ?? now.textContent?.trim().slice(0, 40)}`,
          seen: style.outlineStyle !== 'none' && parseFloat(style.outlineWidth) >= 2,
          onward: !before || !!(before.compareDocumentPosition(now) & Node.DOCUMENT_POSITION_FOLLOWING)
        };
      });
      // Past the last stop the focus leaves the page: no trap.
      if (!stop) break;
      expect(stop.seen, stop.name).toBe(true);
      expect(stop.onward, stop.name).toBe(true);
      stops.push(stop.name);
    }
    const reachable = await page.evaluate(
      () =>
        [
          ...document.querySelectorAll<HTMLElement | SVGElement>(
            'a[href], button, input, select, textarea, summary, [tabindex="0"]'
          ),
          // Chromium stops at what scrolls and has nothing in it to stop at, or its end could not be read by keyboard.
          ...[...document.querySelectorAll<HTMLElement>('body *:not([tabindex])')].filter(
            (one) =>
              ['auto', 'scroll'].includes(getComputedStyle(one).overflowX) &&
              one.scrollWidth > one.clientWidth &&
              !one.querySelector('a[href], button, summary, [tabindex="0"]')
          )
        ]
          .filter(
            (one) =>
              !one.matches(':disabled') &&
              (one.tabIndex >= 0 || !one.matches('[tabindex]')) &&
              one.checkVisibility()
          )
          // Of a group of radio buttons the keyboard stops at one.
          .filter((one) => !(one instanceof HTMLInputElement && one.type === 'radio' && !one.checked)).length
    );
    expect(stops.length).toBe(reachable);
    await context.close();
  });

  it.each(['light', 'dark'] as const)('has nothing for axe with its tables open, %s', async (colorScheme) => {
    const { page, context } = await pageOfLead({ colorScheme, bypassCSP: true });
    await page.goto(server.address + paths[who], { waitUntil: 'networkidle' });
    const tables = await page.locator('figure summary').all();
    expect(tables.length).toBeGreaterThan(5);
    for (const table of tables) await table.click();
    expect(await audit(page)).toEqual([]);
    await context.close();
  });
});
