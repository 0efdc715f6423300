import { dataset, sweep } from '$lib/server/db/schema';
import { putAside } from '$lib/server/services/datasets/put-aside';
import { listEvents } from '$lib/server/services/events/list-events';
import { importArchive } from '$lib/server/services/transfer/import-archive';
import { placesOfSwept } from '$lib/server/services/sweeps/places-of-swept';
import { moveWindow } from '$lib/server/services/sweeps/move-window';
import { putSweepAside } from '$lib/server/services/sweeps/put-sweep-aside';
import { readSweep } from '$lib/server/services/sweeps/read-sweep';
import { expect, it } from 'vitest';
import { archiveOf, makeTrueDataset, tampered, textsOf } from '../../../../support/archives';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { asked, saved, setting } from '../../../../support/sweeps';

/** Archive of a team with one sweep, and one put aside. */
async function exported() {
  const { db, lead } = setting();
  const ids = [1, 2, 3].map((time) =>
    makeTrueDataset(
      db,
      lead,
      {
        kind: 'histogram',
        counts: [
          [0, 40 * time],
          [1, 30],
          [2, 20],
          [3, 10]
        ],
        lump: null
      },
      { name: `ramp ${time}`, quenchTime: time, quenchUnit: 'µs' }
    )
  );
  const id = saved(db, lead, asked(ids, { name: 'Kept', notes: 'of May' }));
  putSweepAside(db, lead, saved(db, lead, asked(ids, { name: 'Aside' })));
  return { db, lead, id, archive: await archiveOf(db, lead) };
}

const fresh = () => {
  const db = freshDatabase();
  return { db, lead: makeMember(db, makeTeam(db).id, 'lead') };
};

it('a sweep goes through an archive to the byte, and out again the same', async () => {
  const { db: first, id, archive } = await exported();
  const before = textsOf(archive);
  expect(JSON.parse(before['manifest.json'])).toMatchObject({ leftOut: { sweeps: 1 } });
  expect(before['README.txt']).toContain('0 reports and 1 sweeps had been put aside');
  const { db, lead } = fresh();
  expect(importArchive(db, lead, archive)).toMatchObject({ ok: true, datasets: 3, sweeps: 1 });
  const [row] = db.select().from(sweep).all();
  const [old] = first.select().from(sweep).all();
  expect(row).toEqual({ ...old, id: row.id, teamId: lead.teamId, createdBy: null });
  expect(row.id).not.toBe(id);
  const after = textsOf(await archiveOf(db, lead));
  for (const path of ['sweeps.json', 'sweeps/00001.json']) expect(after[path], path).toBe(before[path]);
  expect(JSON.parse(after['team.json']).madeBy).toEqual(JSON.parse(before['team.json']).madeBy);
  const words = listEvents(db, lead, {}).events.map((one) => one.words);
  expect(words.join('\n')).toMatch(/imported the sweep “Kept”, first made by Ada Invented/);
  const read = readSweep(db, lead, row.id);
  if (!read.ok || !read.document) throw new Error('unreadable');
  const kept = { document: read.document, options: read.sweep.options };
  expect(moveWindow(db, lead, kept, { from: 1, to: 2 }).ok).toBe(true);
});

it('the datasets of a sweep from an archive are found where they are now, until they are put aside', async () => {
  const { db: first, lead: maker, id, archive } = await exported();
  const old = readSweep(first, maker, id);
  const { db, lead } = fresh();
  importArchive(db, lead, archive);
  const [{ id: newId }] = db.select().from(sweep).all();
  const read = readSweep(db, lead, newId);
  if (!read.ok || !old.ok) throw new Error('unreadable');
  const named = read.sweep.datasets;
  const places = () => named.map((one) => placesOfSwept(db, lead, named)[one.id]);
  const rows = db.select().from(dataset).all();
  expect(places()).toEqual(named.map(({ name }) => rows.find((row) => row.name === name)?.id));
  putAside(db, lead, places()[0]);
  expect(places()).toEqual([undefined, ...places().slice(1)]);
  const own = placesOfSwept(first, maker, old.sweep.datasets);
  expect(own).toEqual(Object.fromEntries(old.sweep.datasets.map((one) => [one.id, one.id])));
});

it('an archive without sweeps, as they were made before, is read', async () => {
  const { archive } = await exported();
  const older = tampered(archive, { 'sweeps.json': null, 'sweeps/00001.json': null });
  const { db, lead } = fresh();
  expect(importArchive(db, lead, older)).toMatchObject({ ok: true, datasets: 3, sweeps: 0 });
});

it('a sweep that is not what is told of it refuses the whole archive, and nothing is kept', async () => {
  const { archive } = await exported();
  const { 'sweeps/00001.json': document, 'sweeps.json': about } = textsOf(archive);
  const cases: [Record<string, string | null>, RegExp][] = [
    [{ 'sweeps/00001.json': document.replace('"ramp 1"', '"ramp 7"') }, /is not the document of that sum/],
    [{ 'sweeps/00001.json': null }, /sweeps\/00001.json is missing/],
    [{ 'sweeps/00001.json': '{"format":' }, /sweeps\/00001.json/],
    [
      { 'sweeps.json': about.replace(/"digest": "sha256:./, '"digest": "sha256:x') },
      /no dataset of that digest/
    ]
  ];
  for (const [changes, what] of cases) {
    const { db, lead } = fresh();
    const refused = importArchive(db, lead, tampered(archive, changes));
    expect(refused).toMatchObject({ ok: false, reason: 'bad-file', what: expect.stringMatching(what) });
    expect(db.select().from(sweep).all()).toEqual([]);
  }
});
