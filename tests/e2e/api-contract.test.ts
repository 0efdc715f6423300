import { openApi } from '$lib/model/api/open-api';
import { OPERATIONS } from '$lib/model/api/operations';
import { SCOPES } from '$lib/model/api/scopes';
import type { Actor } from '$lib/server/services/access/actor';
import Ajv2020 from 'ajv/dist/2020.js';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { HOOK_BODY, hookOf } from '../support/webhooks';
import { ask, CSV_TYPE, JSON_TYPE, seedToken } from './support/api';
import { seedGate } from './support/seed-gate';
import { seedPerson, seedTeam, withDatabaseOf } from './support/seed-people';
import { seedReports } from './support/seed-reports';
import { startServer, type RunningServer } from './support/start-server';

interface Sent {
  body: string;
  headers: Record<string, string>;
}

interface Described {
  responses: Record<string, { $ref?: string; content?: Record<string, { schema?: object }> }>;
}
type Document = {
  openapi: string;
  paths: Record<string, Record<string, Described>>;
  components: { schemas: Record<string, object> };
};

/** Moments are the one format in use; held to what the page promises, ISO 8601 in UTC. */
const MOMENT = /^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z$/;
const ajv = new Ajv2020({
  strict: true,
  allowUnionTypes: true,
  allErrors: true,
  formats: { 'date-time': MOMENT }
});

let server: RunningServer;
let token: string;
let ids: Record<string, string>;
let BODIES: Record<string, Sent[]>;
let actor: Actor;
let served: Document;
/** As served, but a field that is not described is refused. */
const closed = JSON.parse(JSON.stringify(openApi({ closed: true }))) as Document;

beforeAll(async () => {
  // Without a token sixty requests a minute are answered from one place: each operation is asked from its own.
  server = await startServer({ ADDRESS_HEADER: 'x-client' });
  const lead = await seedPerson(server);
  const team = await seedTeam(server, 'contract', [[lead, 'lead']]);
  actor = { personId: lead.id, teamId: team.id, role: 'lead' };
  token = await seedToken(server, actor, { scopes: [...SCOPES] });
  const seeded = await seedReports(server, { teamId: team.id, createdBy: lead.id, name: 'Invented' }, [
    {},
    {}
  ]);
  const post = (path: string, body: string, headers: Record<string, string>) =>
    ask(server, token, path, { method: 'POST', body, headers });
  const idOf = async (answer: Promise<Response>) => {
    const response = await answer;
    if (!response.ok) throw new Error(await response.text());
    return ((await response.json()) as { id: string }).id;
  };
  const swept: string[] = [];
  for (const [time, counts] of [
    [1, '0,40\n1,30\n2,20\n3,10\n'],
    [3, '0,60\n1,25\n2,10\n3,5\n']
  ] as const)
    swept.push(await idOf(post(`/datasets?quenchTime=${time}&quenchUnit=us`, counts, CSV_TYPE)));
  BODIES = bodiesFor(swept);
  ids = {
    dataset: seeded.datasetId,
    report: seeded.reports[0],
    job: await idOf(post(`/datasets/${seeded.datasetId}/jobs`, '{}', JSON_TYPE)),
    siteMap: await idOf(post('/site-maps', '011\n110\n', CSV_TYPE)),
    sweep: await idOf(post('/sweeps', BODIES.makeSweep[0].body, JSON_TYPE)),
    device: await seedGate(server, actor, seeded.datasetId),
    webhook: await withDatabaseOf(server, (db) => hookOf(db, actor))
  };
  served = (await (await fetch(`${server.address}/api/v1/openapi.json`)).json()) as Document;
});

afterAll(() => server?.stop());

/** What stands after the path where an operation asks for it. */
const QUERIES: Record<string, string> = {
  readGate: '?device=Kelp&version=ebb%203.1',
  readGateBadge: '?device=Kelp&version=ebb%203.1',
  readGateRule: '?device=Kelp',
  setGateRule: '?device=Kelp'
};

/** Requests of each operation that has a body: one of every type it takes. */
const bodiesFor = (swept: string[]): Record<string, Sent[]> => ({
  setGateRule: [{ body: '{"reference": "ebb 3.1", "tolerance": 0.2}', headers: JSON_TYPE }],
  uploadDataset: [
    { body: 'count,shots\n0,31\n1,50\n2,20\n', headers: CSV_TYPE },
    {
      body: JSON.stringify({
        name: 'J',
        counts: { 0: 9, 1: 4 },
        conditions: { trials: 4, misread: 0.01, misreadUncertainty: 0.002, kept: '0-3' }
      }),
      headers: JSON_TYPE
    }
  ],
  uploadSites: [{ body: 'a,b,c\n0,1,1\n1,1,0\n0,0,0\n', headers: CSV_TYPE }],
  askForDiagnosis: [{ body: JSON.stringify({ resamples: 19, seed: 3 }), headers: JSON_TYPE }],
  makeSweep: [{ body: JSON.stringify({ datasets: swept, axis: 'quench-time' }), headers: JSON_TYPE }],
  makeWebhook: [{ body: HOOK_BODY, headers: JSON_TYPE }]
});

function check(
  document: Document,
  path: string,
  method: string,
  status: number,
  type: string,
  body: unknown
) {
  const schema = document.paths[path][method].responses[status]?.content?.[type]?.schema;
  if (!schema) throw new Error(`${status} with ${type} is not described`);
  const validate = ajv.compile(schema);
  expect(validate(body) ? [] : validate.errors, `${method} ${path}`).toEqual([]);
}

describe('the served description', () => {
  it('is of OpenAPI 3.1 and its schemas are of draft 2020-12', () => {
    expect(served.openapi).toMatch(/^3\.1\.\d$/);
    expect(served).toEqual(JSON.parse(JSON.stringify(openApi())));
    const problem = served.components.schemas.Problem;
    expect(ajv.validateSchema(problem)).toBe(true);
    for (const item of Object.values(served.paths))
      for (const { responses } of Object.values(item))
        for (const { content = {} } of Object.values(responses))
          for (const { schema } of Object.values(content))
            if (schema && !('$ref' in schema)) expect(ajv.validateSchema(schema)).toBe(true);
  });

  it('would notice an answer that breaks it', () => {
    const schema = closed.paths['/team'].get.responses[200].content?.['application/json'].schema;
    const good = { name: 'x', role: 'lead', scopes: [], expiresAt: '2026-03-14T15:09:26.000Z' };
    const valid = ajv.compile(schema ?? {});
    expect(valid({ slug: 'a', name: 'b', token: good })).toBe(true);
    expect(valid({ slug: 'a', name: 'b', token: { ...good, expiresAt: 'tomorrow' } })).toBe(false);
    expect(valid({ slug: 'a', name: 'b', token: good, secret: 1 })).toBe(false);
    expect(valid({ slug: 'a', token: good })).toBe(false);
  });
});

describe('every operation', () => {
  it('has a case here: an id where its address takes one, and a body of every type it takes', () => {
    const without = OPERATIONS.flatMap(({ id, idOf, path, bodies = [] }) => {
      const sent = (BODIES[id] ?? []).map(({ headers }) => headers['content-type']);
      return [
        ...(path.includes('{id}') !== (idOf !== undefined) ? [`${id}: whose id is in its address?`] : []),
        ...(idOf && !ids[idOf] ? [`${id}: no ${idOf}`] : []),
        ...bodies.flatMap(({ type }) => (sent.includes(type) ? [] : [`${id}: no body of ${type}`]))
      ];
    });
    expect(without).toEqual([]);
    const taking = OPERATIONS.flatMap(({ id, bodies }) => (bodies ? [id] : []));
    expect(Object.keys(BODIES).sort()).toEqual(taking.sort());
  });

  it.each(OPERATIONS)('$method $path answers as described', async (operation) => {
    const { id, method, path, answer, idOf } = operation;
    const address = path.replace('{id}', idOf ? ids[idOf] : '') + (QUERIES[id] ?? '');
    for (const sent of BODIES[id] ?? [undefined]) {
      const response = await ask(server, token, address, { method: method.toUpperCase(), ...sent });
      expect(response.status, await response.clone().text()).toBe(answer.status);
      const type = response.headers.get('content-type')?.split(';')[0] ?? '';
      expect(type).toBe(answer.content.type);
      expect(response.headers.get('ratelimit')).toMatch(/^"token";r=\d+;t=\d+$/);
      if (answer.location) {
        const there = await ask(server, token, response.headers.get('location')!.replace('/api/v1', ''));
        expect(there.status).toBe(200);
      }
      if (!answer.content.schema) {
        const bytes = new Uint8Array(await response.arrayBuffer());
        expect(bytes.length).toBeGreaterThan(10);
        if (type === 'application/pdf') expect(String.fromCharCode(...bytes.slice(0, 5))).toBe('%PDF-');
        continue;
      }
      const body: unknown = await response.json();
      for (const document of [served, closed]) check(document, path, method, answer.status, type, body);
    }
  });

  it.each(OPERATIONS)('$method $path refuses in problem details', async ({ id, method, path }) => {
    const problem = ajv.compile(closed.components.schemas.Problem);
    const headers = { 'x-client': `10.0.0.${OPERATIONS.findIndex((one) => one.id === id)}` };
    const asked = { method: method.toUpperCase(), headers };
    const response = await ask(server, null, path.replace('{id}', 'x'), asked);
    expect(response.status).toBe(401);
    expect(response.headers.get('content-type')).toBe('application/problem+json');
    expect(problem(await response.json()) ? [] : problem.errors).toEqual([]);
  });

  it.each(OPERATIONS)(
    '$method $path is closed to every other scope, and to who may not',
    async (operation) => {
      const { id, method, path, scope, idOf } = operation;
      const address = path.replace('{id}', idOf ? ids[idOf] : '');
      const request = { method: method.toUpperCase(), ...BODIES[id]?.[0] };
      const others = SCOPES.filter((one) => one !== scope);
      const token = await seedToken(server, actor, { name: id, scopes: others });
      const refused = await ask(server, token, address, request);
      expect([refused.status, ((await refused.json()) as { code: string }).code]).toEqual([
        403,
        'wrong-scope'
      ]);
      expect(refused.headers.get('www-authenticate')).toContain(`scope="${scope}"`);
      if (scope === 'read') return;
      const observes = await seedToken(server, actor, { name: id, role: 'observer', scopes: [...SCOPES] });
      const second = await ask(server, observes, address, request);
      expect([second.status, ((await second.json()) as { code: string }).code]).toEqual([403, 'not-allowed']);
    }
  );
});
