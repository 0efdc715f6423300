import { strFromU8, unzipSync } from 'fflate';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { readFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { run } from '../unit/cli/run-diagnose';
import { answerOf, check, openCheck } from './support/check-page';
import { openBrowser } from './support/open-browser';
import { seedLink, seedSharedReport } from './support/shared-report';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let browser: Browser;
let folder: string;

beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'severalty-zip-'));
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
  rmSync(folder, { recursive: true, force: true });
});

/** Does what README.txt of a bundle says, and gives the document that comes out beside the one in the bundle. */
async function again(zip: Uint8Array): Promise<{ files: string[]; kept: string; made: string; pdf: Buffer }> {
  const files = unzipSync(zip);
  const [root] = Object.keys(files)[0].split('/');
  const text = (name: string) => strFromU8(files[`${root}/${name}`]);
  const command = /^npm run --silent diagnose -- (.+) > .+$/m.exec(text('README.txt'));
  const said = command![1].split(' ');
  // The one file it reads, under the name it gives it.
  const reads = said[0].replace(`${root}/`, '');
  expect(['counts.csv', 'shots.csv']).toContain(reads);
  const at = join(folder, reads);
  writeFileSync(at, files[`${root}/${reads}`]);
  const pdf = join(folder, 'report.pdf');
  const ran = await run([at, ...said.slice(1), '--pdf', pdf]);
  expect(ran).toMatchObject({ code: 0, errors: '' });
  const names = Object.keys(files).map((name) => name.slice(root.length + 1));
  return { files: names, kept: text('document.json'), made: ran.out, pdf: readFileSync(pdf) };
}

describe('the zip', () => {
  it('of the first page computes itself again by the command in its README', async () => {
    const { page, complaints } = await openCheck(browser, server.address);
    await page.getByLabel('File of counts').setInputFiles('fixtures/greenwood-yule.csv');
    await check(page);
    await answerOf(page);
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('button', { name: 'Save everything as a zip' }).click()
    ]);
    const { files, kept, made, pdf } = await again(await readFile(await download.path()));
    expect(made).toBe(kept);
    expect(files).toEqual(expect.arrayContaining(['report.pdf', 'numbers.csv', 'charts/explanations.svg']));
    expect(JSON.parse(kept)).toHaveProperty('explanations.ranked');
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-');
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('of a saved report, of its team and by link, computes itself again too', async () => {
    const there = await seedSharedReport(server);
    const { path } = await seedLink(server, there);
    const context = await browser.newContext();
    const page = await context.newPage();
    await signIn(page, server.address, there.lead.email, there.lead.password);
    for (const report of [`/team/${there.team.slug}/reports/${there.reportId}`, path]) {
      const answer = await page.request.get(`${server.address}${report}/bundle.zip`);
      expect(answer.status(), report).toBe(200);
      const { files, kept, made } = await again(await answer.body());
      expect(made).toBe(kept);
      expect(files).toContain('report.pdf');
    }
    await context.close();
  });
});
