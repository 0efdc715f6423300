import { event, membership } from '$lib/server/db/schema';
import { revokeToken } from '$lib/server/services/tokens/revoke-token';
import { listTokens } from '$lib/server/services/tokens/list-tokens';
import type { Actor } from '$lib/server/services/access/actor';
import { and, eq } from 'drizzle-orm';
import { request } from 'node:http';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ask, CSV_TYPE, JSON_TYPE, REPORT_FILES, seedToken } from './support/api';
import { seedPerson, seedTeam, withDatabaseOf, type SeededPerson } from './support/seed-people';
import { seedReports } from './support/seed-reports';
import { sessionOf } from './support/session-of';
import { startServer, type RunningServer } from './support/start-server';

const SECRET = 'Secret lagoon chain';
let server: RunningServer;
let lead: SeededPerson;
let actor: Actor;
let token: string;
let foreign: { dataset: string; report: string; job: string };

beforeAll(async () => {
  server = await startServer();
  const insider = await seedPerson(server);
  lead = await seedPerson(server);
  const theirs = await seedTeam(server, 'lagoon', [[insider, 'lead']]);
  const ours = await seedTeam(server, 'own-team', [[lead, 'lead']]);
  actor = { personId: lead.id, teamId: ours.id, role: 'lead' };
  token = await seedToken(server, actor, { scopes: ['read', 'upload', 'diagnose'] });
  const made = await seedReports(server, { teamId: theirs.id, createdBy: insider.id, name: SECRET }, [{}]);
  const their = { personId: insider.id, teamId: theirs.id, role: 'lead' as const };
  const theirToken = await seedToken(server, their, { scopes: ['diagnose'] });
  const asked = await ask(server, theirToken, `/datasets/${made.datasetId}/jobs`, { method: 'POST' });
  foreign = {
    dataset: made.datasetId,
    report: made.reports[0],
    job: ((await asked.json()) as { id: string }).id
  };
});

afterAll(() => server?.stop());

const post = (path: string, body: string, headers: Record<string, string>, by = token) =>
  ask(server, by, path, { method: 'POST', body, headers });
const codeOf = async (response: Response) => ((await response.json()) as { code: string }).code;

describe('who may ask', () => {
  it('is told by the header alone: no cookie opens anything', async () => {
    const cookie = await sessionOf(server.address, lead.email, lead.password);
    const response = await ask(server, null, '/team', { headers: { cookie } });
    expect(response.status).toBe(401);
    expect(response.headers.get('www-authenticate')).toBe('Bearer realm="severalty"');
    expect(response.headers.get('set-cookie')).toBeNull();
    expect(response.headers.get('access-control-allow-origin')).toBeNull();
    expect((await ask(server, token, '/team')).status).toBe(200);
  });

  it('is refused in one way, whatever is wrong with the token', async () => {
    const revoked = await seedToken(server, actor, { name: 'to revoke' });
    await withDatabaseOf(server, (db) => {
      const found = listTokens(db, actor).find(({ name }) => name === 'to revoke');
      revokeToken(db, actor, found!.id);
    });
    const gone = await seedPerson(server);
    await withDatabaseOf(server, (db) =>
      db
        .insert(membership)
        .values({ teamId: actor.teamId, personId: gone.id, role: 'observer', createdAt: 1 })
        .run()
    );
    const left = await seedToken(server, { personId: gone.id, teamId: actor.teamId, role: 'observer' });
    expect((await ask(server, left, '/team')).status).toBe(200);
    await withDatabaseOf(server, (db) =>
      db
        .delete(membership)
        .where(and(eq(membership.personId, gone.id), eq(membership.teamId, actor.teamId)))
        .run()
    );
    const answers = [];
    for (const text of ['x', `${token}x`, revoked, left]) {
      const response = await ask(server, text, '/team');
      // Each answer has an id of its own, which tells of the request and not of the token.
      const { requestId, ...told } = (await response.json()) as { requestId: string };
      expect(requestId).toBe(response.headers.get('x-request-id'));
      answers.push([response.status, response.headers.get('www-authenticate'), told]);
    }
    expect(new Set(answers.map((answer) => JSON.stringify(answer))).size).toBe(1);
    expect(answers[0].slice(0, 2)).toEqual([401, 'Bearer realm="severalty", error="invalid_token"']);
  });

  it('needs the scope, and the role', async () => {
    const reads = await seedToken(server, actor, { scopes: ['read'] });
    const response = await post('/datasets', '0,1\n', CSV_TYPE, reads);
    expect([response.status, await codeOf(response)]).toEqual([403, 'wrong-scope']);
    expect(response.headers.get('www-authenticate')).toContain('error="insufficient_scope", scope="upload"');
    const observes = await seedToken(server, actor, { role: 'observer', scopes: ['read', 'upload'] });
    const second = await post('/datasets', '0,1\n', CSV_TYPE, observes);
    expect([second.status, await codeOf(second)]).toEqual([403, 'not-allowed']);
  });

  it('finds nothing of another team', async () => {
    const { dataset, report, job } = foreign;
    const paths = [
      `/datasets/${dataset}`,
      `/datasets/${dataset}/counts.csv`,
      `/jobs/${job}`,
      ...REPORT_FILES.map((file) => `/reports/${report}${file}`)
    ];
    for (const path of paths) {
      const response = await ask(server, token, path);
      expect(response.status, path).toBe(404);
      expect(await response.text()).not.toContain(SECRET);
    }
    expect((await post(`/datasets/${dataset}/jobs`, '{}', JSON_TYPE)).status).toBe(404);
    const listed = await (await ask(server, token, `/reports?dataset=${dataset}`)).text();
    expect(JSON.parse(listed)).toEqual({ data: [], next: null });
    for (const path of ['/nothing', '/team'] as const) {
      const response = await ask(server, token, path, { method: path === '/team' ? 'DELETE' : 'GET' });
      expect(response.headers.get('content-type'), path).toBe('application/problem+json');
      expect(response.status).toBe(path === '/team' ? 405 : 404);
    }
  });
});

describe('an upload', () => {
  it('keeps counts, conditions of the query, and who did it with which script', async () => {
    const response = await post(
      '/datasets?name=Chain%207&trials=12&quenchTime=2,5',
      'count,shots\n0,7\n1,5\n',
      CSV_TYPE
    );
    const saved = (await response.json()) as Record<string, unknown> & { id: string };
    expect(response.status).toBe(201);
    expect(saved).toMatchObject({
      name: 'Chain 7',
      trials: 12,
      counts: [
        [0, 7],
        [1, 5]
      ]
    });
    expect(saved.conditions).toMatchObject({ quenchTime: 2.5, device: null });
    expect(response.headers.get('location')).toBe(`/api/v1/datasets/${saved.id}`);
    const csv = await (await ask(server, token, `/datasets/${saved.id}/counts.csv`)).text();
    expect(csv).toBe('count,shots\r\n0,7\r\n1,5\r\n');
    const [told] = await withDatabaseOf(server, (db) =>
      db.select().from(event).where(eq(event.thing, saved.id)).all()
    );
    expect([told.personId, JSON.parse(told.detail!)]).toEqual([lead.id, { name: 'Chain 7', script: 'test' }]);
  });

  it('is refused with line and reason, or with the field, and nothing is saved', async () => {
    const bad = await post('/datasets', 'count,shots\n0,7\n-1,5\n', CSV_TYPE);
    const problem = (await bad.json()) as { code: string; errors: { line: number; message: string }[] };
    expect([bad.status, problem.code, problem.errors[0].line]).toEqual([422, 'unreadable', 3]);
    const json = await post('/datasets', '{\n"counts": {"0": 7,\n"1": 1.5}}', JSON_TYPE);
    expect(((await json.json()) as typeof problem).errors[0].line).toBe(3);
    const cases: [
      path: string,
      body: string,
      headers: Record<string, string>,
      status: number,
      code: string
    ][] = [
      ['/datasets?trials=1', 'count,shots\n0,7\n2,5\n', CSV_TYPE, 422, 'bad-conditions'],
      ['/datasets?trials=many', '0,7\n', CSV_TYPE, 422, 'bad-query'],
      ['/datasets?trails=12', '0,7\n', CSV_TYPE, 422, 'bad-query'],
      ['/datasets', '{"counts": {"0": 7}, "trials": 3}', JSON_TYPE, 422, 'bad-input'],
      ['/datasets', 'device,count,shots\na,0,7\nb,0,8\n', CSV_TYPE, 422, 'several'],
      ['/datasets', '0,7\n', { 'content-type': 'application/xml' }, 415, 'wrong-type'],
      ['/datasets', '', CSV_TYPE, 422, 'empty']
    ];
    const howMany = async () =>
      ((await (await ask(server, token, '/datasets')).json()) as { data: unknown[] }).data.length;
    const before = await howMany();
    for (const [path, body, headers, status, code] of cases) {
      const response = await post(path, body, headers);
      expect([response.status, await codeOf(response)], `${path} ${body}`).toEqual([status, code]);
    }
    expect(await howMany()).toBe(before);
  });
});

describe('an Idempotency-Key', () => {
  const body = 'count,shots\n0,71\n1,15\n';
  const headers = { ...CSV_TYPE, 'idempotency-key': '"one-upload"' };

  it('makes a request happen once', async () => {
    const [first, second] = [await post('/datasets', body, headers), await post('/datasets', body, headers)];
    expect([first.status, second.status]).toEqual([201, 201]);
    expect(await second.text()).toBe(await first.text());
    expect(second.headers.get('idempotency-replayed')).toBe('true');
    const other = await post('/datasets', 'count,shots\n0,72\n', headers);
    expect([other.status, await codeOf(other)]).toEqual([422, 'other-request']);
    const without = await post('/datasets', body, CSV_TYPE);
    expect([without.status, await codeOf(without)]).toEqual([409, 'already-there']);
    const bad = await post('/datasets', body, { ...CSV_TYPE, 'idempotency-key': 'two words' });
    expect([bad.status, await codeOf(bad)]).toEqual([400, 'bad-key']);
  });

  it('is busy while its first request is still arriving', async () => {
    const slow = request(`${server.address}/api/v1/datasets`, {
      method: 'POST',
      headers: { ...CSV_TYPE, authorization: `Bearer ${token}`, 'idempotency-key': '"slow"' }
    });
    const ended = new Promise<number | undefined>((resolve) =>
      slow.once('response', (r) => resolve(r.statusCode))
    );
    slow.write('count,shots\n0,33\n');
    const again = async () =>
      post('/datasets', 'count,shots\n0,33\n', { ...CSV_TYPE, 'idempotency-key': '"slow"' });
    // Until the server has seen the first lines, the second request would be the first.
    await new Promise((resolve) => setTimeout(resolve, 1500));
    const second = await again();
    expect([second.status, await codeOf(second)]).toEqual([409, 'in-flight']);
    slow.end('1,3\n');
    expect(await ended).toBe(201);
  });
});
