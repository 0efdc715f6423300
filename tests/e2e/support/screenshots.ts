import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import type { Browser } from 'playwright-core';

const WIDTHS = [390, 1280];
const SCHEMES = ['light', 'dark'] as const;

/**
 * Pictures of an address at phone and desk width, light and dark, for people to look at. Only where
 * SCREENSHOTS names a folder, so that an ordinary run writes nothing.
 *
 * @param prepare brings the page to the state worth a picture
 * @returns the files written
 */
export async function screenshots(
  browser: Browser,
  address: string,
  name: string,
  prepare: (page: Awaited<ReturnType<Browser['newPage']>>) => Promise<void> = async () => {}
): Promise<string[]> {
  const folder = process.env.SCREENSHOTS;
  if (!folder) return [];
  mkdirSync(folder, { recursive: true });
  const files: string[] = [];
  for (const width of WIDTHS) {
    for (const colorScheme of SCHEMES) {
      const page = await browser.newPage({
        viewport: { width, height: 900 },
        colorScheme,
        reducedMotion: 'reduce'
      });
      await page.goto(address, { waitUntil: 'networkidle' });
      await prepare(page);
      const path = join(folder, `${name}-${width}-${colorScheme}.png`);
      await page.screenshot({ path, fullPage: true });
      files.push(path);
      await page.close();
    }
  }
  return files;
}
