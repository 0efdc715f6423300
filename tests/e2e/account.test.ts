import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, openAuditPage } from './support/axe';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
import { screenshots } from './support/screenshots';
import { seedPerson, seedTeam } from './support/seed-people';
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

/** A page of a new person, signed in. */
async function signedIn(options: Parameters<Browser['newPage']>[0] = {}) {
  const someone = await seedPerson(server);
  const page = await browser.newPage(options);
  await signIn(page, server.address, someone.email, someone.password);
  return { page, ...someone };
}

describe('the account page', () => {
  it('changes the name, at the head of the page too', async () => {
    const { page } = await signedIn();
    const complaints = complaintsOf(page);
    await page.goto(`${server.address}/account`, { waitUntil: 'networkidle' });
    await page.getByLabel('Name', { exact: true }).fill('Ada of the Bay');
    await page.getByRole('button', { name: 'Change the name' }).click();
    await page.getByText('Your name is changed.').waitFor();
    await page.getByRole('link', { name: 'Ada of the Bay' }).waitFor();
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('changes the password: this browser stays, every other one is signed out', async () => {
    const { page, email, password } = await signedIn();
    const other = await browser.newPage();
    await signIn(other, server.address, email, password);
    const complaints = complaintsOf(page);
    await page.goto(`${server.address}/account`, { waitUntil: 'networkidle' });
    const change = async (old: string, wanted: string) => {
      await page.getByLabel('Present password').fill(old);
      await page.getByLabel('New password').fill(wanted);
      await page.getByRole('button', { name: 'Change the password' }).click();
    };
    await change('not it', 'lighthouse brass verdigris');
    await page.getByText('This is not your password.').waitFor();
    await change(password, 'password1');
    await page.locator('#password-problem').waitFor();
    expect(await page.locator('#password-problem').textContent()).toContain(
      'It has 9 of at least 10 characters.'
    );
    await change(password, 'lighthouse brass verdigris');
    await page.getByText('Your password is changed').waitFor();
    expect(complaints).toEqual([]);
    await page.reload();
    expect(page.url()).toBe(`${server.address}/account`);
    await other.goto(`${server.address}/account`);
    expect(other.url()).toContain('/sign-in');
    await signIn(other, server.address, email, 'lighthouse brass verdigris');
    await Promise.all([page.close(), other.close()]);
  });

  it.each([true, false])('signs out everywhere; JavaScript: %s', async (javaScriptEnabled) => {
    const { page, email, password } = await signedIn({ javaScriptEnabled });
    const other = await browser.newPage();
    await signIn(other, server.address, email, password);
    await page.goto(`${server.address}/account`);
    await page.getByRole('button', { name: 'Sign out everywhere' }).click();
    await page.getByRole('link', { name: 'Sign in', exact: true }).waitFor();
    await other.goto(`${server.address}/account`);
    expect(other.url()).toContain('/sign-in');
    await Promise.all([page.close(), other.close()]);
  });

  it('is kept by no cache', async () => {
    const { page } = await signedIn();
    const response = await page.goto(`${server.address}/account`);
    expect(response?.headers()['cache-control']).toContain('no-store');
    await page.close();
  });
});

describe('the teams page', () => {
  it('makes a team and says which addresses are not to be had', async () => {
    const { page, id } = await signedIn();
    await seedTeam(server, 'bay-side');
    await seedTeam(server, 'marram', [[{ id }, 'observer']]);
    const complaints = complaintsOf(page);
    await page.goto(`${server.address}/teams`, { waitUntil: 'networkidle' });
    await page.getByRole('row', { name: 'Team marram observer' }).waitFor();
    expect(await page.getByText('bay-side').count()).toBe(0);
    const make = page.getByRole('button', { name: 'Make this team' });
    await page.getByLabel('Name').fill('Bay Side');
    await make.click();
    await page.getByText('/team/bay-side is in use.').waitFor();
    await page.getByLabel('Word in its address').fill('admin');
    await make.click();
    await page.getByText('/team/admin is kept for the program.').waitFor();
    await page.getByLabel('Word in its address').fill('bay-side-2');
    await make.click();
    await page.waitForURL(`${server.address}/team/bay-side-2`);
    await page.goto(`${server.address}/teams`);
    await page.getByRole('row', { name: 'Bay Side lead' }).waitFor();
    expect(complaints.filter((line) => !/bay-side-2/.test(line))).toEqual([]);
    await page.close();
  });
});

describe('both pages', () => {
  it.each(['/account', '/teams'])('%s passes axe, and scrolls no phone sideways', async (path) => {
    const { email, password } = await seedPerson(server, { name: 'A Rather Long Invented Name of a Person' });
    const page = await openAuditPage(browser, { viewport: { width: 320, height: 800 } });
    await signIn(page, server.address, email, password);
    await page.goto(server.address + path, { waitUntil: 'networkidle' });
    expect(await audit(page)).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(320);
    await page.context().close();
    await screenshots(browser, server.address, path.slice(1), async (picture) => {
      await signIn(picture, server.address, email, password);
      await picture.goto(server.address + path, { waitUntil: 'networkidle' });
    });
  });
});
