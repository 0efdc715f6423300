import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  answerOf,
  check,
  fill,
  openCheck,
  savedDocument,
  WELDON,
  WELDON_ADDRESS
} from './support/check-page';
import { openBrowser } from './support/open-browser';
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

describe('the address of a result', () => {
  it('carries the counts and reopens the same document', async () => {
    const first = await openCheck(browser, server.address);
    await fill(first.page, WELDON, '12');
    await check(first.page);
    await answerOf(first.page);
    const url = first.page.url();
    expect(url).toBe(`${server.address}/#${WELDON_ADDRESS}`);
    const document = await savedDocument(first.page);
    await first.page.close();

    const again = await openCheck(browser, url);
    await answerOf(again.page);
    expect((await savedDocument(again.page)).text).toBe(document.text);
    expect(again.complaints).toEqual([]);
    await again.page.close();
  });

  it('keeps options and the order of shots', async () => {
    const { page } = await openCheck(browser, server.address);
    const shots = Array.from({ length: 60 }, (_, i) => (i * 7) % 5);
    await fill(page, shots.join('\n'), '9');
    await page.getByText('How hard to look').click();
    await page.getByLabel('Seed').fill('77');
    await page.getByLabel('Resampled histograms').fill('199');
    await check(page);
    await answerOf(page);
    expect(page.url()).toMatch(/#shots=0,2,4,1,3,.*&trials=9&resamples=199&seed=77&sum=60$/);
    const { text } = await savedDocument(page);
    await page.reload();
    await answerOf(page);
    const again = (await savedDocument(page)).text;
    expect(again).toBe(text);
    expect(JSON.parse(again)).toMatchObject({
      data: { ordered: true },
      engine: { seed: 77, resamples: 199 }
    });
    await page.close();
  });

  it('opens at a part of the result, and goes back to the form', async () => {
    const { page } = await openCheck(browser, `${server.address}/#${WELDON_ADDRESS}&at=tails`);
    await answerOf(page);
    await expect.poll(() => page.evaluate(() => document.activeElement?.id)).toBe('tails-heading');
    await page.getByRole('navigation', { name: 'Parts of this result' }).getByText('Tests').click();
    expect(page.url()).toMatch(/&at=tests$/);
    await page.getByRole('button', { name: /Change the counts/ }).click();
    expect(await page.getByLabel('The counts', { exact: true }).inputValue()).toMatch(
      /^count,frequency\n0,185\n/
    );
    expect(await page.getByLabel('Trials in a shot').inputValue()).toBe('12');
    await page.close();
  });

  it('goes back and forth with the browser’s own buttons', async () => {
    const { page } = await openCheck(browser, server.address);
    await fill(page, WELDON, '12');
    await check(page);
    await answerOf(page);
    await page.goBack();
    await page.getByRole('button', { name: 'Check this histogram', exact: true }).waitFor();
    expect(await page.locator('#answer-heading').count()).toBe(0);
    await page.goForward();
    expect(await answerOf(page)).toMatch(/26\u202f306/);
    await page.close();
  });

  it('that cannot be read says so, names the part, and leaves no earlier result', async () => {
    const { page, complaints } = await openCheck(browser, `${server.address}/#counts=0:185,1:11x`);
    await page.getByText('This address could not be read: “counts=1:11x”').waitFor();
    expect(await page.getByLabel('The counts', { exact: true }).inputValue()).toBe('');
    await page.evaluate((hash) => (location.hash = hash), WELDON_ADDRESS);
    await answerOf(page);
    for (const [hash, part] of [
      ['counts=garbage', 'counts=garbage'],
      ['counts=0:10,5:3&trials=2&sum=13', 'trials'],
      ['counts=0:10,1:3&alpha=7&sum=13', 'alpha']
    ]) {
      await page.evaluate((text) => (location.hash = text), hash);
      await expect.poll(() => page.locator('#address-problem').textContent()).toContain(part);
      expect(await page.locator('#answer-heading').count()).toBe(0);
      await page.getByRole('button', { name: 'Check this histogram', exact: true }).waitFor();
    }
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('without its number of shots fills the form and waits', async () => {
    const byHand = WELDON_ADDRESS.replace(/&sum=.*/, '');
    const { page } = await openCheck(browser, `${server.address}/#${byHand}`);
    await page.getByText('written by hand or cut off').waitFor();
    expect(await page.getByLabel('Trials in a shot').inputValue()).toBe('12');
    expect(await page.locator('#answer-heading').count()).toBe(0);
    await check(page);
    await answerOf(page);
    expect(page.url()).toBe(`${server.address}/#${WELDON_ADDRESS}`);
    await page.close();
  });
});
