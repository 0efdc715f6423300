import { eq } from 'drizzle-orm';
import { dataset, event, membership } from '$lib/server/db/schema';
import { putAside } from '$lib/server/services/datasets/put-aside';
import { saveDatasets } from '$lib/server/services/datasets/save-datasets';
import { digest } from '$lib/stats/input/digest';
import { describe, expect, it } from 'vitest';
import { LONG_TABLE, setting, store, wholeFile } from './support';

describe('saveDatasets', () => {
  it('saves all datasets of a file with counts, digest, mean and an event each', () => {
    const { db, experimenter } = setting();
    const file = store(db, experimenter, LONG_TABLE);
    const saved = saveDatasets(db, experimenter, wholeFile(db, experimenter, file), 42);
    if (!saved.ok) throw new Error(saved.reason);
    const rows = db.select().from(dataset).all();
    expect(rows).toHaveLength(4);
    expect(new Set(rows.map(({ fileId }) => fileId))).toEqual(new Set([file]));
    const [first] = rows;
    expect(JSON.parse(first.counts)).toEqual({
      kind: 'histogram',
      counts: [
        [0, 90],
        [1, 60],
        [2, 30]
      ],
      lump: null
    });
    expect(first.digest).toBe(
      digest({
        kind: 'histogram',
        counts: [
          [0, 90],
          [1, 60],
          [2, 30]
        ],
        lump: null
      })
    );
    // (60 + 2 · 30) / 180.
    expect(first).toMatchObject({ shots: 180, largest: 2, createdAt: 42, createdBy: experimenter.personId });
    expect(first.mean).toBeCloseTo(2 / 3, 15);
    const events = db.select().from(event).where(eq(event.action, 'dataset.upload')).all();
    expect(events.map(({ thing }) => thing)).toEqual(saved.saved.map(({ id }) => id));
    expect(JSON.stringify(events)).not.toContain('"counts"');
    db.$client.close();
  });

  it('offers the datasets that are there for the same bytes, also to a double submit', () => {
    const { db, lead } = setting();
    const request = wholeFile(db, lead, store(db, lead, LONG_TABLE));
    const first = saveDatasets(db, lead, request);
    if (!first.ok) throw new Error(first.reason);
    expect(saveDatasets(db, lead, request)).toEqual({
      ok: false,
      reason: 'already-there',
      already: first.saved
    });
    expect(db.select().from(dataset).all()).toHaveLength(4);
    // Put aside, they no longer stand in the way.
    for (const { id } of first.saved) putAside(db, lead, id);
    expect(saveDatasets(db, lead, request).ok).toBe(true);
    db.$client.close();
  });

  it('saves again when asked, under names of their own', () => {
    const { db, lead } = setting();
    const file = store(db, lead, '0,5\n1,2\n');
    saveDatasets(db, lead, wholeFile(db, lead, file));
    const again = wholeFile(db, lead, file, true);
    const refused = saveDatasets(db, lead, again);
    expect(refused).toMatchObject({
      ok: false,
      reason: 'bad-conditions',
      troubles: [{ fileId: file, index: 0 }]
    });
    again.files[0].datasets[0].conditions.name = 'another name';
    expect(saveDatasets(db, lead, again)).toMatchObject({ ok: true, saved: [{ name: 'another name' }] });
    db.$client.close();
  });

  it('saves none when one does not fit', () => {
    const { db, lead } = setting();
    const request = wholeFile(db, lead, store(db, lead, LONG_TABLE));
    request.files[0].datasets[2].conditions.trials = 1;
    const refused = saveDatasets(db, lead, request);
    expect(refused).toMatchObject({ ok: false, reason: 'bad-conditions', troubles: [{ index: 2 }] });
    request.files[0].datasets[2].conditions = { ...request.files[0].datasets[1].conditions, unit: 'pair' };
    expect(saveDatasets(db, lead, request)).toMatchObject({
      troubles: [{ problems: { unit: expect.any(String) } }]
    });
    expect(db.select().from(dataset).all()).toEqual([]);
    db.$client.close();
  });

  it('reads the file itself: a dataset that is not in it, or is named twice, is refused', () => {
    const { db, lead } = setting();
    const request = wholeFile(db, lead, store(db, lead, LONG_TABLE));
    request.files[0].datasets[3].index = 7;
    expect(saveDatasets(db, lead, request)).toEqual({ ok: false, reason: 'no-such-dataset' });
    request.files[0].datasets[3].index = 0;
    expect(saveDatasets(db, lead, request)).toEqual({ ok: false, reason: 'no-such-dataset' });
    const bad = store(db, lead, 'count,shots\n0,-1\n');
    request.files[0] = { ...request.files[0], fileId: bad };
    expect(saveDatasets(db, lead, request)).toEqual({ ok: false, reason: 'unreadable' });
    db.$client.close();
  });

  it('refuses an observer, a file of another team, and who has just left', () => {
    const { db, lead, experimenter, observer, stranger } = setting();
    const request = wholeFile(db, lead, store(db, lead, '0,5\n1,2\n'));
    db.delete(membership).where(eq(membership.personId, experimenter.personId)).run();
    for (const actor of [observer, stranger, experimenter])
      expect(saveDatasets(db, actor, request)).toEqual({ ok: false, reason: 'unknown-file' });
    expect(db.select().from(dataset).all()).toEqual([]);
    db.$client.close();
  });
});
