import { DEMO_PASSWORD, DEMO_PEOPLE } from '$lib/server/services/demo-team/demo-people';
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demoAddresses, demoIsReady } from './support/demo-addresses';
import { openBrowser } from './support/open-browser';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

/** The invented team begins with diagnoses of its own. */
const PATIENCE = 100_000;
let server: RunningServer;
let browser: Browser;
let context: BrowserContext;
let addresses: Record<string, string[]>;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer({ SEVERALTY_DEMO: 'yes' }), openBrowser()]);
  await demoIsReady(server, PATIENCE);
  addresses = await demoAddresses(server);
  context = await browser.newContext({ javaScriptEnabled: false, reducedMotion: 'reduce' });
  const page = await context.newPage();
  await signIn(page, server.address, DEMO_PEOPLE[0].email, DEMO_PASSWORD);
  await page.close();
}, PATIENCE + 60_000);

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

/**
 * What stands there to be used and does nothing where no script runs: a button that sends no form, a field of no form or of
 * one that cannot be sent, a form that says nothing of how it is sent (a script takes it), a link that leads nowhere, a
 * part that plays a control. What is closed in `details` is opened first.
 */
async function deadControls(page: Page): Promise<string[]> {
  return page.evaluate(() => {
    for (const one of document.querySelectorAll('details')) one.open = true;
    const seen = (one: Element) => one.checkVisibility({ visibilityProperty: true });
    const sends = (form: HTMLFormElement | null) =>
      form !== null &&
      form.hasAttribute('method') &&
      [...form.elements].some(
        (one) => one instanceof HTMLButtonElement && one.type === 'submit' && seen(one)
      );
    const dead = [...document.querySelectorAll('button, input, select, textarea, a, form, [role]')].filter(
      (one) => {
        if (!seen(one)) return false;
        if (one instanceof HTMLFormElement) return !sends(one);
        if (one instanceof HTMLAnchorElement) return !one.getAttribute('href');
        if (one instanceof HTMLButtonElement)
          return !one.disabled && (one.type !== 'submit' || !sends(one.form));
        if (
          one instanceof HTMLInputElement ||
          one instanceof HTMLSelectElement ||
          one instanceof HTMLTextAreaElement
        )
          return !one.disabled && !('readOnly' in one && one.readOnly) && !sends(one.form);
        return /^(button|slider|tab|menuitem|switch|combobox)$/.test(one.getAttribute('role') ?? '');
      }
    );
    return dead.map((one) => {
      const words = (one.textContent || one.getAttribute('aria-label') || '').trim().replace(/\s+/g, ' ');
      return `${one.tagName.toLowerCase()} ${one.id || one.getAttribute('name') || ''} “${words.slice(0, 60)}”`;
    });
  });
}

async function picture(page: Page, name: string): Promise<void> {
  const folder = process.env.SCREENSHOTS;
  if (!folder) return;
  mkdirSync(folder, { recursive: true });
  await page.screenshot({ path: join(folder, `without-scripts-${name}.png`), fullPage: true });
}

describe('without scripts', () => {
  it('nothing stands on a page that does nothing', async () => {
    const found: Record<string, string[]> = {};
    const stranger = await browser.newContext({ javaScriptEnabled: false });
    for (const [route, all] of Object.entries(addresses))
      for (const address of all) {
        // Whoever is signed in is led on from the pages that sign in.
        const page = await (/sign-in|password|invitation/.test(route) ? stranger : context).newPage();
        await page.goto(server.address + address);
        const dead = await deadControls(page);
        if (dead.length > 0) found[address] = dead;
        await page.close();
      }
    await stranger.close();
    expect(found).toEqual({});
  }, 300_000);

  it('the search for what is dead finds what a script would have to serve', async () => {
    const page = await context.newPage();
    await page.setContent(
      '<form><input name="lost"></form><form method="get"><select name="kept"></select><button>Go</button></form>' +
        '<button type="button">Dead</button><a>Nowhere</a><a href="/">Home</a><button hidden>Away</button>'
    );
    expect(await deadControls(page)).toEqual(['form  “”', 'input lost “”', 'button  “Dead”', 'a  “Nowhere”']);
    await page.close();
  });

  it('a page says what needs scripts and offers what does not', async () => {
    const page = await context.newPage();
    await page.goto(`${server.address}/`);
    // Words in noscript are none to a search by text.
    const said = page.locator('noscript p').first();
    expect(await said.isVisible()).toBe(true);
    expect(await said.textContent()).toMatch(/needs JavaScript/);
    await picture(page, 'first-page');
    await said.locator('a').click();
    expect(new URL(page.url()).pathname).toBe('/guide');
    const [link] = addresses['/link/[token]'];
    await page.goto(server.address + link);
    await picture(page, 'link');
    expect(await page.getByRole('button', { name: /^Save as/ }).count()).toBe(0);
    expect(await page.getByRole('button', { name: 'Recompute this report' }).count()).toBe(0);
    expect(await page.getByRole('link', { name: 'Save the document as JSON' }).count()).toBeGreaterThan(0);
    await page.close();
  });

  it('a remark takes along the name that its reader signs with, and keeps it when refused', async () => {
    const stranger = await browser.newContext({ javaScriptEnabled: false });
    const page = await stranger.newPage();
    const [link] = addresses['/link/[token]'];
    await page.goto(server.address + link);
    expect(await page.getByLabel('Sign your remarks as').count()).toBe(1);
    expect(await page.getByLabel('Sign your remarks as').isVisible()).toBe(false);
    const remarks = page.locator('#remarks-tails');
    await remarks.locator('summary').first().click();
    await remarks.getByLabel('A new remark').fill('  ');
    await remarks.getByLabel('Sign it as').fill('Referee Three');
    await remarks.getByRole('button', { name: 'Make this remark' }).click();
    await remarks.getByRole('alert').waitFor();
    expect(await remarks.getByLabel('Sign it as').inputValue()).toBe('Referee Three');
    await remarks.getByLabel('A new remark').fill('Signed on paper.');
    await remarks.getByRole('button', { name: 'Make this remark' }).click();
    await page.getByText('Signed on paper.').waitFor();
    expect(await remarks.locator('article').last().textContent()).toContain('Referee Three');
    await stranger.close();
  });
});
