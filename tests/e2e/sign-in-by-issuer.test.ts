import { disablePerson } from '$lib/server/services/people/disable-person';
import { identity, person } from '$lib/server/db/schema';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { startIssuer, type TestIssuer } from '../support/issuer';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
import { seedPerson, withDatabaseOf } from './support/seed-people';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

let issuer: TestIssuer;
let server: RunningServer;
let browser: Browser;
let page: Page;

beforeAll(async () => {
  issuer = await startIssuer();
  [server, browser] = await Promise.all([startServer(issuer.env), openBrowser()]);
});

beforeEach(async () => {
  issuer.spoil = null;
  await page?.close();
  page = await browser.newPage();
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
  await issuer?.stop();
});

/** Goes to the issuer from the sign-in page, and waits until that is over. */
async function visit(visitor: TestIssuer['visitor'], on: Page = page): Promise<void> {
  issuer.visitor = visitor;
  await on.goto(`${server.address}/sign-in?then=%2Faccount`, { waitUntil: 'networkidle' });
  await on.getByRole('button', { name: 'Sign in through Invented Institute' }).click();
  await on.waitForURL(/\/(account|sign-in\?(problem|error)=\S+)/);
}

const identities = () => withDatabaseOf(server, (db) => db.select().from(identity).all());

describe('an institution', () => {
  it.each([true, false])(
    'signs in somebody new whose address it confirms; JavaScript: %s',
    async (javaScript) => {
      const on = await browser.newPage({ javaScriptEnabled: javaScript });
      const complaints = complaintsOf(on);
      const sub = `new-${javaScript}`;
      await visit({ sub, name: 'Nora Invented', email: `${sub}@Example.org`, email_verified: true }, on);
      expect(on.url()).toBe(`${server.address}/account`);
      await on.getByText(`${sub}@example.org`).waitFor();
      await on.getByRole('link', { name: 'Nora Invented' }).waitFor();
      if (javaScript) expect(complaints).toEqual([]);

      expect(issuer.asked.get('code_challenge_method')).toBe('S256');
      expect(issuer.asked.get('code_challenge')).toMatch(/^[\w-]{43}$/);
      for (const name of ['state', 'nonce']) expect(issuer.asked.get(name)?.length, name).toBeGreaterThan(20);
      expect(issuer.asked.get('redirect_uri')).toBe(`${server.address}/auth/callback/oidc`);
      await on.close();
    }
  );

  it('knows them again by their subject, whatever their address has become', async () => {
    const before = (await identities()).length;
    await visit({ sub: 'new-true', email: 'married@example.org', email_verified: true });
    await page.getByText('new-true@example.org').waitFor();
    expect((await identities()).length).toBe(before);
  });

  it('is tied to an account with the same address when it confirms the address', async () => {
    const { id, email } = await seedPerson(server);
    await visit({ sub: 'known', email, email_verified: 'true' });
    await page.getByText(email).waitFor();
    expect(await identities()).toContainEqual(expect.objectContaining({ subject: 'known', personId: id }));
  });

  it('opens no account by an address that it does not confirm', async () => {
    const { id, email } = await seedPerson(server);
    for (const email_verified of [false, 'false', undefined]) {
      await visit({ sub: 'thief', email, email_verified });
      await page.getByText('does not confirm that the address').waitFor();
    }
    await visit({ sub: 'thief', email: 'nobody-yet@example.org' });
    expect(page.url()).toContain('problem=unverified');
    expect(
      (await identities()).filter(({ personId, subject }) => personId === id || subject === 'thief')
    ).toEqual([]);
    expect(await withDatabaseOf(server, (db) => db.select().from(person).all())).not.toContainEqual(
      expect.objectContaining({ email: 'nobody-yet@example.org' })
    );
  });

  it('is tied to whoever is signed in, by their own wish, and untied again', async () => {
    const { id, email, password } = await seedPerson(server);
    await signIn(page, server.address, email, password);
    issuer.visitor = { sub: 'own-wish', email: 'elsewhere@example.org' };
    await page.goto(`${server.address}/account`, { waitUntil: 'networkidle' });
    await page.getByRole('button', { name: 'Tie Invented Institute to this account' }).click();
    await page.getByText(/, tied/).waitFor();
    expect(await identities()).toContainEqual(expect.objectContaining({ subject: 'own-wish', personId: id }));
    await page.getByRole('button', { name: 'Untie it' }).click();
    await page.getByText(/, tied/).waitFor({ state: 'detached' });
    expect((await identities()).filter(({ personId }) => personId === id)).toEqual([]);

    // What belongs to another account stays there.
    issuer.visitor = { sub: 'new-true' };
    await page.getByRole('button', { name: 'Tie Invented Institute to this account' }).click();
    await page.getByText('That identity belongs to another account here.').waitFor();
  });

  it('lets nobody in whose account is closed', async () => {
    const { email } = await seedPerson(server);
    await visit({ sub: 'closed', email, email_verified: true });
    await withDatabaseOf(server, (db) => disablePerson(db, email));
    await page.goto(`${server.address}/account`);
    await visit({ sub: 'closed', email, email_verified: true });
    await page.getByText('This account is closed.').waitFor();
  });

  it.each(['nonce', 'audience'] as const)('is not believed with a %s that is not ours', async (spoil) => {
    issuer.spoil = spoil;
    await visit({ sub: 'new-true', email: 'new-true@example.org', email_verified: true });
    expect(page.url()).toContain('/sign-in?error=');
    await page.getByText('Signing in there did not work').waitFor();
    await page.goto(`${server.address}/account`);
    expect(page.url()).toContain('/sign-in');
  });

  it('is not believed when the browser did not set out from here', async () => {
    const response = await fetch(`${server.address}/auth/callback/oidc?code=abc&state=def`, {
      redirect: 'manual'
    });
    expect(response.headers.get('location')).toContain('/sign-in?error=');
    expect(
      response.headers.getSetCookie().filter((cookie) => /^severalty-session=[^;]/.test(cookie))
    ).toEqual([]);
  });

  it('is named in form-action on the pages that lead there, and on no other', async () => {
    const policy = async (path: string) =>
      (await fetch(server.address + path)).headers.get('content-security-policy') ?? '';
    expect(await policy('/sign-in')).toContain(`form-action 'self' ${new URL(issuer.url).origin};`);
    expect(await policy('/')).toMatch(/form-action 'self';/);
  });

  it('leaves no token, address or secret in the log', () => {
    expect(server.output()).not.toMatch(/example\.org|a secret of the tests|eyJ|code=/);
  });
});
