import { dataset, event, originalFile } from '$lib/server/db/schema';
import { createHash } from 'node:crypto';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { afterEach, expect, it } from 'vitest';
import { longTable } from './support/long-table';
import { seedPerson, seedTeam, withDatabaseOf } from './support/seed-people';
import { sessionOf } from './support/session-of';
import { startServer, type RunningServer } from './support/start-server';

const ROUNDS = 6;
let server: RunningServer | null = null;
const data = mkdtempSync(join(tmpdir(), 'severalty-upload-'));

afterEach(async () => {
  await server?.kill();
  rmSync(data, { recursive: true, force: true });
});

interface Preview {
  file: { id: string };
  datasets: { index: number; conditions: { name: string } }[];
}

/** Uploads a long table under a round's own name and saves its twelve datasets, telling when each step is sent. */
async function upload(address: string, cookie: string, round: number, step: (name: string) => void) {
  const root = `${address}/team/killed/datasets`;
  const headers = { cookie, origin: address };
  const form = new FormData();
  // A long remark makes the body large enough to be cut in the middle.
  form.set(
    'file',
    new File([`# round ${round} ${'x'.repeat(4_000_000)}\n${longTable()}`], `round-${round}.csv`)
  );
  step('preview');
  const previewed = await fetch(`${root}/preview`, { method: 'POST', headers, body: form });
  const { file, datasets } = (await previewed.json()) as Preview;
  const named = datasets.map(({ index, conditions }) => ({
    index,
    conditions: { ...conditions, name: `${round}: ${conditions.name}` }
  }));
  step('save');
  const body = JSON.stringify({ files: [{ fileId: file.id, again: true, datasets: named }] });
  await fetch(`${root}/save`, {
    method: 'POST',
    headers: { ...headers, 'content-type': 'application/json' },
    body
  });
  step('saved');
}

it('a server killed during uploads keeps every dataset whole or not at all', async () => {
  server = await startServer({ SEVERALTY_DATA: data });
  const person = await seedPerson(server);
  await seedTeam(server, 'killed', [[person, 'experimenter']]);
  for (let round = 0; round < ROUNDS; round++) {
    const { address } = server;
    const cookie = await sessionOf(address, person.email, person.password);
    const steps: string[] = [];
    const going = upload(address, cookie, round, (name) => steps.push(name)).catch(() => 'cut off');
    // Rounds 0 to 2 are cut at growing delays after the file was sent, the others after the saving was asked for.
    for (const wanted = round < 3 ? 'preview' : 'save'; !steps.includes(wanted);) await sleep(1);
    await sleep([2, 15, 40, 0, 4, 12][round]);
    await server.kill();
    await going;
    server = await startServer({ SEVERALTY_DATA: data });
    await expectWhole(server, round);
  }
  // And it still works.
  const cookie = await sessionOf(server.address, person.email, person.password);
  await upload(server.address, cookie, ROUNDS, () => undefined);
  const saved = await withDatabaseOf(server, (db) => db.select({ name: dataset.name }).from(dataset).all());
  expect(saved.filter(({ name }) => name.startsWith(`${ROUNDS}: `))).toHaveLength(12);
}, 120_000);

/** All twelve datasets of a round or none, files with the bytes of their sha256, and a sound database. */
async function expectWhole(running: RunningServer, round: number): Promise<void> {
  await withDatabaseOf(running, (db) => {
    const rows = db
      .select({ id: dataset.id, name: dataset.name, fileId: dataset.fileId })
      .from(dataset)
      .all();
    for (let earlier = 0; earlier <= round; earlier++) {
      expect([0, 12]).toContain(rows.filter(({ name }) => name.startsWith(`${earlier}: `)).length);
    }
    for (const { bytes, sha256, size } of db.select().from(originalFile).all()) {
      expect(createHash('sha256').update(bytes).digest('hex')).toBe(sha256);
      expect(bytes.length).toBe(size);
    }
    const told = db.select({ thing: event.thing, action: event.action }).from(event).all();
    const uploads = told.filter(({ action }) => action === 'dataset.upload').map(({ thing }) => thing);
    expect(uploads.sort()).toEqual(rows.map(({ id }) => id).sort());
    expect(db.$client.pragma('integrity_check', { simple: true })).toBe('ok');
    expect(db.$client.pragma('foreign_key_check')).toEqual([]);
  });
}
