import { gzipSync } from 'node:zlib';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, openAuditPage } from './support/axe';
import { complaintsOf } from './support/complaints';
import { layoutFaults } from './support/layout-faults';
import { openBrowser } from './support/open-browser';
import { screenshots } from './support/screenshots';
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

async function open(path: string, width = 1280): Promise<{ page: Page; complaints: string[] }> {
  const page = await browser.newPage({ viewport: { width, height: 900 }, reducedMotion: 'reduce' });
  const complaints = complaintsOf(page);
  await page.goto(server.address + path, { waitUntil: 'networkidle' });
  return { page, complaints };
}

const focused = (page: Page): Promise<string> => page.evaluate(() => document.activeElement?.id ?? '');

const PLANNED = '/plan#find=misread&mean=4&trials=50&size=0.01&shots=5000&most=0';

describe('the plan', () => {
  it('says shots, their smallest effect and the odds from one address', async () => {
    const { page, complaints } = await open(PLANNED);
    const heading = page.locator('#plan-heading');
    await heading.waitFor();
    expect(await heading.textContent()).toMatch(/\d shots show a misread rate of 0\.01 in 80 of 100/);
    expect(await heading.textContent()).toMatch(/5\s?000 shots show a misread rate of 0\.00\d+ or more/);
    expect(await page.locator('#odds-heading').textContent()).toMatch(
      /no defect comes once in 6\d\.\d shots/
    );
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('is made from the keyboard and checked by simulation', async () => {
    const { page, complaints } = await open('/plan');
    await page.locator('#mean').fill('4');
    await page.locator('#size').fill('0.1');
    await page.keyboard.press('Enter');
    await page.locator('#plan-heading').waitFor();
    await expect.poll(() => focused(page)).toBe('plan-heading');
    expect(page.url()).toBe(`${server.address}/plan#mean=4&size=0.1`);
    await page.getByRole('button', { name: 'Check the plan by simulation' }).press('Enter');
    const told = page.locator('#plan [role=status]');
    await expect.poll(() => told.textContent(), { timeout: 40_000 }).toMatch(/Tried out/);
    const share = Number(/, (\d+\.\d)\s?%/.exec((await told.textContent()) ?? '')?.[1]);
    // 80 of 100 were asked for.
    expect(Math.abs(share - 80)).toBeLessThan(5);
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('takes counts for the odds, and goes back with the browser', async () => {
    const { page } = await open('/plan');
    await page.locator('#most').fill('1');
    await page.locator('#trials').fill('12');
    await page
      .locator('#counts')
      .fill('0,185\n1,1149\n2,3265\n3,5475\n4,6114\n5,5194\n6,3067\n7,1331\n8,403\n9,105');
    await page.getByRole('button', { name: 'Work out the odds' }).click();
    await page.locator('#odds-heading').waitFor();
    expect(await page.locator('#odds').textContent()).toMatch(/best independent-trial law of these counts/);
    await page.goBack();
    await expect.poll(() => page.locator('#odds-heading').count()).toBe(0);
    await page.goForward();
    await page.locator('#odds-heading').waitFor();
    expect(await page.locator('#counts').inputValue()).toMatch(/^0,185\n1,1149/);
    await page.close();
  });

  it('refuses beside the field and keeps what was typed', async () => {
    const { page } = await open('/plan');
    await page.locator('#find').selectOption('misread');
    await page.locator('#mean').fill('60');
    await page.locator('#trials').fill('50');
    await page.locator('#size').fill('0.5');
    await page.locator('#alpha').fill('0.7');
    await page.locator('#power').fill('1.2');
    await page.getByRole('button', { name: 'Plan the shots' }).click();
    await expect.poll(() => focused(page)).toBe('mean');
    for (const field of ['mean', 'alpha', 'power'])
      expect(await page.locator(`#${field}-problem`).isVisible(), field).toBe(true);
    await page.locator('#mean').fill('4');
    await page.keyboard.press('Enter');
    await expect.poll(() => page.locator('#size-problem').textContent()).toMatch(/below 0\.5/);
    expect(await page.locator('#size').inputValue()).toBe('0.5');
    await page.locator('#most').fill('1');
    await page.locator('#counts').fill('0,5\nx,3');
    await page.getByRole('button', { name: 'Work out the odds' }).click();
    await expect.poll(() => page.locator('#counts-problem').textContent()).toMatch(/Line 2/);
    expect(await page.locator('#counts').inputValue()).toBe('0,5\nx,3');
    await page.close();
  });
});

describe('an undecided result', () => {
  it('leads to the plan with its own numbers', async () => {
    const { page } = await open('/#shots=3,5,4,2,6,4,1,3,4,5,7,2,3,4,4,5,3,2,6,4,3,5,4,1&trials=40&sum=24');
    await page.locator('#answer-heading').waitFor({ timeout: 40_000 });
    // The first page would lose counts that no address holds, so the plan opens beside it.
    const beside = page.context().waitForEvent('page');
    await page.getByRole('link', { name: /Plan the shots for an excess/ }).click();
    const plan = await beside;
    await plan.locator('#plan-heading').waitFor();
    // 90 defects in 24 shots.
    expect(await plan.locator('#mean').inputValue()).toBe('3.75');
    expect(await plan.locator('#trials').inputValue()).toBe('40');
    expect(await plan.locator('#shots').inputValue()).toBe('24');
    expect(await plan.locator('#plan-heading').textContent()).toMatch(/24 shots show an excess of/);
    await page.context().close();
  });
});

describe.each([['plan', PLANNED, '#plan-heading']])('/%s', (name, path, ready) => {
  it.each([320, 390, 1280, 1920])('cuts nothing off, %i px wide', async (width) => {
    const { page } = await open(path, width);
    await page.locator(ready).waitFor();
    expect(await layoutFaults(page)).toEqual([]);
    await page.close();
  });

  it('loads less than 90 kB of JavaScript before anyone does anything', async () => {
    const page = await browser.newPage();
    const scripts: Promise<number>[] = [];
    page.on('response', (response) => {
      if (/javascript/.test(response.headers()['content-type'] ?? ''))
        scripts.push(response.body().then((body) => gzipSync(body).length));
    });
    await page.goto(`${server.address}/${name}`, { waitUntil: 'networkidle' });
    const sizes = await Promise.all(scripts);
    expect(sizes.length).toBeGreaterThan(0);
    expect(sizes.reduce((sum, size) => sum + size, 0)).toBeLessThan(90_000);
    await page.close();
  });

  it('passes axe with an answer and with mistakes', async () => {
    const page = await openAuditPage(browser);
    await page.goto(server.address + path, { waitUntil: 'networkidle' });
    await page.locator(ready).waitFor();
    expect(await audit(page)).toEqual([]);
    await page.locator('#mean').fill('x');
    await page.keyboard.press('Enter');
    await page.locator('#mean-problem').waitFor();
    expect(await audit(page)).toEqual([]);
    await page.context().close();
    await screenshots(browser, server.address + path, name);
  });
});
