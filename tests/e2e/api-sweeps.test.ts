import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { drawn, landauZenerPmf, quenchTimes } from '../unit/stats/sweep/simulated';
import { ask, CSV_TYPE, JSON_TYPE, seedToken } from './support/api';
import { seedPerson, seedTeam, type SeededPerson } from './support/seed-people';
import { startServer, type RunningServer } from './support/start-server';

const times = quenchTimes(9);
let server: RunningServer;
let token: string;
let foreign: string;
let ids: string[];

type Json = Record<string, unknown>;
const json = async (response: Response) => (await response.json()) as Json;
const post = (path: string, body: string, headers: Record<string, string> = JSON_TYPE, by = token) =>
  ask(server, by, path, { method: 'POST', body, headers });
const sweepOf = (datasets: string[], more: object = {}) =>
  JSON.stringify({ datasets, axis: 'quench-time', ...more });

/** The id of counts uploaded as a script would. */
async function uploaded(rows: [number, number][], query: string, by = token): Promise<string> {
  const body = `count,shots\n${rows.map((row) => row.join(',')).join('\n')}\n`;
  const saved = await post(`/datasets?${query}`, body, CSV_TYPE, by);
  if (!saved.ok) throw new Error(await saved.text());
  return (await json(saved)).id as string;
}

beforeAll(async () => {
  server = await startServer();
  const tokenOf = async (slug: string, person: SeededPerson) => {
    const team = await seedTeam(server, slug, [[person, 'lead']]);
    const actor = { personId: person.id, teamId: team.id, role: 'lead' as const };
    return seedToken(server, actor, { scopes: ['read', 'upload', 'diagnose'] });
  };
  token = await tokenOf('own-team', await seedPerson(server));
  foreign = await tokenOf('lagoon', await seedPerson(server));
  ids = [];
  for (const [i, pairs] of drawn(times.map(landauZenerPmf), 5000, 1).entries())
    ids.push(await uploaded(pairs, `name=quench%20${i + 1}&quenchTime=${times[i]}&quenchUnit=us`));
});

afterAll(() => server?.stop());

describe('a script', () => {
  it('makes one sweep of what it uploaded, twice under one key, and takes its document and points', async () => {
    const body = sweepOf(ids, {
      name: 'Two decades',
      transition: { dimension: 1, correlation: 1, dynamic: 1 }
    });
    const headers = { ...JSON_TYPE, 'idempotency-key': '"sweep-1"' };
    const [first, second] = [await post('/sweeps', body, headers), await post('/sweeps', body, headers)];
    expect([first.status, second.status]).toEqual([201, 201]);
    expect(second.headers.get('idempotency-replayed')).toBe('true');
    const made = await json(first);
    expect(await json(second)).toEqual(made);
    expect(made).toMatchObject({ name: 'Two decades', datasets: 9, timeUnit: 'µs', unit: 'defect' });
    const listed = await json(await ask(server, token, '/sweeps'));
    expect(listed).toMatchObject({ data: [{ id: made.id, statement: made.statement }], next: null });
    const document = await ask(server, token, `/sweeps/${made.id}/document.json`);
    // Dziarmaga 2005: the exponent of the transverse-field Ising chain, dν/(1 + zν), is ½.
    expect(await json(document)).toMatchObject({ expected: { exponent: 0.5, inside: true } });
    const points = await (await ask(server, token, `/sweeps/${made.id}/points.csv`)).text();
    expect(points.trim().split('\r\n')).toHaveLength(10);
    for (const path of ['', '/document.json', '/points.csv'])
      expect((await ask(server, foreign, `/sweeps/${made.id}${path}`)).status, path).toBe(404);
    expect(await json(await ask(server, foreign, '/sweeps'))).toEqual({ data: [], next: null });
  });

  it('pages through sweeps, each once, and asks for one axis', async () => {
    for (const name of ['A', 'B']) await post('/sweeps', sweepOf(ids.slice(0, 4), { name }));
    const seen: unknown[] = [];
    let path: string | null = '/sweeps?limit=1';
    while (path) {
      const response: Response = await ask(server, token, path);
      seen.push(...((await json(response)).data as { name: string }[]).map(({ name }) => name));
      path = /^<\/api\/v1([^>]+)>; rel="next"$/.exec(response.headers.get('link') ?? '')?.[1] ?? null;
    }
    expect(seen).toEqual(['B', 'A', 'Two decades']);
    expect(await json(await ask(server, token, '/sweeps?axis=hold-time'))).toEqual({ data: [], next: null });
    expect((await ask(server, token, '/sweeps?after=nonsense')).status).toBe(422);
    expect((await ask(server, token, '/sweeps?axis=depth')).status).toBe(422);
  });
});

describe('what makes no sweep is refused, and nothing is saved:', () => {
  const counts: [number, number][] = [
    [0, 30],
    [1, 50],
    [2, 15],
    [3, 5]
  ];
  let largest = 10;
  const howMany = async () =>
    ((await json(await ask(server, token, '/sweeps?limit=200'))).data as Json[]).length;

  it.each([
    ['a quench time of zero', 'name=zero&quenchTime=0&quenchUnit=us', /“zero” has a time of 0: .* above 0/],
    ['no quench time', 'name=none', /“none” states no quench time/],
    ['a unit nobody knows', 'name=odd&quenchTime=2&quenchUnit=turns', /Units are mixed: .*“turns”/],
    [
      'the same time twice',
      `name=same&quenchTime=${times[0]}&quenchUnit=us`,
      /the same time: nothing was swept/
    ]
  ])('%s', async (_, query, why) => {
    const before = await howMany();
    // Counts of their own for each, since the same bytes are not saved twice.
    const other = await uploaded([...counts, [++largest, 1]], query);
    const refused = await post('/sweeps', sweepOf([ids[0], other]));
    expect(refused.status).toBe(422);
    expect(refused.headers.get('content-type')).toBe('application/problem+json');
    expect(await json(refused)).toMatchObject({ code: 'no-sweep', detail: expect.stringMatching(why) });
    expect(await howMany()).toBe(before);
  });

  it('one dataset, none, another team’s, fields that do not fit, a body cut short', async () => {
    const theirs = await uploaded(counts, 'quenchTime=3&quenchUnit=us', foreign);
    const before = await howMany();
    const cases: [body: string, status: number, code: string, headers?: Record<string, string>][] = [
      [sweepOf([ids[0]]), 422, 'no-sweep'],
      [sweepOf([ids[0], ids[0]]), 422, 'no-sweep'],
      [sweepOf([]), 422, 'bad-input'],
      [sweepOf([ids[0], theirs]), 404, 'unknown-dataset'],
      [sweepOf([ids[0], 'nonsense']), 404, 'unknown-dataset'],
      [sweepOf(ids, { axis: 'depth' }), 422, 'bad-input'],
      [sweepOf(ids, { alpah: 0.01 }), 422, 'bad-input'],
      [sweepOf(ids, { window: { from: 0, to: 3 } }), 422, 'bad-input'],
      [sweepOf(ids, { window: { from: 400, to: 500 } }), 422, 'no-sweep'],
      [sweepOf(ids).slice(0, -7), 400, 'bad-json'],
      ['', 400, 'bad-json'],
      ['[]', 422, 'bad-input'],
      ['a,b\n', 415, 'wrong-type', CSV_TYPE]
    ];
    for (const [body, status, code, headers] of cases) {
      const refused = await post('/sweeps', body, headers);
      expect([refused.status, (await json(refused)).code], body).toEqual([status, code]);
    }
    expect(await howMany()).toBe(before);
  });
});
