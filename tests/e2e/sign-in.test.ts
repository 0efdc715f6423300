import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { complaintsOf } from './support/complaints';
import { openBrowser } from './support/open-browser';
import { seedPerson } from './support/seed-people';
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

describe('signing in with a password', () => {
  it('opens the page that was asked for', async () => {
    const { email, password } = await seedPerson(server);
    const page = await browser.newPage();
    const complaints = complaintsOf(page);
    await page.goto(`${server.address}/sign-in?then=%2F%3Fa%3D1`, { waitUntil: 'networkidle' });
    await page.getByLabel('Address').fill(email);
    await page.getByLabel('Password').fill(password);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL(`${server.address}/?a=1`);
    expect(complaints).toEqual([]);
    await page.close();
  });

  it('is done by tests with one POST', async () => {
    const { email, password } = await seedPerson(server);
    const page = await browser.newPage();
    await signIn(page, server.address, email, password);
    const cookies = await page.context().cookies();
    const cookie = cookies.find(({ name }) => name === 'severalty-session');
    expect(cookie).toMatchObject({ httpOnly: true, sameSite: 'Lax' });
    await page.close();
  });
});
