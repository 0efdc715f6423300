import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { answerOf, check, fill, openCheck, WELDON } from './support/check-page';
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

describe('what goes wrong', () => {
  it('a bad file: every problem with its line, and nothing typed is lost', async () => {
    const { page, complaints } = await openCheck(browser, server.address);
    await page.getByLabel('Trials in a shot').fill('20');
    await page.getByLabel('File of counts').setInputFiles('fixtures/bad/many-problems.csv');
    const problems = page.locator('#problems');
    await problems.waitFor();
    expect(await problems.locator('li').count()).toBeGreaterThan(2);
    expect(await problems.locator('li').first().textContent()).toMatch(/Line \d+/);
    await check(page);
    await expect.poll(() => page.evaluate(() => document.activeElement?.id)).toBe('problems');
    expect(await page.getByLabel('Trials in a shot').inputValue()).toBe('20');
    expect((await page.getByLabel('The counts', { exact: true }).inputValue()).length).toBeGreaterThan(10);
    // The line's button puts the cursor where the problem is.
    await problems.getByRole('button', { name: /^Line/ }).first().click();
    expect(await page.evaluate(() => document.activeElement?.id)).toBe('counts');
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('a binary file is refused in words', async () => {
    const { page, complaints } = await openCheck(browser, server.address);
    await page.getByLabel('File of counts').setInputFiles('fixtures/bad/binary.csv');
    expect(await page.locator('#problems li').textContent()).toMatch(/\w{4,}/);
    await check(page);
    expect(await page.locator('#answer-heading').count()).toBe(0);
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('a file of 50 MB is refused with the limit, without loading it', async () => {
    const { page } = await openCheck(browser, server.address);
    await page.evaluate(() => {
      const transfer = new DataTransfer();
      transfer.items.add(new File([new Uint8Array(50 * 1024 * 1024)], 'large.csv'));
      window.dispatchEvent(new DragEvent('drop', { dataTransfer: transfer, cancelable: true }));
    });
    expect(await page.locator('#problems li').textContent()).toMatch(/50 MB; the limit is 20 MB/);
    await page.close();
  });

  it('no counts at all: says what to do first', async () => {
    const { page } = await openCheck(browser, server.address);
    await check(page);
    await page.getByText('There are no counts yet').waitFor();
    expect(await page.evaluate(() => document.activeElement?.id)).toBe('counts');
    await page.close();
  });

  it('a wrong setting is named at its field, even inside the fold', async () => {
    const { page } = await openCheck(browser, server.address);
    await fill(page, WELDON, 'twelve');
    await page.getByText('How hard to look').click();
    await page.getByLabel('Level of the answer').fill('2');
    await page.getByText('How hard to look').click();
    await check(page);
    await page.getByText('Write a level between 0 and 0.5').waitFor();
    await page.getByText('Write a whole number from 1 to').waitFor();
    expect(await page.getByLabel('Trials in a shot').getAttribute('aria-invalid')).toBe('true');
    expect(await page.getByLabel('Trials in a shot').inputValue()).toBe('twelve');
    await page.close();
  });

  it('counts above the trials are refused, and mending the trials is enough', async () => {
    const { page } = await openCheck(browser, server.address);
    await fill(page, WELDON, '10');
    await check(page);
    await page.locator('#problems, #refusal').first().waitFor();
    await page.getByLabel('Trials in a shot').fill('12');
    await check(page);
    await answerOf(page);
    await page.close();
  });

  it('clearing can be undone', async () => {
    const { page } = await openCheck(browser, server.address);
    await fill(page, WELDON);
    await page.getByRole('button', { name: 'Clear the counts' }).click();
    expect(await page.getByLabel('The counts', { exact: true }).inputValue()).toBe('');
    await page.getByRole('button', { name: 'Bring them back' }).click();
    expect(await page.getByLabel('The counts', { exact: true }).inputValue()).toBe(WELDON);
    await page.close();
  });

  it('a long check shows its progress and can be cancelled; the input stays', async () => {
    const { page, complaints } = await openCheck(browser, server.address);
    // Wide counts of 600 trials with many resamples: far longer than this test waits.
    const wide = Array.from(
      { length: 120 },
      (_, i) => `${240 + i},${Math.round(9000 * Math.exp(-(((i - 60) / 18) ** 2))) + 1}`
    );
    await fill(page, wide.join('\n'), '600');
    await page.getByText('How hard to look').click();
    await page.getByLabel('Resampled histograms').fill('100000');
    await check(page);
    await page.getByText(/left$/).waitFor({ timeout: 30_000 });
    expect(Number(await page.locator('progress').getAttribute('value'))).toBeGreaterThan(0);
    await page.getByRole('button', { name: 'Cancel the check' }).click();
    await expect.poll(() => page.locator('progress').count()).toBe(0);
    expect(await page.locator('#answer-heading').count()).toBe(0);
    expect(await page.getByLabel('The counts', { exact: true }).inputValue()).toBe(wide.join('\n'));
    await page.getByLabel('Resampled histograms').fill('99');
    await check(page);
    await answerOf(page);
    expect(complaints).toEqual([]);
    await page.close();
  });
});
