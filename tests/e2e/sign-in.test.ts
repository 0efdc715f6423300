import { disablePerson } from '$lib/server/services/people/disable-person';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, openAuditPage } from './support/axe';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
import { seedPerson, withDatabaseOf } from './support/seed-people';
import { screenshots } from './support/screenshots';
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

/** The form, filled in and sent as a person would. */
async function typeIn(page: Page, email: string, password: string): Promise<void> {
  await page.getByLabel('Address').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
}

/** One POST of the form without JavaScript. */
function post(email: string, password: string, then = ''): Promise<Response> {
  return fetch(`${server.address}/sign-in${then}`, {
    method: 'POST',
    headers: { origin: server.address, accept: 'text/html' },
    body: new URLSearchParams({ email, password }),
    redirect: 'manual'
  });
}

describe('signing in with a password', () => {
  it.each([true, false])('opens the page that was asked for; JavaScript: %s', async (javaScriptEnabled) => {
    const { email, password, name } = await seedPerson(server);
    const page = await browser.newPage({ javaScriptEnabled });
    const complaints = complaintsOf(page);
    await page.goto(`${server.address}/account`, { waitUntil: 'networkidle' });
    expect(page.url()).toBe(`${server.address}/sign-in?then=%2Faccount`);
    await typeIn(page, email, password);
    await page.waitForURL(`${server.address}/account`);
    await page.getByRole('link', { name }).waitFor();

    const cookies = await page.context().cookies();
    const cookie = cookies.find((one) => one.name === 'severalty-session');
    expect(cookie).toMatchObject({ httpOnly: true, sameSite: 'Lax', secure: false, path: '/' });

    await page.getByRole('button', { name: 'Sign out', exact: true }).click();
    await page.getByRole('link', { name: 'Sign in', exact: true }).waitFor();
    await page.goto(`${server.address}/account`);
    expect(page.url()).toContain('/sign-in');
    // Without JavaScript the browser itself calls every script it leaves out a breach.
    // A load of data that signing out overtook is no complaint.
    const real = complaints.filter((line) => !/__data\.json\S* net::ERR_ABORTED/.test(line));
    if (javaScriptEnabled) expect(real).toEqual([]);
    await page.close();
  });

  it('keeps the address and not the password, and says the same whether or not an account exists', async () => {
    const { email } = await seedPerson(server);
    const page = await browser.newPage();
    const words: string[] = [];
    for (const typed of [email, 'nobody@example.org']) {
      await page.goto(`${server.address}/sign-in`, { waitUntil: 'networkidle' });
      await typeIn(page, typed, 'not the password');
      const problem = page.locator('#password-problem');
      await problem.waitFor();
      words.push((await problem.textContent()) ?? '');
      expect(await page.getByLabel('Address').inputValue()).toBe(typed);
      expect(await page.getByLabel('Password').inputValue()).toBe('');
    }
    expect(words[0]).toBe('Address and password do not fit together.');
    expect(words[1]).toBe(words[0]);
    await page.close();
    // The whole page, too: only the typed address may differ.
    const pages = await Promise.all(
      [email, 'nobody@example.org'].map(async (typed) => {
        const response = await post(typed, 'not the password');
        const text = (await response.text()).replaceAll(typed, 'ADDRESS');
        return { status: response.status, text: text.replace(/nonce="[^"]*"|form id|id:"\w+"/g, '') };
      })
    );
    expect(pages[0].status).toBe(400);
    expect(pages[1]).toEqual(pages[0]);
    expect(pages[0].text).not.toContain('not the password');
  });

  it('goes on to its own pages alone', async () => {
    const { email, password } = await seedPerson(server);
    const went = async (then: string) =>
      (await post(email, password, `?then=${encodeURIComponent(then)}`)).headers.get('location');
    expect(await went('/account?a=1#b')).toBe('/account?a=1#b');
    for (const elsewhere of ['https://example.org/', '//example.org', '/\\example.org', '/\t/example.org'])
      expect(await went(elsewhere)).toBe('/teams');
  });

  it('refuses a form from another site', async () => {
    const { email, password } = await seedPerson(server);
    const response = await fetch(`${server.address}/sign-in`, {
      method: 'POST',
      headers: { origin: 'https://example.org' },
      body: new URLSearchParams({ email, password })
    });
    expect(response.status).toBe(403);
    expect(response.headers.get('set-cookie')).toBeNull();
  });

  it('has no way round the limits through the addresses of Auth.js', async () => {
    for (const path of [
      'signin',
      'session',
      'csrf',
      'providers',
      'callback/ticket',
      'callback/oidc',
      'signout'
    ]) {
      const response = await fetch(`${server.address}/auth/${path}`, {
        method: 'POST',
        headers: { origin: server.address, 'content-type': 'application/x-www-form-urlencoded' },
        body: 'ticket=x'
      });
      expect(response.status, path).toBe(404);
    }
    expect((await fetch(`${server.address}/auth/session`)).status).toBe(404);
  });
});

describe('a session', () => {
  it('ends at once when the person is disabled', async () => {
    const { email, password } = await seedPerson(server);
    const page = await browser.newPage();
    await signIn(page, server.address, email, password);
    await page.goto(`${server.address}/account`);
    expect(page.url()).toBe(`${server.address}/account`);
    await withDatabaseOf(server, (db) => disablePerson(db, email));
    await page.reload();
    expect(page.url()).toContain('/sign-in?then=%2Faccount');
    await expect(signIn(page, server.address, email, password)).rejects.toThrow(/400/);
    await page.close();
  });

  it('cannot be made up, or moved to another person by hand', async () => {
    for (const value of ['x', 'a.b.c.d.e', '']) {
      const response = await fetch(`${server.address}/account`, {
        headers: { cookie: `severalty-session=${value}` },
        redirect: 'manual'
      });
      expect(response.status).toBe(303);
    }
  });
});

describe('the limits', () => {
  it('answer the eleventh wrong password of an account with 429 and how long to wait, known or not', async () => {
    const { email, password } = await seedPerson(server);
    const answers = [];
    for (const typed of [email, 'unknown@example.org']) {
      for (let i = 0; i < 10; i++) expect((await post(typed, 'wrong')).status).toBe(400);
      const response = await post(typed, password);
      expect(response.status).toBe(429);
      expect(Number(response.headers.get('retry-after'))).toBeGreaterThan(800);
      answers.push(/Too many tries\. Wait 15 minutes, then try again\./.test(await response.text()));
    }
    expect(answers).toEqual([true, true]);
    // Others are not held up by it.
    const other = await seedPerson(server);
    expect((await post(other.email, other.password)).status).toBe(303);
  });
});

describe('the page', () => {
  it('passes axe, and scrolls no phone sideways', async () => {
    const page = await openAuditPage(browser, { viewport: { width: 320, height: 800 } });
    await page.goto(`${server.address}/sign-in`, { waitUntil: 'networkidle' });
    await typeIn(page, 'somebody@example.org', 'x');
    await page.locator('#password-problem').waitFor();
    expect(await audit(page)).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(320);
    await page.context().close();
    await screenshots(browser, `${server.address}/sign-in`, 'sign-in');
  });

  it('writes neither addresses nor passwords into the log', () => {
    expect(server.output()).not.toMatch(/example\.org|wrong|invented/);
  });
});
