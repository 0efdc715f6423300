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
import { unrolled } from './support/unrolled';

const WIDTHS = [390, 1280, 1920];
const SCHEMES = ['light', 'dark'] as const;
/** Pages for those who are not signed in. */
const SIGNED_OUT = /sign-in|\/password|invitation/;
/** A diagnosis in the page takes some seconds; a machine that does more besides, a minute. */
const DIAGNOSED = 90_000;
const routes = sourceFiles(['src/routes'])
  .filter(({ path }) => path.endsWith('/+page.svelte'))
  .map(({ path }) => path.slice('src/routes'.length, -'/+page.svelte'.length));

let server: RunningServer;
let browser: Browser;
let page: Page;
/** Nobody signed in: whoever is, is led on from the pages that sign in. */
let stranger: Page;
let addresses: Record<string, string[]>;

beforeAll(async () => {
  server = await startServer({ SEVERALTY_DEMO: 'yes' });
  browser = await openBrowser();
  await demoIsReady(server, 100_000);
  addresses = await demoAddresses(server);
  page = await openAuditPage(browser, { reducedMotion: 'reduce' });
  stranger = await openAuditPage(browser, { reducedMotion: 'reduce' });
  await signIn(page, server.address, DEMO_PEOPLE[0].email, DEMO_PASSWORD);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

describe('every page, with the invented team in it', () => {
  it.each(routes)(
    '%s fits at three widths, and axe finds nothing by day and by night',
    async (route) => {
      expect(addresses[route], 'a page this test knows no address for').toBeDefined();
      const visitor = SIGNED_OUT.test(route) ? stranger : page;
      for (const [i, address] of addresses[route].entries()) {
        await visitor.goto('about:blank');
        await visitor.goto(server.address + address, { waitUntil: 'load' });
        expect(new URL(visitor.url()).pathname, 'it led elsewhere').toBe(
          new URL(address, server.address).pathname
        );
        if (address.includes('#counts'))
          await visitor.locator('#answer-heading').waitFor({ timeout: DIAGNOSED });
        await visitor.waitForFunction(() => !document.querySelector('progress'));
        await unrolled(visitor);
        const found: string[] = [];
        for (const width of WIDTHS) {
          await visitor.setViewportSize({ width, height: 900 });
          for (const colorScheme of SCHEMES) {
            await visitor.emulateMedia({ colorScheme });
            const faults = colorScheme === 'light' ? await layoutFaults(visitor) : [];
            // Colours do not depend on the width, the rest does not depend on the colours.
            if (width === 1280 || colorScheme === 'light') faults.push(...(await audit(visitor)));
            found.push(...faults.map((fault) => `${address} at ${width}, ${colorScheme}: ${fault}`));
            await picture(visitor, `${route.replaceAll(/[^a-z]+/g, '-')}-${i}-${width}-${colorScheme}`);
          }
        }
        expect(found).toEqual([]);
      }
    },
    2 * DIAGNOSED
  );
});

/** For people to look at, only where SCREENSHOTS names a folder. */
async function picture(shown: Page, name: string): Promise<void> {
  const folder = process.env.SCREENSHOTS;
  if (!folder) return;
  mkdirSync(folder, { recursive: true });
  await shown.screenshot({ path: join(folder, `${name}.png`), fullPage: true });
}
