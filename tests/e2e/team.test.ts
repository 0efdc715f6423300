import { eq } from 'drizzle-orm';
import { membership, outboxMessage } from '$lib/server/db/schema';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { complaintsOf } from './support/complaints';
import { notOvertaken } from './support/not-overtaken';
import { openBrowser } from './support/open-browser';
import { seedPerson, seedTeam, withDatabaseOf } from './support/seed-people';
import { signIn } from './support/sign-in';
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

/** The address in the last invitation mailed to somebody. */
const mailedAddress = (email: string) =>
  withDatabaseOf(server, (db) => {
    const mails = db.select().from(outboxMessage).where(eq(outboxMessage.to, email)).all();
    return /http\S+\/invitation\/[\w-]+/.exec(mails.at(-1)?.text ?? '')?.[0] ?? '';
  });

async function leadOf(slug: string) {
  const lead = await seedPerson(server, { name: 'Lena Invented' });
  const team = await seedTeam(server, slug, [[lead, 'lead']]);
  return { lead, team };
}

describe('an invitation by mail', () => {
  it.each([true, false])(
    'brings an experimenter into the team; JavaScript: %s',
    async (javaScriptEnabled) => {
      const { lead, team } = await leadOf(`invites-${String(javaScriptEnabled)}`);
      const guest = await seedPerson(server, { name: 'Gus Invented' });
      const page = await browser.newPage({ javaScriptEnabled, reducedMotion: 'reduce' });
      const complaints = complaintsOf(page);
      await signIn(page, server.address, lead.email, lead.password);
      await page.goto(`${server.address}/team/${team.slug}`, { waitUntil: 'networkidle' });
      await page.getByText('Three steps to a first report').waitFor();
      await page.getByRole('link', { name: 'Invite the people you work with' }).click();
      await page.waitForURL(/members$/);
      await page.waitForLoadState('networkidle');
      await page.getByLabel('Their mail address').fill(guest.email.toUpperCase());
      await page.getByRole('button', { name: 'Send the invitation' }).click();
      await page.getByText(`Mailed to ${guest.email}`).waitFor();
      await page.getByRole('heading', { name: 'Waiting for an answer' }).waitFor();
      // Again: told, and no second mail.
      await page.getByLabel('Their mail address').fill(guest.email);
      await page.getByRole('button', { name: 'Send the invitation' }).click();
      await page.getByText('There is an open invitation to this address').waitFor();

      const invitation = await mailedAddress(guest.email);
      const other = await browser.newPage({ javaScriptEnabled });
      const otherComplaints = complaintsOf(other);
      await other.goto(invitation, { waitUntil: 'networkidle' });
      expect(await other.locator('h1').textContent()).toBe(`Join ${team.name}`);
      await other.getByRole('link', { name: `Sign in as ${guest.email}` }).click();
      await other.waitForURL(/sign-in\?then=/);
      await other.waitForLoadState('networkidle');
      await other.getByLabel('Address').fill(guest.email);
      await other.getByLabel('Password').fill(guest.password);
      await other.getByRole('button', { name: 'Sign in', exact: true }).click();
      await other.waitForURL(invitation);
      await other.waitForLoadState('networkidle');
      await other.getByRole('button', { name: `Accept and join ${team.name}` }).click();
      await other.waitForURL(`${server.address}/team/${team.slug}`);
      await other.getByText('Three steps to a first report').waitFor();
      const places = await other
        .getByRole('navigation', { name: 'Team' })
        .getByRole('listitem')
        .allTextContents();
      expect(places).toEqual([
        'Datasets',
        'Reports',
        'Devices',
        'Sweeps',
        'Site maps',
        'Jobs',
        'Put aside',
        'Scripts'
      ]);

      await other.goto(invitation);
      await other.getByText('This invitation was accepted before').waitFor();
      await page.reload({ waitUntil: 'networkidle' });
      const role = page.getByLabel('Role of Gus Invented');
      expect(await role.inputValue()).toBe('experimenter');
      // Removed: the next request of theirs finds nothing.
      await page.locator('summary', { hasText: 'Gus Invented' }).click();
      await page.getByRole('button', { name: `Remove Gus Invented from ${team.name}` }).click();
      await page.getByText('Their access has ended').waitFor();
      expect((await other.goto(`${server.address}/team/${team.slug}`))?.status()).toBe(404);

      await page.goto(`${server.address}/team/${team.slug}/events`);
      const told = await page.locator('main ol li').allTextContents();
      expect(told.map((line) => line.replace(/^.*UTC\s*/, '').trim())).toEqual([
        'Lena Invented removed Gus Invented from the team.',
        'Gus Invented accepted an invitation and is now an experimenter.',
        `Lena Invented invited ${guest.email} as an experimenter.`
      ]);
      // The 404 is the point of it; without JavaScript the browser calls every script it leaves out a breach.
      if (javaScriptEnabled) {
        expect(notOvertaken(complaints)).toEqual([]);
        expect(notOvertaken(otherComplaints).filter((line) => !/404/.test(line))).toEqual([]);
      }
      expect(server.output()).not.toContain(invitation.split('/').at(-1));
      await page.close();
      await other.close();
    }
  );

  it('tells somebody with another address whose it is, and nobody anything of a wrong one', async () => {
    const { lead, team } = await leadOf('strangers');
    const other = await seedPerson(server, { name: 'Oda Invented' });
    const page = await browser.newPage();
    await signIn(page, server.address, lead.email, lead.password);
    await page.goto(`${server.address}/team/${team.slug}/members`, { waitUntil: 'networkidle' });
    await page.getByLabel('Their mail address').fill('new@example.org');
    await page.getByRole('button', { name: 'Send the invitation' }).click();
    await page.getByText('Mailed to new@example.org').waitFor();
    const invitation = await mailedAddress('new@example.org');
    const second = await browser.newPage();
    await signIn(second, server.address, other.email, other.password);
    const opened = await second.goto(invitation);
    expect(opened?.headers()).toMatchObject({
      'cache-control': 'no-store',
      'x-robots-tag': 'noindex',
      'referrer-policy': 'same-origin'
    });
    await second.getByText(`You are signed in as ${other.email}.`).waitFor();
    expect(await second.getByRole('button', { name: /Accept/ }).count()).toBe(0);
    // Posted all the same.
    const posted = await second.request.post(invitation, { headers: { origin: server.address }, form: {} });
    expect(await posted.text()).toContain('It could not be accepted');
    const revoked = page.getByRole('button', { name: 'Revoke the invitation to new@example.org' });
    await revoked.click();
    await page.getByText('The invitation to new@example.org opens nothing any more.').waitFor();
    await second.goto(invitation);
    await second.getByText('This invitation was revoked by the team').waitFor();
    expect((await second.goto(`${server.address}/invitation/${'x'.repeat(43)}`))?.status()).toBe(404);
    await page.close();
    await second.close();
  });
});

describe('roles', () => {
  it('an observer and an experimenter are refused members, settings and events; strangers see no team', async () => {
    const { team } = await leadOf('refuses');
    const [observer, experimenter, stranger] = [
      await seedPerson(server),
      await seedPerson(server),
      await seedPerson(server)
    ];
    await withDatabaseOf(server, (db) => {
      for (const [it, role] of [
        [observer, 'observer'],
        [experimenter, 'experimenter']
      ] as const)
        db.insert(membership).values({ teamId: team.id, personId: it.id, role, createdAt: 1 }).run();
    });
    const at = `${server.address}/team/${team.slug}`;
    const posts = [
      'members?/invite',
      'members?/role',
      'members?/remove',
      'members?/resend',
      'members?/revoke'
    ];
    posts.push('settings?/rename', 'settings?/import', 'settings/export');
    for (const [it, status] of [
      [observer, 403],
      [experimenter, 403],
      [stranger, 404]
    ] as const) {
      const page = await browser.newPage();
      await signIn(page, server.address, it.email, it.password);
      for (const path of ['members', 'settings', 'events']) {
        expect([(await page.request.get(`${at}/${path}`)).status(), path]).toEqual([status, path]);
        // What the page would be filled with, asked for by itself.
        const data = await (await page.request.get(`${at}/${path}/__data.json`)).text();
        expect(data).not.toContain('Lena Invented');
      }
      for (const path of posts) {
        const answer = await page.request.post(`${at}/${path}`, {
          headers: { origin: server.address, accept: 'text/html' },
          form: { email: 'x@example.org', role: 'lead', person: it.id, name: 'Mine' }
        });
        expect([answer.status(), path]).toEqual([status, path]);
      }
      await page.close();
    }
  });

  it('the last lead can neither leave nor step down', async () => {
    const { lead, team } = await leadOf('keeps-a-lead');
    const page = await browser.newPage();
    await signIn(page, server.address, lead.email, lead.password);
    await page.goto(`${server.address}/team/${team.slug}/leave`, { waitUntil: 'networkidle' });
    await page.getByRole('button', { name: `Leave ${team.name}` }).click();
    await page.getByText('You are its last lead').waitFor();
    await page.goto(`${server.address}/team/${team.slug}/members`, { waitUntil: 'networkidle' });
    await page.getByLabel('Role of Lena Invented').selectOption('observer');
    await page.getByRole('button', { name: 'Change role of Lena Invented' }).click();
    await page.getByText('A team keeps a lead').waitFor();
    await page.close();
  });
});
