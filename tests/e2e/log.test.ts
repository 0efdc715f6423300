import type { Actor } from '$lib/server/services/access/actor';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { listen, type Listener } from '../support/listen';
import { linkIn, startMailServer, type MailServer } from '../support/mail-server';
import { ask, CSV_TYPE, JSON_TYPE, seedToken } from './support/api';
import { logLines } from './support/log-lines';
import { seedPerson, seedTeam, type SeededPerson } from './support/seed-people';
import { sessionOf } from './support/session-of';
import { seedLink, seedSharedReport } from './support/shared-report';
import { startServer, type RunningServer } from './support/start-server';

let mail: MailServer;
let listener: Listener;
let server: RunningServer;
let lead: SeededPerson;
let actor: Actor;

beforeAll(async () => {
  [mail, listener] = await Promise.all([startMailServer(), listen()]);
  // The log is held to this where it tells most.
  server = await startServer({ SMTP_URL: mail.url, WEBHOOKS_INSIDE: 'yes', LOG_LEVEL: 'debug' });
  lead = await seedPerson(server);
  const team = await seedTeam(server, 'log', [[lead, 'lead']]);
  actor = { personId: lead.id, teamId: team.id, role: 'lead' };
});

afterAll(async () => {
  await server?.stop();
  listener?.close();
  await mail?.stop();
});

/** The line about a request, waited for: it is written when the answer has gone. */
async function lineOf(id: string | null) {
  const found = () => logLines(server).find((line) => line.message === 'request' && line.request === id);
  await expect.poll(found).toBeDefined();
  return found()!;
}

const post = (path: string, fields: Record<string, string>, cookie = '') =>
  fetch(`${server.address}${path}`, {
    method: 'POST',
    body: new URLSearchParams(fields),
    headers: { origin: server.address, accept: 'text/html', cookie },
    redirect: 'manual'
  });

describe('a request', () => {
  it('has one line, under the id that its answer names', async () => {
    const response = await fetch(`${server.address}/samples/nothing?counts=0,185`);
    const id = response.headers.get('x-request-id');
    const { time, ms, ...line } = await lineOf(id);
    expect(line).toEqual({
      level: 'info',
      message: 'request',
      request: id,
      method: 'GET',
      path: '/samples/nothing',
      route: '/samples/[slug]',
      status: 404
    });
    expect(new Date(time).getTime()).toBeGreaterThan(Date.now() - 60_000);
    expect(ms).toBeTypeOf('number');
  });

  it('of somebody signed in names them and their team by id', async () => {
    const cookie = await sessionOf(server.address, lead.email, lead.password);
    const response = await fetch(`${server.address}/team/log/datasets`, { headers: { cookie } });
    expect(await lineOf(response.headers.get('x-request-id'))).toMatchObject({
      person: lead.id,
      team: actor.teamId,
      route: '/(team)/team/[team=slug]/datasets',
      status: 200
    });
  });

  it('that is refused tells its id in the problem, wherever it was refused', async () => {
    const token = await seedToken(server, actor);
    const refused = [
      await ask(server, null, '/team'),
      await ask(server, token, '/datasets/unknown'),
      await ask(server, token, '/nowhere'),
      await ask(server, token, '/team', { method: 'DELETE' }),
      // Refused before Kit, and by a JSON route of the pages.
      await ask(server, token, '/datasets', { method: 'POST', body: new URLSearchParams({ a: 'b' }) }),
      await fetch(`${server.address}/team/log/datasets/list`)
    ];
    for (const response of refused) {
      expect(response.headers.get('content-type')).toBe('application/problem+json');
      const { requestId } = (await response.json()) as { requestId?: string };
      expect(requestId).toBe(response.headers.get('x-request-id'));
      expect((await lineOf(requestId!)).status).toBe(response.status);
    }
  });

  it('gets no id that somebody else wrote', async () => {
    const headers = { 'x-request-id': 'written-by-anybody' };
    const response = await fetch(server.address, { headers });
    expect(response.headers.get('x-request-id')).toMatch(/^[\da-f]{16}$/);
  });
});

describe('the log', () => {
  it('holds no secret of those that were used', async () => {
    const secrets: Record<string, string> = {
      'the key of the server': readFileSync(join(server.data, 'auth-secret'), 'utf8').trim(),
      password: lead.password,
      'wrong password': 'wrong-lantern-verdigris',
      'new password': 'lighthouse brass verdigris'
    };
    await post('/sign-in', { email: lead.email, password: secrets['wrong password'] });
    const cookie = await sessionOf(server.address, lead.email, lead.password);
    secrets.session = cookie.slice(cookie.indexOf('=') + 1);

    secrets['token of a script'] = await seedToken(server, actor, { scopes: ['read', 'upload', 'webhooks'] });
    const script = secrets['token of a script'];
    await ask(server, script, '/team');
    await ask(server, script, `/datasets?name=Dice&trials=12`, {
      method: 'POST',
      body: 'count,shots\n0,185\n1,1149\n',
      headers: CSV_TYPE
    });
    await fetch(`${server.address}/team/${script}?token=${script}`);

    const body = JSON.stringify({ name: 'listener', url: listener.url, actions: ['gate.fail'] });
    const made = await ask(server, script, '/webhooks', { method: 'POST', body, headers: JSON_TYPE });
    const hook = (await made.json()) as { id: string; secret: string };
    secrets['secret of a webhook'] = hook.secret;
    await ask(server, script, `/webhooks/${hook.id}`);

    const there = await seedSharedReport(server);
    secrets['token of a link'] = (await seedLink(server, there)).token;
    const link = `${server.address}/link/${secrets['token of a link']}`;
    for (const path of ['', '/', '/report.pdf', '/__data.json', '/nothing', '/report.json?a=b'])
      expect((await fetch(`${link}${path}`)).status).toBeLessThan(500);
    await fetch(link.replace('/link/', '/%6Cink/'));

    await post('/password', { email: lead.email });
    const mailed = linkIn(await mail.to(lead.email), `${server.address}/password/new?token=`);
    secrets['mailed token'] = new URL(mailed).searchParams.get('token')!;
    await fetch(mailed);
    const form = `/password/new${new URL(mailed).search}`;
    expect((await post(form, { password: secrets['new password'] })).status).toBe(303);

    await fetch(`${server.address}/unsubscribe/secret.of.mail`);
    secrets['link that ends mail'] = 'secret.of.mail';
    secrets.address = lead.email;
    secrets['address of another'] = there.lead.email;
    secrets.counts = '1149';

    const last = await fetch(`${server.address}/samples/nothing`);
    await lineOf(last.headers.get('x-request-id'));
    const written = server.output();
    // What the secrets were used for is told: it is there to be searched for.
    for (const told of [
      '/password/new',
      '/link/…/report.pdf',
      '/link/…',
      '/api/v1/webhooks',
      '/unsubscribe/…'
    ])
      expect(written).toContain(`"path":"${told}"`);
    for (const [name, secret] of Object.entries(secrets)) {
      expect(secret.length, name).toBeGreaterThan(3);
      expect(written.includes(secret), name).toBe(false);
      expect(written.includes(encodeURIComponent(secret)), name).toBe(false);
    }
  });
});

describe('behind a proxy', () => {
  it('a request keeps the id that the proxy gave it', async () => {
    const behind = await startServer({ ADDRESS_HEADER: 'x-forwarded-for' });
    const headers = { 'x-forwarded-for': '192.0.2.1', 'x-request-id': 'proxy-4711' };
    const response = await fetch(behind.address, { headers });
    expect(response.headers.get('x-request-id')).toBe('proxy-4711');
    await expect.poll(() => logLines(behind).some(({ request }) => request === 'proxy-4711')).toBe(true);
    await behind.stop();
  });
});

describe('LOG_LEVEL', () => {
  it('warn leaves out what goes well', async () => {
    const quiet = await startServer({ LOG_LEVEL: 'warn' });
    expect((await fetch(quiet.address)).status).toBe(200);
    expect(await quiet.stop()).toBe(0);
    expect(logLines(quiet)).toEqual([]);
  });
});
