import { createServer, type AddressInfo } from 'node:net';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { seedPerson } from './support/seed-people';
import { startServer, type RunningServer } from './support/start-server';

const ORIGIN = 'https://counts.example.org';
let server: RunningServer;
let here: string;

/** As a proxy would ask: over http, with the name that people typed. */
const ask = (path: string, init: RequestInit = {}) => fetch(here + path, { redirect: 'manual', ...init });

beforeAll(async () => {
  const port = await new Promise<number>((resolve) => {
    const probe = createServer().listen(0, '127.0.0.1', () => {
      const { port } = probe.address() as AddressInfo;
      probe.close(() => resolve(port));
    });
  });
  server = await startServer({ PORT: String(port), ORIGIN, ADDRESS_HEADER: 'x-client' });
  here = `http://127.0.0.1:${port}`;
});

afterAll(() => server?.stop());

/** One sign-in form from a client's address. */
function post(email: string, password: string, client: string): Promise<Response> {
  return ask('/sign-in', {
    method: 'POST',
    headers: { origin: ORIGIN, accept: 'text/html', 'x-client': client },
    body: new URLSearchParams({ email, password })
  });
}

describe('under https', () => {
  it('sessions are in a cookie that no plain connection and no other host can set or see', async () => {
    const { email, password } = await seedPerson(server);
    const response = await post(email, password, '192.0.2.1');
    expect(response.status).toBe(303);
    const cookies = response.headers.getSetCookie();
    const session = cookies.find((cookie) => cookie.startsWith('__Host-severalty-session='));
    expect(session).toMatch(/; Path=\/(;|$)/i);
    for (const mark of [/; Secure/i, /; HttpOnly/i, /; SameSite=Lax/i]) expect(session).toMatch(mark);
    expect(session).not.toMatch(/; Domain/i);
    for (const cookie of cookies) expect(cookie).toMatch(/^__(Host|Secure)-.*; Secure/i);

    const [cookie] = session!.split(';');
    expect((await ask('/account', { headers: { cookie } })).status).toBe(200);
    // Under the name that http uses, it opens nothing.
    const plain = cookie.replace('__Host-', '');
    expect((await ask('/account', { headers: { cookie: plain } })).status).toBe(303);
  });

  it('pages and files tell browsers to stay with https, and plain http does not', async () => {
    const page = await ask('/');
    const [file] = /_app\/immutable\/[\w./-]+\.js/.exec(await page.text()) ?? [];
    for (const response of [page, await ask(`/${file}`), await ask('/nothing-here')])
      expect(response.headers.get('strict-transport-security')).toBe('max-age=31536000');
    const plain = await startServer();
    expect((await fetch(plain.address)).headers.get('strict-transport-security')).toBeNull();
    await plain.stop();
  });

  it('a forged Host header changes no address', async () => {
    const forged = await ask('/account', {
      headers: { host: 'evil.example', 'x-forwarded-host': 'evil.example' }
    });
    expect(forged.headers.get('location')).toBe('/sign-in?then=%2Faccount');
    expect(await (await ask('/', { headers: { 'x-forwarded-host': 'evil.example' } })).text()).not.toContain(
      'evil'
    );
  });

  it('counts wrong passwords by the address that the proxy passes on', async () => {
    for (let i = 0; i < 40; i++)
      expect((await post(`p${i}@example.org`, 'wrong', '192.0.2.9')).status).toBe(400);
    expect((await post('p99@example.org', 'wrong', '192.0.2.9')).status).toBe(429);
    expect((await post('p99@example.org', 'wrong', '192.0.2.10')).status).toBe(400);
  });
});
