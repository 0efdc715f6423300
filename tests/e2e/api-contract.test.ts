import { openApi } from '$lib/model/api/open-api';
import { OPERATIONS } from '$lib/model/api/operations';
import Ajv2020 from 'ajv/dist/2020.js';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ask, CSV_TYPE, JSON_TYPE, seedToken } from './support/api';
import { seedPerson, seedTeam } from './support/seed-people';
import { seedReports } from './support/seed-reports';
import { startServer, type RunningServer } from './support/start-server';

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
let ids: { dataset: string; report: string; job: string; siteMap: string };
let served: Document;
/** As served, but a field that is not described is refused. */
const closed = JSON.parse(JSON.stringify(openApi({ closed: true }))) as Document;

beforeAll(async () => {
  server = await startServer();
  const lead = await seedPerson(server);
  const team = await seedTeam(server, 'contract', [[lead, 'lead']]);
  const actor = { personId: lead.id, teamId: team.id, role: 'lead' as const };
  token = await seedToken(server, actor, { scopes: ['read', 'upload', 'diagnose'] });
  const seeded = await seedReports(server, { teamId: team.id, createdBy: lead.id, name: 'Invented' }, [
    {},
    {}
  ]);
  const asked = await ask(server, token, `/datasets/${seeded.datasetId}/jobs`, { method: 'POST' });
  const mapped = await ask(server, token, '/site-maps', {
    method: 'POST',
    body: '011\n110\n',
    headers: CSV_TYPE
  });
  ids = {
    dataset: seeded.datasetId,
    report: seeded.reports[0],
    job: ((await asked.json()) as { id: string }).id,
    siteMap: ((await mapped.json()) as { id: string }).id
  };
  served = (await (await fetch(`${server.address}/api/v1/openapi.json`)).json()) as Document;
});

afterAll(() => server?.stop());

/** A request of each operation that has a body. */
const BODIES: Record<string, { body: string; headers: Record<string, string> }[]> = {
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
  askForDiagnosis: [{ body: JSON.stringify({ resamples: 19, seed: 3 }), headers: JSON_TYPE }]
};

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
  it.each(OPERATIONS)('$method $path answers as described', async (operation) => {
    const { id, method, path, answer, idOf } = operation;
    const address = path.replace('{id}', idOf ? ids[idOf as keyof typeof ids] : '');
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

  it.each(OPERATIONS)('$method $path refuses in problem details', async ({ method, path }) => {
    const problem = ajv.compile(closed.components.schemas.Problem);
    const response = await ask(server, null, path.replace('{id}', 'x'), { method: method.toUpperCase() });
    expect(response.status).toBe(401);
    expect(response.headers.get('content-type')).toBe('application/problem+json');
    expect(problem(await response.json()) ? [] : problem.errors).toEqual([]);
  });
});
