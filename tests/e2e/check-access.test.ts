import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, openAuditPage } from './support/axe';
import { answerOf, openCheck, WELDON, WELDON_ADDRESS } from './support/check-page';
import { openBrowser } from './support/open-browser';
import { screenshots } from './support/screenshots';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let browser: Browser;
const ACCIDENTS = 'counts=0:447,1:132,2:42,3:21,4:3,5:2&sum=647';

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

describe('access', () => {
  it.each(['light', 'dark'] as const)('axe finds nothing on a result, %s', async (colorScheme) => {
    const page = await openAuditPage(browser, { colorScheme, reducedMotion: 'reduce' });
    await page.goto(`${server.address}/#${ACCIDENTS}`);
    await answerOf(page);
    await page.locator('figure svg[role=application]').first().waitFor();
    for (const table of await page.locator('figure summary').all()) await table.click();
    expect(await audit(page)).toEqual([]);
    await page.context().close();
  });

  it('axe finds nothing on the form with its folds open and its problems shown', async () => {
    const page = await openAuditPage(browser, { reducedMotion: 'reduce' });
    await page.goto(server.address, { waitUntil: 'networkidle' });
    await page.getByText('How hard to look').click();
    await page.getByLabel('The counts', { exact: true }).fill('0,4\n1,x\n');
    await page.getByText('How they were read').click();
    await page.locator('#problems').waitFor();
    expect(await audit(page)).toEqual([]);
    await page.keyboard.press('Escape');
    await page.context().close();
  });

  it('the whole job by keyboard alone', async () => {
    const { page, complaints } = await openCheck(browser, server.address);
    const focused = () =>
      page.evaluate(() => document.activeElement?.id || document.activeElement?.textContent?.trim());
    await page.keyboard.press('Tab');
    expect(await focused()).toBe('Skip to the page');
    await page.keyboard.press('Enter');
    await page.keyboard.press('Tab');
    expect(await focused()).toBe('counts');
    await page.keyboard.insertText(WELDON);
    for (let i = 0; i < 12 && (await focused()) !== 'trials'; i++) await page.keyboard.press('Tab');
    expect(await focused()).toBe('trials');
    await page.keyboard.insertText('12');
    await page.keyboard.press('Control+Enter');
    await answerOf(page);
    await expect.poll(focused).toBe('answer-heading');
    // From the answer on: every stop of the keyboard can be seen to have the focus.
    for (let i = 0; i < 40; i++) {
      await page.keyboard.press('Tab');
      const seen = await page.evaluate(() => {
        const now = document.activeElement;
        if (!now || now === document.body) return true;
        const style = getComputedStyle(now);
        return style.outlineStyle !== 'none' && parseFloat(style.outlineWidth) >= 2;
      });
      expect(seen, await focused()).toBe(true);
    }
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('lists its keys on ?, and single keys can be switched off', async () => {
    const { page } = await openCheck(browser, server.address);
    await page.keyboard.press('?');
    const list = page.getByRole('dialog', { name: 'Keys' });
    await list.waitFor();
    expect(await list.textContent()).toMatch(/check this histogram/);
    await list.getByRole('checkbox').uncheck();
    await page.keyboard.press('Escape');
    await expect.poll(() => list.isVisible()).toBe(false);
    await page.keyboard.press('?');
    expect(await list.isVisible()).toBe(false);
    await page.reload({ waitUntil: 'networkidle' });
    await page.keyboard.press('?');
    expect(await list.isVisible()).toBe(false);
    await page.close();
  });

  it('the night lab is remembered, without a flash of day', async () => {
    const { page } = await openCheck(browser, server.address, { colorScheme: 'light' });
    const paper = () => page.evaluate(() => getComputedStyle(document.body).backgroundColor);
    const day = await paper();
    await page.getByRole('button', { name: 'To the night lab' }).click();
    const night = await paper();
    expect(night).not.toBe(day);
    await page.reload({ waitUntil: 'commit' });
    await page.waitForSelector('body');
    expect(await paper()).toBe(night);
    await page.close();
  });

  it.each([320, 390, 1280, 1920])('a result does not scroll sideways at %i px', async (width) => {
    const { page } = await openCheck(browser, `${server.address}/#${WELDON_ADDRESS}`, {
      viewport: { width, height: 900 }
    });
    await answerOf(page);
    await page.locator('figure svg[role=application]').first().waitFor();
    for (const table of await page.locator('figure summary').all()) await table.click();
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width);
    await page.close();
  });

  it('is looked at by people where SCREENSHOTS asks for it', async () => {
    const files = await screenshots(browser, `${server.address}/#${ACCIDENTS}`, 'result', async (page) => {
      await answerOf(page);
    });
    expect(files.length).toBe(process.env.SCREENSHOTS ? 4 : 0);
  });
});
