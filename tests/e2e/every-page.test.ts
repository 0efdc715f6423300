import { DEMO_PASSWORD, DEMO_PEOPLE } from '$lib/server/services/demo-team/demo-people';
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { sourceFiles } from '../support/source-files';
import { audit, openAuditPage } from './support/axe';
import { demoAddresses, demoIsReady } from './support/demo-addresses';
import { layoutFaults } from './support/layout-faults';
import { openBrowser } from './support/open-browser';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

const WIDTHS = [390, 1280, 1920];
const SCHEMES = ['light', 'dark'] as const;
const routes = sourceFiles(['src/routes'])
  .filter(({ path }) => path.endsWith('/+page.svelte'))
  .map(({ path }) => path.slice('src/routes'.length, -'/+page.svelte'.length));

let server: RunningServer;
let browser: Browser;
let page: Page;
let addresses: Record<string, string[]>;

beforeAll(async () => {
  server = await startServer({ SEVERALTY_DEMO: 'yes' });
  browser = await openBrowser();
  await demoIsReady(server, 100_000);
  addresses = await demoAddresses(server);
  page = await openAuditPage(browser, { reducedMotion: 'reduce' });
  await signIn(page, server.address, DEMO_PEOPLE[0].email, DEMO_PASSWORD);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

describe('every page, with the invented team in it', () => {
  it.each(routes)('%s fits at three widths, and axe finds nothing by day and by night', async (route) => {
    expect(addresses[route], 'a page this test knows no address for').toBeDefined();
    for (const [i, address] of addresses[route].entries()) {
      await page.goto('about:blank');
      await page.goto(server.address + address, { waitUntil: 'load' });
      if (address.includes('#counts')) await page.locator('#answer-heading').waitFor();
      await page.waitForFunction(() => !document.querySelector('progress'));
      const found: string[] = [];
      for (const width of WIDTHS) {
        await page.setViewportSize({ width, height: 900 });
        for (const colorScheme of SCHEMES) {
          await page.emulateMedia({ colorScheme });
          const faults = colorScheme === 'light' ? await layoutFaults(page) : [];
          // Colours do not depend on the width, the rest does not depend on the colours.
          if (width === 1280 || colorScheme === 'light') faults.push(...(await audit(page)));
          found.push(...faults.map((fault) => `${address} at ${width}, ${colorScheme}: ${fault}`));
          await picture(`${route.replaceAll(/[^a-z]+/g, '-')}-${i}-${width}-${colorScheme}`);
        }
      }
      expect(found).toEqual([]);
    }
  });
});

/** For people to look at, only where SCREENSHOTS names a folder. */
async function picture(name: string): Promise<void> {
  const folder = process.env.SCREENSHOTS;
  if (!folder) return;
  mkdirSync(folder, { recursive: true });
  await page.screenshot({ path: join(folder, `${name}.png`), fullPage: true });
}
