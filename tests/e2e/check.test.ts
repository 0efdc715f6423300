import { documentText } from '$lib/model/document-text';
import { readCounts } from '$lib/formats/read-counts';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { readFileSync } from 'node:fs';
import type { Diagnosis } from '$lib/stats/types';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { answerOf, check, fill, openCheck, saved, savedDocument, WELDON } from './support/check-page';
import { complaintsOf } from './support/complaints';
import { differences } from './support/differences';
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

/** Keeps what the engine's worker hands to the page. */
function listenToWorkers(): void {
  const Original = window.Worker;
  window.Worker = class extends Original {
    constructor(url: string | URL, options?: WorkerOptions) {
      super(url, options);
      this.addEventListener('message', ({ data }) => {
        if (data.kind === 'done') Object.assign(window, { workerDocument: data.diagnosis });
      });
    }
  };
}

describe('a check', () => {
  it('of a real file saves the very document of the worker, and the numbers of the engine elsewhere', async () => {
    const context = await browser.newContext();
    await context.addInitScript(listenToWorkers);
    const page = await context.newPage();
    const complaints = complaintsOf(page);
    await page.goto(server.address, { waitUntil: 'networkidle' });
    await page.getByLabel('File of counts').setInputFiles('fixtures/weldon-dice.csv');
    await page.getByText('26\u202f306 shots').waitFor();
    await page.getByLabel('Trials in a shot').fill('12');
    await check(page);
    expect(await answerOf(page)).toMatch(/compatible with independent trials/);
    const { name, text } = await savedDocument(page);
    expect(name).toBe('severalty-diagnosis.json');
    const ofWorker = await page.evaluate(
      () => (window as unknown as { workerDocument: Diagnosis }).workerDocument
    );
    expect(text).toBe(documentText(ofWorker));

    const read = readCounts(new Uint8Array(readFileSync('fixtures/weldon-dice.csv')));
    if (!read.ok) throw new Error('the fixture is not read');
    const here = await diagnose(read.datasets[0].data, { ...defaultOptions, trials: 12 });
    // Browser and Node carry different versions of V8, whose sines differ in the last digit.
    expect(differences(JSON.parse(text), here, 1e-9)).toEqual([]);
    expect(complaints).toEqual([]);
    await context.close();
  });

  it('of pasted cells keeps the counts in the browser', async () => {
    const { page, complaints } = await openCheck(browser, server.address);
    const sent: string[] = [];
    page.on('request', (request) =>
      sent.push(`${request.method()} ${request.url()} ${request.postData() ?? ''}`)
    );
    await fill(page, WELDON.replaceAll(',', '\t'), '12');
    await check(page);
    await answerOf(page);
    expect(sent.length).toBeGreaterThan(0);
    expect(sent.filter((line) => /1149|6114|^POST/.test(line))).toEqual([]);
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('of an example takes its settings along, and says that it is invented', async () => {
    const { page, complaints } = await openCheck(browser, server.address);
    const example = page.locator('#examples li', { hasText: 'Bunched sites' });
    expect(await example.textContent()).toMatch(/Invented/);
    await example.getByRole('button').click();
    await expect.poll(() => page.getByLabel('Trials in a shot').inputValue()).toBe('64');
    await check(page);
    expect(await answerOf(page)).toMatch(/cannot explain/);
    await page.getByRole('heading', { name: 'Bunching shown' }).waitFor();
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('of a file with several datasets is of the one that is chosen', async () => {
    const { page } = await openCheck(browser, server.address);
    await page.getByLabel('File of counts').setInputFiles('fixtures/demo/firmware-versions.csv');
    const choice = page.getByLabel(/Dataset to check, of 4/);
    await choice.selectOption({ index: 2 });
    const name = await choice.evaluate((select: HTMLSelectElement) => select.selectedOptions[0].text);
    expect(name).toMatch(/3\.3/);
    await page.getByLabel('Trials in a shot').fill('48');
    await check(page);
    await answerOf(page);
    expect(await page.locator('#data').textContent()).toContain(name);
    await page.close();
  });

  it('shows what was guessed, and reads again when that is changed', async () => {
    const { page } = await openCheck(browser, server.address);
    await fill(page, '3,4\n2,6\n1,9');
    await page.getByText('How they were read').click();
    const first = page.getByLabel(/^Column 1/);
    expect(await first.locator('option:checked').textContent()).toBe('count of defects');
    await page.getByText('19 shots').waitFor();
    await first.selectOption('frequency');
    await page.getByLabel(/^Column 2/).selectOption('count');
    await page.getByText('6 shots').waitFor();
    await page.close();
  });

  it('draws charts that are read out, shown as tables and saved', async () => {
    const { page, complaints } = await openCheck(browser, server.address);
    await fill(page, WELDON, '12');
    await check(page);
    await answerOf(page);
    const figure = page.locator('figure', { has: page.locator('#distribution-title') });
    await figure.getByRole('application').focus();
    await page.keyboard.press('Home');
    await page.keyboard.press('ArrowRight');
    expect(await figure.locator('[aria-live]').textContent()).toMatch(
      /^Count 1: seen in 1\u202f149 of 26\u202f306 shots/
    );
    const box = await figure.getByRole('application').boundingBox();
    if (!box) throw new Error('the chart has no place on the page');
    await page.mouse.move(box.x + box.width - 5, box.y + 50);
    await expect.poll(() => figure.locator('[aria-live]').textContent()).toMatch(/^Count 1[12]/);

    await figure.locator('summary').click();
    await expect.poll(() => figure.getByRole('row').count()).toBeGreaterThanOrEqual(13);
    const csv = await saved(page, () => figure.getByRole('button', { name: /^Save as CSV/ }).click());
    expect(csv.text.split('\r\n')[5]).toMatch(/^4,6114,0\.2324/);
    const svg = await saved(page, () => figure.getByRole('button', { name: /^Save as SVG/ }).click());
    expect(svg.text).toMatch(/^<svg xmlns[\s\S]*<\/svg>\n$/);
    expect(svg.text).not.toMatch(/style=|NaN|undefined/);
    const png = await saved(page, () => figure.getByRole('button', { name: /^Save as PNG/ }).click());
    expect(png.name).toBe('severalty-distribution.png');
    expect(png.text.slice(1, 4)).toBe('PNG');
    expect(complaints).toEqual([]);
    await page.close();
  });
});
