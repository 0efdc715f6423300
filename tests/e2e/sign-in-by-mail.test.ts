import { normalEmail } from '$lib/server/auth/normal-email';
import { person } from '$lib/server/db/schema';
import { eq } from 'drizzle-orm';
import { createServer, type AddressInfo } from 'node:net';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { linkIn, startMailServer, type MailServer } from '../support/mail-server';
import { audit, openAuditPage } from './support/axe';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
import { screenshots } from './support/screenshots';
import { seedPerson, withDatabaseOf } from './support/seed-people';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

let mail: MailServer;
let server: RunningServer;
let browser: Browser;

beforeAll(async () => {
  mail = await startMailServer();
  [server, browser] = await Promise.all([
    startServer({ SMTP_URL: mail.url, MAIL_FROM: 'Severalty <counts@example.org>' }),
    openBrowser()
  ]);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
  await mail?.stop();
});

/** Asks for a link on one of the two pages, and gives what the page then says. */
async function ask(page: Page, path: string, email: string): Promise<string> {
  await page.goto(`${server.address}${path}`, { waitUntil: 'networkidle' });
  await page.getByLabel('Address').fill(email);
  await page.getByRole('button', { name: 'Mail me a link' }).click();
  const said = page.getByText('A message is on its way');
  await said.waitFor();
  return (await page.locator('main').innerText()).replaceAll(email, 'ADDRESS');
}

describe('a mailed link', () => {
  it('makes a person and signs them in, at the press of a button and not before', async () => {
    const page = await browser.newPage();
    const complaints = complaintsOf(page);
    await ask(page, '/sign-in/by-mail?then=%2Faccount', 'Newcomer@Example.org');
    const message = await mail.to('newcomer@example.org');
    expect(message.from?.value[0]).toEqual({ name: 'Severalty', address: 'counts@example.org' });
    expect(message.subject).toBe('Sign in to Severalty');
    const link = linkIn(message, `${server.address}/sign-in/mailed?token=`);

    // A scanner looks first, more than once.
    for (let i = 0; i < 3; i++) expect((await fetch(link)).status).toBe(200);
    const people = () =>
      withDatabaseOf(server, (db) =>
        db
          .select()
          .from(person)
          .where(eq(person.email, normalEmail('Newcomer@Example.org')))
          .all()
      );
    expect(await people()).toEqual([]);

    await page.goto(link, { waitUntil: 'networkidle' });
    await page.getByRole('button', { name: 'Sign in as newcomer@example.org' }).click();
    await page.waitForURL(`${server.address}/account`);
    const [made] = await people();
    expect(made).toMatchObject({ name: 'newcomer', passwordHash: null });
    expect(made.emailVerifiedAt).toBeGreaterThan(0);
    expect(complaints).toEqual([]);

    await page.goto(link);
    await page.getByText('This link has been used').waitFor();
    expect(await page.getByRole('button', { name: /Sign in as/ }).count()).toBe(0);
    await page.close();
  });

  it('works without JavaScript', async () => {
    const page = await browser.newPage({ javaScriptEnabled: false });
    await ask(page, '/sign-in/by-mail', 'plain@example.org');
    await page.goto(linkIn(await mail.to('plain@example.org'), server.address + '/sign-in/mailed'));
    await page.getByRole('button', { name: 'Sign in as' }).click();
    await page.waitForURL(`${server.address}/teams`);
    await page.close();
  });

  it('answers a made-up token like one that never was', async () => {
    const text = await (await fetch(`${server.address}/sign-in/mailed?token=${'a'.repeat(43)}`)).text();
    expect(text).toContain('This link is not whole, or it is no longer known here.');
  });
});

describe('a new password by mail', () => {
  it('is chosen on the mailed page, refused when weak, and ends every other session', async () => {
    const { email, password: old } = await seedPerson(server, { email: 'forgetful@example.org' });
    const other = await browser.newPage();
    await signIn(other, server.address, email, old);

    const page = await browser.newPage();
    const complaints = complaintsOf(page);
    await ask(page, '/password?then=%2Faccount', email);
    const link = linkIn(await mail.to(email), `${server.address}/password/new?token=`);
    await page.goto(link, { waitUntil: 'networkidle' });
    const field = page.getByLabel('New password');
    const send = page.getByRole('button', { name: 'Set the password and sign in' });
    await field.fill('forgetful1');
    await page.getByText('It holds your own name or address.').waitFor();
    await send.click();
    await page.locator('#password-problem').waitFor();
    expect(await field.inputValue()).toBe('');

    await field.fill('lighthouse brass verdigris');
    await page.getByText('This password will do.').waitFor();
    await send.click();
    await page.waitForURL(`${server.address}/account`);
    expect(complaints).toEqual([]);
    await page.close();

    await other.goto(`${server.address}/account`);
    expect(other.url()).toContain('/sign-in');
    await expect(signIn(other, server.address, email, old)).rejects.toThrow(/400/);
    await signIn(other, server.address, email, 'lighthouse brass verdigris');
    await other.goto(link);
    await other.getByText('This link has been used').waitFor();
    await other.close();
  });

  it('gives the same answer for an address that nobody has, and tells its reader by mail', async () => {
    const { email } = await seedPerson(server);
    const page = await browser.newPage();
    const known = await ask(page, '/password', email);
    const unknown = await ask(page, '/password', 'stranger@example.org');
    expect(unknown).toBe(known);
    const message = await mail.to('stranger@example.org');
    expect(message.text).toContain('No account has it.');
    expect(message.text).not.toContain('token=');
    await page.close();
  });
});

describe('the limits', () => {
  it('let an address receive five messages an hour', async () => {
    const answers = [];
    for (let i = 0; i < 6; i++) {
      const response = await fetch(`${server.address}/password`, {
        method: 'POST',
        headers: { origin: server.address, accept: 'text/html' },
        body: new URLSearchParams({ email: 'flooded@example.org' })
      });
      answers.push(response.status);
      if (i === 5)
        expect(await response.text()).toContain('Too many tries. Wait 60 minutes, then try again.');
    }
    expect(answers).toEqual([200, 200, 200, 200, 200, 429]);
  });
});

describe('the outbox', () => {
  it('is not there where mail is sent', async () => {
    expect((await fetch(`${server.address}/outbox`)).status).toBe(404);
  });

  it('holds the mail in local mode, with links to follow', async () => {
    const local = await startServer();
    const page = await openAuditPage(browser, { viewport: { width: 390, height: 800 } });
    await page.goto(`${local.address}/sign-in/by-mail`, { waitUntil: 'networkidle' });
    await page.getByLabel('Address').fill('me@example.org');
    await page.getByRole('button', { name: 'Mail me a link' }).click();
    await page.getByRole('link', { name: 'read the message in the outbox' }).click();
    await page.getByRole('heading', { name: 'Sign in to Severalty' }).waitFor();
    expect(await audit(page)).toEqual([]);
    await screenshots(browser, `${local.address}/outbox`, 'outbox');
    await page.getByRole('link', { name: /\/sign-in\/mailed/ }).click();
    await page.getByRole('button', { name: 'Sign in as me@example.org' }).click();
    await page.waitForURL(`${local.address}/teams`);
    await page.context().close();
    await local.stop();
  });

  it.each([
    ['behind a proxy, known by its address', { ORIGIN: 'https://counts.example.org' }],
    ['behind a proxy, known by its header', { ADDRESS_HEADER: 'x-forwarded-for' }],
    ['for the whole network', { HOST: '0.0.0.0' }]
  ])('is not there %s, and no mail is promised', async (_name, env) => {
    const port = await freePort();
    const open = await startServer({ ...env, PORT: String(port) });
    const get = (path: string) => fetch(`http://127.0.0.1:${port}${path}`);
    expect((await get('/outbox')).status).toBe(404);
    expect(await (await get('/sign-in')).text()).not.toContain('/sign-in/by-mail');
    expect(await (await get('/sign-in/by-mail')).text()).toContain('No mail can be sent from here');
    await open.stop();
  });
});

it('writes no token and no address into the log', () => {
  expect(server.output()).not.toMatch(/token=|example\.org\b(?!>)/);
});

/** A port that was free a moment ago: the printed address does not tell it when ORIGIN is set. */
function freePort(): Promise<number> {
  return new Promise((resolve) => {
    const probe = createServer().listen(0, '127.0.0.1', () => {
      const { port } = probe.address() as AddressInfo;
      probe.close(() => resolve(port));
    });
  });
}
