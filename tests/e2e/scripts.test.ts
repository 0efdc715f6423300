import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ask } from './support/api';
import { audit, openAuditPage } from './support/axe';
import { openBrowser } from './support/open-browser';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';
import { complaintsBut, teamOf, visitor } from './support/team-setting';

/** Four audits of pages with every table open; the page of the API alone has a thousand cells. */
const AUDITED = 180_000;
let server: RunningServer;
let browser: Browser;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

describe('the page of tokens', () => {
  it.each([true, false])(
    'makes one, shows it once, and revokes it; scripts in the browser: %s',
    async (js) => {
      const { people, root } = await teamOf(server, `tokens-${js}`, ['experimenter']);
      const { page, complaints } = await visitor(browser, server, people[0], { javaScriptEnabled: js });
      await page.goto(`${root}/scripts`);
      await page.getByLabel('Name', { exact: true }).fill('nightly');
      await page.getByRole('button', { name: 'Make this token' }).click();
      const field = page.getByLabel('The token, shown this once');
      await field.waitFor();
      const token = await field.inputValue();
      expect((await ask(server, token, '/team')).status).toBe(200);
      // An experimenter may make none for a lead.
      expect(await page.getByLabel('Role').locator('option').allTextContents()).toEqual([
        'experimenter',
        'observer'
      ]);
      await page.goto(`${root}/scripts`);
      expect(await page.content()).not.toContain(token);
      expect(await page.content()).toContain(token.slice(0, 12));
      await page.getByText('Revoke “nightly”').click();
      await page.getByRole('button', { name: 'Revoke this token' }).click();
      await page.getByText('opens nothing any more').waitFor();
      expect((await ask(server, token, '/team')).status).toBe(401);
      // Where a browser runs no scripts it gives up fetching ours, by the policy that forbids them; nothing else is let pass.
      const own = /^failed: http:\/\/localhost:\d+\/(_app\/immutable\/[\w./-]+|light)\.js csp$/;
      expect(complaintsBut(complaints).filter((line) => js || !own.test(line))).toEqual([]);
      await page.context().close();
    }
  );
});

describe('pages for scripts', () => {
  it.each(['light', 'dark'] as const)(
    'break no rule of axe and fit a phone, %s',
    async (colorScheme) => {
      const { people, root } = await teamOf(server, `scripts-${colorScheme}`, ['lead']);
      const page = await openAuditPage(browser, { colorScheme, reducedMotion: 'reduce' });
      await signIn(page, server.address, people[0].email, people[0].password);
      await page.goto(`${root}/scripts`, { waitUntil: 'networkidle' });
      await page.getByLabel('Name', { exact: true }).fill('nightly upload of the bay');
      await page.getByRole('button', { name: 'Make this token' }).click();
      await page.getByLabel('The token, shown this once').waitFor();
      for (const path of [null, `${server.address}/api`]) {
        if (path) await page.goto(path, { waitUntil: 'networkidle' });
        await page.evaluate(() => document.querySelectorAll('details').forEach((one) => (one.open = true)));
        for (const width of [390, 1280]) {
          await page.setViewportSize({ width, height: 900 });
          expect(await audit(page), `${path} ${width}`).toEqual([]);
          const wide = await page.evaluate(() => document.documentElement.scrollWidth);
          expect(wide, `${path} ${width}`).toBeLessThanOrEqual(width);
          if (process.env.SCREENSHOTS)
            await page.screenshot({
              path: `${process.env.SCREENSHOTS}/${path ? 'api' : 'scripts'}-${colorScheme}-${width}.png`,
              fullPage: true
            });
        }
      }
      await page.context().close();
    },
    AUDITED
  );
});
