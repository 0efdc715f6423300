import { idempotentAnswer, webhook, webhookDelivery } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { request } from 'node:http';
import { gzipSync } from 'node:zlib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { hookOf } from '../support/webhooks';
import { ask, JSON_TYPE, seedToken } from './support/api';
import { seedPerson, seedTeam, withDatabaseOf, type SeededPerson } from './support/seed-people';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let actor: Actor;
let token: string;
let foreign: string;

beforeAll(async () => {
  server = await startServer();
  const [lead, stranger] = [await seedPerson(server), await seedPerson(server)];
  const actorOf = async (slug: string, person: SeededPerson): Promise<Actor> => {
    const team = await seedTeam(server, slug, [[person, 'lead']]);
    return { personId: person.id, teamId: team.id, role: 'lead' };
  };
  actor = await actorOf('own-team', lead);
  token = await seedToken(server, actor, { scopes: ['webhooks'] });
  foreign = await seedToken(server, await actorOf('lagoon', stranger), { scopes: ['webhooks'] });
});

afterAll(() => server?.stop());

const HOOK = { name: 'night shift', url: 'https://example.org/hook', actions: ['gate.fail', 'gate.fail'] };
const post = (path: string, body?: string, headers: Record<string, string> = {}, by = token) =>
  ask(server, by, path, { method: 'POST', body, headers });
const make = (more: object = {}, headers: Record<string, string> = {}) =>
  post('/webhooks', JSON.stringify({ ...HOOK, ...more }), { ...JSON_TYPE, ...headers });
const json = async (response: Response) => (await response.json()) as Record<string, unknown>;
const howMany = () => withDatabaseOf(server, (db) => db.select().from(webhook).all().length);

describe('a webhook made by a script', () => {
  it('has its secret in the first answer alone, and is made once under a key', async () => {
    const key = { 'idempotency-key': '"hook-1"' };
    const first = await make({}, key);
    expect([first.status, first.headers.get('cache-control')]).toEqual([201, 'no-store']);
    const { secret, ...made } = await json(first);
    expect(Buffer.from((secret as string).slice('whsec_'.length), 'base64')).toHaveLength(32);
    expect(made.actions).toEqual(['gate.fail']);
    const again = await make({}, key);
    expect([again.status, again.headers.get('idempotency-replayed')]).toEqual([201, 'true']);
    expect(await json(again)).toEqual({ ...made, secret: null });
    const listed = await json(await ask(server, token, '/webhooks'));
    expect(listed).toEqual({ data: [made], next: null });
    // Neither the row nor what is kept under the key has it in the open.
    const kept = await withDatabaseOf(server, (db) =>
      JSON.stringify([db.select().from(webhook).all(), db.select().from(idempotentAnswer).all()])
    );
    expect(kept).toContain(made.id);
    expect(kept).not.toContain((secret as string).slice('whsec_'.length));
  });

  it.each([
    [{ url: 'http://169.254.169.254/' }, 422, 'inner-address'],
    [{ url: 'http://localhost:5432/' }, 422, 'inner-address'],
    [{ url: 'ftp://example.org/' }, 422, 'bad-input'],
    [{ url: 'https://a:b@example.org/' }, 422, 'bad-input'],
    [{ actions: [] }, 422, 'bad-input'],
    [{ actions: ['person.sign-in'] }, 422, 'bad-input'],
    [{ secret: 'my own' }, 422, 'bad-input']
  ])('%j is refused, and nothing is made', async (more, status, code) => {
    const before = await howMany();
    const refused = await make(more);
    expect([refused.status, (await json(refused)).code]).toEqual([status, code]);
    expect(await howMany()).toBe(before);
  });

  it('is refused when what was sent is no JSON, or of another type', async () => {
    const broken = await post('/webhooks', '{"name": "n', JSON_TYPE);
    expect([broken.status, (await json(broken)).code]).toEqual([400, 'bad-json']);
    const typed = await post('/webhooks', JSON.stringify(HOOK), { 'content-type': 'text/csv' });
    expect([typed.status, (await json(typed)).code]).toEqual([415, 'wrong-type']);
  });

  it('is not made of a body that did not arrive whole, nor of one in gzip; its key is free afterwards', async () => {
    const before = await howMany();
    const body = JSON.stringify(HOOK);
    const key = { 'idempotency-key': '"half-sent"' };
    const headers = { ...JSON_TYPE, ...key, authorization: `Bearer ${token}` };
    const half = request(`${server.address}/api/v1/webhooks`, {
      method: 'POST',
      headers: { ...headers, 'content-length': String(body.length) }
    });
    const broken = new Promise((resolve) => half.once('error', resolve).once('close', resolve));
    half.write(body.slice(0, 40), () => half.destroy());
    await broken;
    const zipped = await ask(server, token, '/webhooks', {
      method: 'POST',
      body: gzipSync(body),
      headers: { ...JSON_TYPE, 'content-encoding': 'gzip' }
    });
    expect([zipped.status, (await json(zipped)).code]).toEqual([400, 'bad-json']);
    expect(await howMany()).toBe(before);
    // The server learns of the broken connection a moment later; until then the key is busy.
    await expect.poll(async () => (await make({}, key)).status, { timeout: 10_000 }).toBe(201);
    expect(await howMany()).toBe(before + 1);
  });
});

describe('webhooks through the API', () => {
  it('need their scope and a lead, and are not there for another team', async () => {
    const id = await withDatabaseOf(server, (db) => hookOf(db, actor));
    const paths: [method: string, path: string][] = [
      ['GET', `/webhooks/${id}`],
      ['GET', `/webhooks/${id}/deliveries`],
      ['POST', `/webhooks/${id}/rest`],
      ['POST', `/webhooks/${id}/wake`],
      ['DELETE', `/webhooks/${id}`]
    ];
    const reads = await seedToken(server, actor, { scopes: ['read'] });
    const lesser = await seedToken(server, actor, { role: 'experimenter', scopes: ['webhooks'] });
    for (const [method, path] of paths) {
      for (const [by, status, code] of [
        [foreign, 404, 'not-found'],
        [reads, 403, 'wrong-scope'],
        [lesser, 403, 'not-allowed']
      ] as const) {
        const refused = await ask(server, by, path, { method });
        expect([refused.status, (await json(refused)).code], `${method} ${path}`).toEqual([status, code]);
      }
    }
    expect(await json(await ask(server, foreign, '/webhooks'))).toEqual({ data: [], next: null });
    expect((await ask(server, token, `/webhooks/${id}`)).status).toBe(200);
  });

  it('rest, wake, and are removed with their messages', async () => {
    const { id } = await json(await make());
    const key = { 'idempotency-key': '"rest-1"' };
    const rested = await json(await post(`/webhooks/${id}/rest`, undefined, key));
    expect(rested.restingSince).toMatch(/Z$/);
    expect((await json(await post(`/webhooks/${id}/wake`))).restingSince).toBeNull();
    // The same key again gives the first answer and puts nothing to rest.
    const again = await post(`/webhooks/${id}/rest`, undefined, key);
    expect([again.headers.get('idempotency-replayed'), await json(again)]).toEqual(['true', rested]);
    expect((await json(await ask(server, token, `/webhooks/${id}`))).restingSince).toBeNull();
    const gone = await ask(server, token, `/webhooks/${id}`, { method: 'DELETE' });
    expect([gone.status, (await json(gone)).id]).toEqual([200, id]);
    expect((await ask(server, token, `/webhooks/${id}`, { method: 'DELETE' })).status).toBe(404);
  });

  it('tell their messages page by page, of one status where asked', async () => {
    const id = await withDatabaseOf(server, (db) => hookOf(db, actor));
    const rows = await withDatabaseOf(server, (db) => db.select().from(webhookDelivery).all());
    const ours = rows.filter(({ webhookId }) => webhookId === id);
    const seen: unknown[] = [];
    let path: string | null = `/webhooks/${id}/deliveries?limit=2`;
    while (path !== null) {
      const response = await ask(server, token, path);
      const page = (await response.json()) as { data: { event: number; body: string }[]; next: string };
      seen.push(...page.data.map(({ event, body }) => [event, body]));
      const link = response.headers.get('link');
      expect(link === null).toBe(page.next === null);
      path = link && /<\/api\/v1([^>]+)>/.exec(link)![1];
    }
    const wanted = ours.map(({ eventId, body }) => [eventId, body]);
    expect(seen).toEqual(wanted.sort(([a], [b]) => Number(b) - Number(a)));
    const given = await json(await ask(server, token, `/webhooks/${id}/deliveries?status=given-up`));
    expect(given.data).toMatchObject([{ status: 'given-up', answered: 503, attempts: 19, nextTryAt: null }]);
    for (const query of ['?status=lost', '?after=x', '?after=-1', '?limit=0', '?state=sent'])
      expect((await ask(server, token, `/webhooks/${id}/deliveries${query}`)).status, query).toBe(422);
  });
});
