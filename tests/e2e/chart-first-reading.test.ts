import type { Locator } from 'playwright-core';
import { beforeAll, describe, expect, it } from 'vitest';
import { inBrowser } from './support/in-browser';
import { complaintsOf } from './support/complaints';
import { seedLink, seedSharedReport } from './support/shared-report';

// Charts are read out from their markup before the application's scripts run, and by those from then on.
const PATIENT = { timeout: 20_000 };
const SCRIPTS = '**/_app/immutable/**/*.js';

const there = inBrowser();
let address: string;

beforeAll(async () => {
  address = there.server.address + (await seedLink(there.server, await seedSharedReport(there.server))).path;
});

/** The chart of counts on a page whose scripts come when `release` is called. */
async function openHeld(width: number) {
  const page = await there.browser.newPage({ viewport: { width, height: 900 }, reducedMotion: 'reduce' });
  const complaints = complaintsOf(page);
  let release = (): void => undefined;
  const released = new Promise<void>((resolve) => (release = resolve));
  await page.route(SCRIPTS, async (route) => {
    await released;
    await route.continue();
  });
  await page.goto(address, { waitUntil: 'commit' });
  await page.locator('#provenance').waitFor({ state: 'attached' });
  const figure = page.locator('figure', { has: page.locator('#distribution-title') });
  const chart = figure.getByRole('application');
  await chart.scrollIntoViewIfNeeded();
  return { page, complaints, release, figure, chart, said: figure.locator('[aria-live]') };
}

/** Asks something of a chart until its own script has it. */
async function untilLive(figure: Locator, ask: () => Promise<unknown>): Promise<void> {
  const waiting = async (): Promise<number> => {
    await ask();
    return figure.locator('svg[data-readings]').count();
  };
  await expect.poll(waiting, PATIENT).toBe(0);
}

describe('a chart whose script has not come', () => {
  it.each([1280, 390])('is read by keys and pointer, and goes on from there, %i wide', async (width) => {
    const { page, complaints, release, figure, chart, said } = await openHeld(width);
    await chart.focus();
    await page.keyboard.press('ArrowRight');
    expect(await said.textContent()).toMatch(/^Count 0:/);
    await page.keyboard.press('ArrowRight');
    expect(await said.textContent()).toMatch(/^Count 1:/);
    await page.keyboard.press('Escape');
    expect(await said.textContent()).toBe('');
    await page.keyboard.press('End');
    const last = await said.textContent();
    expect(last).toMatch(/^Count 10:/);
    expect(await chart.locator('circle[data-first-reading]').count()).toBe(1);

    release();
    await untilLive(figure, () => page.keyboard.press('End'));
    await expect.poll(() => said.textContent(), PATIENT).toBe(last);
    expect(await page.locator('[data-first-reading]').count()).toBe(0);
    await page.keyboard.press('ArrowLeft');
    await expect.poll(() => said.textContent(), PATIENT).toMatch(/^Count 9:/);
    await page.keyboard.press('Escape');
    await expect.poll(() => said.textContent(), PATIENT).toBe('');
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('forgets what a mouse leaves, and is live once the mouse has been there', async () => {
    const { page, complaints, release, figure, chart, said } = await openHeld(1280);
    const box = (await chart.boundingBox())!;
    await page.mouse.move(box.x + box.width - 10, box.y + 100);
    expect(await said.textContent()).toMatch(/^Count 10:/);
    await page.mouse.move(box.x + 10, box.y - 60);
    expect(await said.textContent()).toBe('');
    await page.mouse.move(box.x + box.width - 10, box.y + 100);
    release();
    await untilLive(figure, async () => {
      for (const by of [12, 10]) await page.mouse.move(box.x + box.width - by, box.y + 100);
    });
    await page.mouse.move(box.x + box.width - 10, box.y + 100);
    await expect.poll(() => said.textContent(), PATIENT).toMatch(/^Count 10:/);
    expect(complaints).toEqual([]);
    await page.close();
  });
});
