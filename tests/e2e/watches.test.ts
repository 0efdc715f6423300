import { outboxMessage, watch } from '$lib/server/db/schema';
import { recordEvent } from '$lib/server/services/events/record-event';
import { unsubscribeToken } from '$lib/server/services/watches/unsubscribe-token';
import { eq } from 'drizzle-orm';
import { readFileSync } from 'node:fs';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from './support/open-browser';
import { withDatabaseOf } from './support/seed-people';
import { startServer, type RunningServer } from './support/start-server';
import { complaintsBut, teamOf, visitor } from './support/team-setting';

let server: RunningServer;
let browser: Browser;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

/** What was mailed to an address. */
const mailTo = (email: string) =>
  withDatabaseOf(server, (db) => db.select().from(outboxMessage).where(eq(outboxMessage.to, email)).all());
const watched = () => withDatabaseOf(server, (db) => db.select().from(watch).all().length);

describe('what somebody hears of', () => {
  it.each([true, false])(
    'is chosen on a page, mailed, and ended by the link in the mail without signing in; scripts: %s',
    async (js) => {
      const { people, root } = await teamOf(server, `watched-${js}`, ['experimenter']);
      const { page, complaints } = await visitor(browser, server, people[0], { javaScriptEnabled: js });
      await page.goto(`${server.address}/account`);
      await page.getByRole('link', { name: 'What I hear of' }).click();
      await page.getByLabel('a gate is failed').check();
      await page.getByRole('button', { name: /^Save this/ }).click();
      await page.getByText(/^Saved for /).waitFor();
      await page.reload();
      expect(await page.getByLabel('a gate is failed').isChecked()).toBe(true);
      expect(await page.getByLabel('a diagnosis ends').isChecked()).toBe(false);

      await withDatabaseOf(server, (db) => {
        const { teamId } = db.select().from(watch).where(eq(watch.personId, people[0].id)).get()!;
        const detail = { device: 'Marram', deviceId: 'dev', version: 'ebb 3.3' };
        recordEvent(db, { action: 'gate.fail', teamId, thing: 'version', detail });
      });
      await expect
        .poll(() => mailTo(people[0].email).then(({ length }) => length), { timeout: 30_000 })
        .toBe(1);
      const [{ subject, text }] = await mailTo(people[0].email);
      expect(subject).toContain('Version “ebb 3.3” of Marram failed its gate');
      expect(text).toContain(`${root}/devices/dev/versions/version`);

      const address = /\S+\/unsubscribe\/\S+/.exec(text)![0];
      const stranger = await browser.newContext({ javaScriptEnabled: js, reducedMotion: 'reduce' });
      const other = await stranger.newPage();
      await other.goto(address);
      // Looking at it ends nothing: programs that look through mail follow every link.
      const before = await watched();
      await other.getByRole('button', { name: 'End this mail' }).click();
      await other.getByText('Done. This mail has ended.').waitFor();
      expect(await watched()).toBe(before - 1);
      await other.goto(address);
      await other.getByText('This mail has ended already.').waitFor();
      const own = /^failed: http:\/\/localhost:\d+\/(_app\/immutable\/[\w./-]+|light)\.js csp$/;
      expect(complaintsBut(complaints).filter((line) => js || !own.test(line))).toEqual([]);
      await stranger.close();
      await page.context().close();
    }
  );

  it('is ended by one click of a mail program, whose POST names no origin, and by no made-up address', async () => {
    const { people } = await teamOf(server, 'one-click', ['observer']);
    const { page } = await visitor(browser, server, people[0]);
    await page.goto(`${server.address}/account/mail`);
    await page.getByLabel('somebody remarks on a report').check();
    await page.getByRole('button', { name: /^Save this/ }).click();
    await page.getByText(/^Saved for /).waitFor();
    const secret = readFileSync(`${server.data}/auth-secret`, 'utf8');
    const token = unsubscribeToken({ personId: people[0].id, teamId: null }, secret);
    const click = (path: string) =>
      fetch(`${server.address}${path}`, {
        method: 'POST',
        body: new URLSearchParams({ 'List-Unsubscribe': 'One-Click' })
      });
    const before = await watched();
    expect((await click(`/unsubscribe/${token.slice(0, -2)}AA`)).status).toBe(404);
    expect(await watched()).toBe(before);
    expect((await click(`/unsubscribe/${token}`)).status).toBe(200);
    expect(await watched()).toBe(before - 1);
    // Every other form without an origin is refused as before.
    expect((await click('/account/mail?/save')).status).toBe(403);
    await page.context().close();
  });
});
