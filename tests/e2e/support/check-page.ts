import type { Browser, Download, Page } from 'playwright-core';
import { readFile } from 'node:fs/promises';
import { complaintsOf } from './complaints';

export const WELDON =
  '0,185\n1,1149\n2,3265\n3,5475\n4,6114\n5,5194\n6,3067\n7,1331\n8,403\n9,105\n10,14\n11,4';
/** The same counts as the address carries them. */
export const WELDON_ADDRESS =
  'counts=0:185,1:1149,2:3265,3:5475,4:6114,5:5194,6:3067,7:1331,8:403,9:105,10:14,11:4&trials=12&sum=26306';

/** Longest a small diagnosis may take here: it needs under a second, a busy machine many times that. */
const PATIENCE = 40_000;

/** The first page, ready for use, and the list of what it complains about. */
export async function openCheck(
  browser: Browser,
  address: string,
  options: Parameters<Browser['newPage']>[0] = {}
): Promise<{ page: Page; complaints: string[] }> {
  const page = await browser.newPage({ reducedMotion: 'reduce', ...options });
  const complaints = complaintsOf(page);
  await page.goto(address, { waitUntil: 'networkidle' });
  return { page, complaints };
}

/** Waits for the answer and gives its sentence. */
export async function answerOf(page: Page): Promise<string> {
  const heading = page.locator('#answer-heading');
  await heading.waitFor({ timeout: PATIENCE });
  return (await heading.textContent()) ?? '';
}

/** Fills the form by its labels, as a person would. */
export async function fill(page: Page, counts: string, trials = ''): Promise<void> {
  await page.getByLabel('The counts', { exact: true }).fill(counts);
  await page.getByLabel('Trials in a shot').fill(trials);
}

export const check = (page: Page): Promise<void> =>
  page.getByRole('button', { name: 'Check this histogram', exact: true }).click();

/** Presses something that saves a file, and reads the file. */
export async function saved(page: Page, press: () => Promise<void>): Promise<{ name: string; text: string }> {
  const [download] = await Promise.all([page.waitForEvent('download'), press()]);
  return { name: download.suggestedFilename(), text: await contentOf(download) };
}

async function contentOf(download: Download): Promise<string> {
  return readFile(await download.path(), 'utf8');
}

export const savedDocument = (page: Page): Promise<{ name: string; text: string }> =>
  saved(page, () => page.getByRole('button', { name: 'Save the document as JSON' }).click());
