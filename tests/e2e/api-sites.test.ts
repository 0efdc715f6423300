import { readFileSync } from 'node:fs';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { ask, CSV_TYPE, seedToken } from './support/api';
import { seedPerson, seedTeam, type SeededPerson } from './support/seed-people';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let token: string;
let foreign: string;

beforeAll(async () => {
  server = await startServer();
  const [lead, stranger] = [await seedPerson(server), await seedPerson(server)];
  const tokenOf = async (slug: string, person: SeededPerson) => {
    const team = await seedTeam(server, slug, [[person, 'lead']]);
    const actor = { personId: person.id, teamId: team.id, role: 'lead' as const };
    return seedToken(server, actor, { scopes: ['read', 'upload'] });
  };
  token = await tokenOf('own-team', lead);
  foreign = await tokenOf('lagoon', stranger);
});

afterAll(() => server?.stop());

const post = (query: string, body: string, headers: Record<string, string> = CSV_TYPE, by = token) =>
  ask(server, by, `/site-maps${query}`, { method: 'POST', body, headers });
const json = async (response: Response) => (await response.json()) as Record<string, unknown>;

it('a script finds the one pair of the invented shots, twice under one key and saved once', async () => {
  const body = readFileSync('fixtures/sites/one-pair.txt', 'utf8');
  const headers = { ...CSV_TYPE, 'idempotency-key': '"sites-1"' };
  const query = '?name=Chain%209&seek=rise&device=Marram&kinks=keep';
  const first = await post(query, body, headers);
  expect(first.status).toBe(201);
  const map = await json(first);
  expect(map.statement).toMatch(/^One pair of 2\u202f016 .* sites 21 and 22, correlation 0\.050/);
  const second = await post(query, body, headers);
  expect([second.status, second.headers.get('idempotency-replayed')]).toEqual([201, 'true']);
  expect(await json(second)).toEqual(map);
  const listed = await json(await ask(server, token, '/site-maps?device=Marram'));
  expect(listed).toEqual({ data: [map], next: null });
  const document = await json(await ask(server, token, `/site-maps/${map.id}/document.json`));
  expect(JSON.stringify(document.because)).toContain('The count histogram alone cannot show this pair.');
  const counts = await json(await ask(server, token, `/datasets/${map.countsDataset}`));
  expect(counts).toMatchObject({ name: 'Chain 9, excited sites' });

  for (const path of [`/site-maps/${map.id}`, `/site-maps/${map.id}/document.json`])
    expect((await ask(server, foreign, path)).status, path).toBe(404);
  expect(await json(await ask(server, foreign, '/site-maps'))).toEqual({ data: [], next: null });
});

it.each([
  ['', '01\n0x\n', CSV_TYPE, 422, 'unreadable'],
  ['', '', CSV_TYPE, 422, 'empty'],
  ['', '01\n'.repeat(1_500_000), CSV_TYPE, 413, 'too-large'],
  ['?geometry=square', '01\n10\n', CSV_TYPE, 422, 'bad-query'],
  ['?geometry=ring', '01\n10\n', CSV_TYPE, 422, 'unreadable'],
  ['?alpha=2', '01\n10\n', CSV_TYPE, 422, 'bad-query'],
  ['', '01\n10\n', { 'content-type': 'application/xml' }, 415, 'wrong-type']
])('%s %# is refused, and nothing is saved', async (query, body, headers, status, code) => {
  const before = await json(await ask(server, token, '/site-maps'));
  const refused = await post(query, body, headers);
  expect([refused.status, (await json(refused)).code]).toEqual([status, code]);
  expect(await json(await ask(server, token, '/site-maps'))).toEqual(before);
});

it('names line and column of what it cannot read', async () => {
  const { errors } = await json(await post('', '# a remark\n01\n0x\n'));
  expect(errors).toMatchObject([{ line: 3, column: 2 }]);
});
