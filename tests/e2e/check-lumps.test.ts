import { readCounts } from '$lib/formats/read-counts';
import { describe, expect, it } from 'vitest';
import { inBrowser } from './support/in-browser';
import { answerOf, check, fill, openCheck, saved, savedDocument } from './support/check-page';
import { screenshots } from './support/screenshots';

const there = inBrowser();

/** Weldon's dice, Pearson 1900: 185 + 1149 + 3265 throws of two or fewer, 403 + 105 + 14 + 4 of eight or more. */
const LOW = '0-2,4599\n3,5475\n4,6114\n5,5194\n6,3067\n7,1331\n8,403\n9,105\n10,14\n11,4';
const BOTH = '≤2,4599\n3,5475\n4,6114\n5,5194\n6,3067\n7,1331\n8+,526';

describe('counts typed with lumps', () => {
  it('at the low end are answered, said in the notes, and drawn as one row', async () => {
    const { page, complaints } = await openCheck(there.browser, there.server.address);
    await fill(page, LOW, '12');
    await page.getByText('counts from 2 or fewer to 11').waitFor();
    await check(page);
    expect(await answerOf(page)).toMatch(/compatible with independent trials/);
    const said = page.getByText('The first row lumps counts of 2 and fewer.');
    await expect.poll(() => said.count(), { timeout: 20_000 }).toBeGreaterThan(0);
    const data = page.locator('#data');
    await expect.poll(() => data.textContent()).toContain('2 or fewer to 11');

    const figure = page.locator('figure', { has: page.locator('#distribution-title') });
    await figure.getByRole('application').focus();
    await page.keyboard.press('Home');
    await expect
      .poll(() => figure.locator('[aria-live]').textContent())
      .toMatch(/^Count 2 or fewer: seen in 4\u202f599 of 26\u202f306 shots/);
    await page.keyboard.press('ArrowRight');
    await expect
      .poll(() => figure.locator('[aria-live]').textContent())
      .toMatch(/^Count 3: seen in 5\u202f475/);
    await expect.poll(() => figure.locator('svg text').allTextContents()).toContain('0–2');
    const csv = await saved(page, () => figure.getByRole('button', { name: /^Save as CSV/ }).click());
    expect(csv.text).toMatch(/\r\n0[-–]2,4599,0\.1748/);

    // What is saved is read again as it was typed.
    const { text } = await savedDocument(page);
    const again = readCounts(text);
    expect(again).toMatchObject({
      ok: true,
      datasets: [{ data: { below: { to: 2, shots: 4599 }, lump: null } }]
    });
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('at both ends are answered too', async () => {
    const { page, complaints } = await openCheck(there.browser, there.server.address);
    await fill(page, BOTH, '12');
    await page.getByText('counts from 2 or fewer to 8 or more').waitFor();
    await check(page);
    expect(await answerOf(page)).toMatch(/compatible with independent trials/);
    const figure = page.locator('figure', { has: page.locator('#distribution-title') });
    await figure.getByRole('application').focus();
    await page.keyboard.press('End');
    await expect
      .poll(() => figure.locator('[aria-live]').textContent())
      .toMatch(/^Count 8 or more: seen in 526 of 26\u202f306 shots/);
    expect(complaints).toEqual([]);
    await page.close();
    await screenshots(there.browser, there.server.address, 'lumps-at-both-ends', async (one) => {
      await fill(one, BOTH, '12');
      await check(one);
      await answerOf(one);
    });
  });

  it('that overlap are refused in words, and nothing typed is lost', async () => {
    const { page } = await openCheck(there.browser, there.server.address);
    const wrong = '0-4,10\n3,5\n6,2';
    await fill(page, wrong, '12');
    await page
      .getByText('This row lumps all counts up to 4, but 3 has a row of its own on line 2.')
      .waitFor();
    expect(await page.getByLabel('The counts', { exact: true }).inputValue()).toBe(wrong);
    await page.close();
  });
});
