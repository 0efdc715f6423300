import { dataset, device, event, gateResult, job, report } from '$lib/server/db/schema';
import { execFile } from 'node:child_process';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ask, JSON_TYPE, seedToken } from './support/api';
import { seedPerson, seedTeam, withDatabaseOf } from './support/seed-people';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let token: string;
let reads: string;
let another: string;
let foreign: string;

beforeAll(async () => {
  server = await startServer();
  const [lead, stranger] = [await seedPerson(server), await seedPerson(server)];
  const team = await seedTeam(server, 'shingle', [[lead, 'lead']]);
  const other = await seedTeam(server, 'elsewhere', [[stranger, 'lead']]);
  const actor = { personId: lead.id, teamId: team.id, role: 'lead' as const };
  token = await seedToken(server, actor, { scopes: ['read', 'upload', 'diagnose', 'edit'] });
  another = await seedToken(server, actor, {
    name: 'another',
    scopes: ['read', 'upload', 'diagnose', 'edit']
  });
  reads = await seedToken(server, actor, { name: 'reads', scopes: ['read', 'upload', 'diagnose'] });
  const their = { personId: stranger.id, teamId: other.id, role: 'lead' as const };
  foreign = await seedToken(server, their, { scopes: ['read', 'edit'] });
});

afterAll(() => server?.stop());

/** The script of fixtures/firmware, as a shell runs it. */
const script = (by = token) =>
  new Promise<{ code: number; said: string; errors: string }>((resolve) => {
    const env = { ...process.env, SEVERALTY: server.address, SEVERALTY_TOKEN: by };
    execFile('sh', ['fixtures/firmware/gate.sh'], { env }, (error, said, errors) =>
      resolve({ code: typeof error?.code === 'number' ? error.code : 0, said, errors })
    );
  });

const counted = () =>
  withDatabaseOf(server, (db) =>
    [dataset, device, job, report, gateResult, event].map((table) => db.select().from(table).all().length)
  );
const SAID = 'ebb-3.1 passed\nebb-3.2 passed\nebb-3.3 failed\nebb-3.4 passed\n';
const codeOf = async (response: Response) => [
  response.status,
  ((await response.json()) as { code: string }).code
];

describe('from histograms to a gate with curl alone', () => {
  it('fails the version with added crosstalk and passes the others; run twice, nothing doubles', async () => {
    const first = await script();
    expect([first.errors, first.said, first.code]).toEqual(['', SAID, 1]);
    const after = await counted();
    expect(after.slice(0, 5)).toEqual([32, 1, 32, 32, 4]);
    const second = await script();
    expect([second.errors, second.said, second.code]).toEqual(['', SAID, 1]);
    expect(await counted(), 'as after the first run, events too').toEqual(after);
    // Keys are those of a token: by another one the same counts are refused as there already, and taken.
    const other = await script(another);
    expect([other.errors, other.said, other.code]).toEqual(['', SAID, 1]);
    expect(await counted(), 'nor by another token').toEqual(after);
    const answer = await ask(server, token, '/gate?device=Shingle&version=ebb-3.3');
    const { document } = (await answer.json()) as {
      document: { groups: { group: string; outcome: string }[] };
    };
    const failed = document.groups.filter(({ outcome }) => outcome === 'failed').map(({ group }) => group);
    expect(failed).toEqual(['q2', 'q5']);
  }, 240_000);

  it('is refused in words where something is wrong, and changes nothing', async () => {
    const put = (body: string, by = token, of = 'Shingle') =>
      ask(server, by, `/gate/rule?device=${of}`, { method: 'PUT', body, headers: JSON_TYPE });
    const rule = '{"reference": "ebb-3.2"}';
    expect(await codeOf(await put(rule, reads))).toEqual([403, 'wrong-scope']);
    expect(await codeOf(await put(rule, foreign))).toEqual([404, 'no-device']);
    expect(await codeOf(await put(rule, token, 'Sand'))).toEqual([404, 'no-device']);
    expect(await codeOf(await put('{"reference": "ebb-9"}'))).toEqual([422, 'no-version']);
    const nowhere = await put('{"reference": "ebb-3.2", "groups": ["q1", "q99"]}');
    expect(await codeOf(nowhere)).toEqual([422, 'no-group']);
    expect(await codeOf(await put('{"reference": "ebb-3.2", "alpha": 0.9}'))).toEqual([422, 'bad-input']);
    expect(await codeOf(await put('{"reference": "ebb-'))).toEqual([400, 'bad-json']);
    for (const path of ['/gate/rule?device=Shingle', '/gate?device=Shingle&version=ebb-3.1'])
      expect(await codeOf(await ask(server, foreign, path))).toEqual([404, 'no-device']);
    const stands = await (await ask(server, token, '/gate/rule?device=Shingle')).json();
    expect(stands).toEqual({ reference: 'ebb-3.1', tolerance: 0.1, alpha: 0.05, groups: null });
  });
});
