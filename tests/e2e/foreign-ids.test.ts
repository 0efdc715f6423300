import { newId } from '$lib/server/db/new-id';
import {
  device,
  firmwareVersion,
  job,
  link,
  originalFile,
  remark,
  siteMap,
  sweep,
  webhook
} from '$lib/server/db/schema';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makeDataset, makeReport } from '../support/saved-reports';
import { doorsOfTeams, type Door } from './support/doors';
import { seedPerson, seedTeam, withDatabaseOf } from './support/seed-people';
import { sessionOf } from './support/session-of';
import { startServer, type RunningServer } from './support/start-server';

const SECRET = 'Secret lagoon chain';
const doors = doorsOfTeams();

let server: RunningServer;
let cookie: string;
/** Ids of the other team's things, by the name of the parameter and its place. */
let foreign: {
  dataset: string;
  second: string;
  report: string;
  job: string;
  link: string;
  sweepLink: string;
  thread: string;
  device: string;
  version: string;
  sweep: string;
  webhook: string;
  map: string;
};

beforeAll(async () => {
  server = await startServer();
  const [insider, stranger] = [await seedPerson(server), await seedPerson(server)];
  const team = await seedTeam(server, 'lagoon', [[insider, 'lead']]);
  await seedTeam(server, 'own-team', [[stranger, 'lead']]);
  foreign = await withDatabaseOf(server, async (db) => {
    const made = { teamId: team.id, createdBy: insider.id };
    const dataset = makeDataset(db, team.id, insider.id, { name: SECRET });
    const first = await makeReport(db, { ...made, datasetId: dataset });
    const second = await makeReport(db, { ...made, datasetId: dataset }, { seed: 2 });
    const ids = {
      dataset,
      report: first.id,
      second: second.id,
      job: newId(),
      link: newId(),
      sweepLink: newId(),
      thread: newId(),
      device: newId(),
      version: newId(),
      sweep: newId(),
      webhook: newId(),
      map: newId()
    };
    const plain = { ...made, createdAt: 1 };
    db.insert(job)
      .values({ ...plain, id: ids.job, datasetId: dataset, options: '{}', status: 'failed' })
      .run();
    const named = { name: SECRET, createdBy: insider.id, createdAt: 1, updatedAt: 1 };
    db.insert(device)
      .values({ ...named, id: ids.device, teamId: team.id, notes: SECRET })
      .run();
    db.insert(firmwareVersion)
      .values({ ...named, id: ids.version, deviceId: ids.device, place: 1 })
      .run();
    db.insert(sweep)
      .values({
        ...plain,
        id: ids.sweep,
        name: SECRET,
        document: '{}',
        sha256: 'none',
        options: '{}',
        engineVersion: '0',
        datasets: '[]'
      })
      .run();
    const hook = { name: SECRET, url: 'https://example.org/', sealedSecret: '', actions: '["gate.fail"]' };
    db.insert(webhook)
      .values({ ...plain, ...hook, id: ids.webhook, lastEvent: 0 })
      .run();
    const { id: fileId } = db.select().from(originalFile).get()!;
    db.insert(siteMap)
      .values({
        ...plain,
        id: ids.map,
        name: SECRET,
        fileId,
        geometry: 'chain',
        sites: 2,
        shots: 2,
        alpha: 0.05,
        document: '{}',
        sha256: 'none',
        engineVersion: '0'
      })
      .run();
    db.insert(remark)
      .values({
        id: ids.thread,
        reportId: first.id,
        section: 'answer',
        body: SECRET,
        signedAs: 'x',
        createdAt: 1
      })
      .run();
    const says = { label: SECRET, audience: 'anyone', shows: 'report', tokenHash: 'none' } as const;
    const hides = { blind: false, hidesReferees: false, allowsRemarks: true };
    db.insert(link)
      .values({ ...plain, ...says, ...hides, id: ids.link, reportId: first.id })
      .run();
    db.insert(link)
      .values({ ...plain, ...says, ...hides, tokenHash: 'other', id: ids.sweepLink, sweepId: ids.sweep })
      .run();
    return ids;
  });
  cookie = await sessionOf(server.address, stranger.email, stranger.password);
});

afterAll(() => server?.stop());

/** The address of a door with the other team's ids in it. */
function addressOf({ route, action }: Door, team: string): string {
  const path = route
    .replace('[team=slug]', team)
    .replace('datasets/[id]', `datasets/${foreign.dataset}`)
    .replace('reports/[id]', `reports/${foreign.report}`)
    .replace('devices/[id]', `devices/${foreign.device}`)
    .replace('[version]', foreign.version)
    .replace('sweeps/[id]/links/[link]', `sweeps/${foreign.sweep}/links/${foreign.sweepLink}`)
    .replace('sweeps/[id]', `sweeps/${foreign.sweep}`)
    .replace('webhooks/[id]', `webhooks/${foreign.webhook}`)
    .replace('sites/[id]', `sites/${foreign.map}`)
    .replace('jobs/[id]', `jobs/${foreign.job}`)
    .replace('[link]', foreign.link)
    .replace('[thread]', foreign.thread);
  expect(path, 'a parameter this test knows no id for').not.toContain('[');
  return `${server.address}${path}${action && action !== 'default' ? `?/${action}` : ''}`;
}

/** Asks as somebody who leads another team. Pages and scripts are answered by different code: both are tried. */
async function knock(address: string, method: string, body: BodyInit | null, type?: string) {
  const headers: Record<string, string> = { cookie, origin: server.address, accept: type ?? 'text/html' };
  if (body !== null && type) headers['content-type'] = type;
  const init = { method, headers, body: method === 'GET' ? null : body, redirect: 'manual' } as const;
  const response = await fetch(address, init);
  return { status: response.status, text: await response.text() };
}

/** Kit itself refuses JSON to a form action, before any code of ours: those get a form alone. */
const bodies = ({ action }: Door) => [
  ...(action === null ? [{ type: 'application/json', body: '{}' }] : []),
  { type: undefined, body: new URLSearchParams({ id: foreign.dataset, dataset: foreign.dataset }) }
];

describe("another team's ids", () => {
  it('are tried on every door', () => expect(doors.length).toBeGreaterThan(30));

  it.each(doors)('$method $route $action is not there for a stranger', async (door) => {
    for (const { type, body } of bodies(door)) {
      const { status, text } = await knock(addressOf(door, 'lagoon'), door.method, body, type);
      expect(status).toBe(404);
      expect(text).not.toContain(SECRET);
    }
  });

  it.each(doors.filter(({ route }) => /\[(id|link|thread|version)\]/.test(route)))(
    '$method $route $action knows them in no other team',
    async (door) => {
      for (const { type, body } of bodies(door)) {
        const { status, text } = await knock(addressOf(door, 'own-team'), door.method, body, type);
        // What is asked for may be malformed as well; but never 403, which would say that it is there.
        expect([404, ...(door.method === 'GET' ? [] : [400, 415, 422])]).toContain(status);
        expect(text).not.toContain(SECRET);
      }
    }
  );

  it('are unknown in the bodies of requests', async () => {
    const own = `${server.address}/team/own-team`;
    const asked: [path: string, body: object][] = [
      ['jobs', { dataset: [foreign.dataset] }],
      ['datasets/bulk', { datasets: [foreign.dataset], set: { notes: 'mine' } }]
    ];
    for (const [path, body] of asked) {
      const answer = await knock(`${own}/${path}`, 'POST', JSON.stringify(body), 'application/json');
      expect(answer.status, path).toBe(404);
      expect(answer.text).not.toContain(SECRET);
    }
    const compared = await knock(
      `${own}/reports/compare?a=${foreign.report}&b=${foreign.second}`,
      'GET',
      null
    );
    expect(compared.status).toBe(404);
    const maps = await knock(`${own}/sites/compare?a=${foreign.map}&b=${foreign.map}`, 'GET', null);
    expect(maps.status).toBe(404);
    const statuses = await knock(
      `${own}/jobs/statuses?job=${foreign.job}&dataset=${foreign.dataset}`,
      'GET',
      null
    );
    expect(statuses.text).not.toContain(foreign.job);
  });
});
