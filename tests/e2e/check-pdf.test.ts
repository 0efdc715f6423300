import { documentText } from '$lib/model/document-text';
import { writeReport } from '$lib/server/pdf/write-report';
import type { Diagnosis } from '$lib/stats/types';
import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { readFile } from 'node:fs/promises';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { answerOf, check, openCheck, savedDocument } from './support/check-page';
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

/** The same report, set by Node. */
function fromNode(document: Diagnosis, dataset: string): Promise<Uint8Array> {
  const documentSha256 = createHash('sha256').update(documentText(document)).digest('hex');
  const unsaid = { madeBy: null, madeAt: null, team: null, conditions: null, link: null };
  return writeReport({ document, documentSha256, provenance: { ...unsaid, dataset } });
}

async function savedPdf(page: Page): Promise<{ name: string; bytes: Buffer }> {
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save the report as PDF' }).click()
  ]);
  return { name: download.suggestedFilename(), bytes: await readFile(await download.path()) };
}

describe('a PDF of the first page', () => {
  it.each(['weldon-dice.csv', '量子 дефекты שלום é.csv'])(
    'of %s is made in the browser, with the bytes that Node writes',
    async (name) => {
      const { page, complaints } = await openCheck(browser, server.address);
      const asked: string[] = [];
      page.on('request', (request) =>
        asked.push(`${request.method()} ${request.url()} ${request.postData() ?? ''}`)
      );
      const buffer = readFileSync('fixtures/weldon-dice.csv');
      await page.getByLabel('File of counts').setInputFiles({ name, mimeType: 'text/csv', buffer });
      await page.getByLabel('Trials in a shot').fill('12');
      await check(page);
      await answerOf(page);
      const { text } = await savedDocument(page);
      expect(asked.filter((line) => /woff|pdf/.test(line))).toEqual([]);
      const pdf = await savedPdf(page);
      await page.getByText('The PDF is saved.').waitFor();
      expect(pdf.name).toBe('severalty-report.pdf');
      const expected = Buffer.from(await fromNode(JSON.parse(text) as Diagnosis, name));
      expect(pdf.bytes.length).toBe(expected.length);
      expect(Buffer.compare(pdf.bytes, expected)).toBe(0);
      // Writer and fonts come; nothing goes.
      expect(asked.some((line) => line.includes('.woff'))).toBe(true);
      expect(asked.filter((line) => !line.startsWith('GET ') || /1149|6114/.test(line))).toEqual([]);
      expect(complaints).toEqual([]);
      await page.close();
    }
  );

  it('that cannot be made says so, and what to do instead', async () => {
    const { page } = await openCheck(browser, server.address);
    await page.getByLabel('File of counts').setInputFiles('fixtures/weldon-dice.csv');
    await page.getByLabel('Trials in a shot').fill('12');
    await check(page);
    await answerOf(page);
    await page.context().route('**/*.woff', (route) => route.fulfill({ status: 404 }));
    await page.getByRole('button', { name: 'Save the report as PDF' }).click();
    await page.getByText(/The PDF was not made: .*font.* Print the page instead/).waitFor();
    await page.close();
  });
});
