import { eq } from 'drizzle-orm';
import { bareConditions } from '$lib/model/team/datasets/conditions';
import { dataset, event, person } from '$lib/server/db/schema';
import { bulkEdit } from '$lib/server/services/datasets/bulk-edit';
import { datasetById } from '$lib/server/services/datasets/dataset-by-id';
import { editConditions } from '$lib/server/services/datasets/edit-conditions';
import { namesOfDatasets } from '$lib/server/services/datasets/names-of-datasets';
import { describe, expect, it } from 'vitest';
import { makeDataset } from '../../../../support/datasets';
import { setting } from './support';

const conditions = { ...bareConditions('made'), device: 'Kelp' };

describe('editConditions', () => {
  it('changes conditions and grows the version, with an event that names the fields', () => {
    const { db, experimenter, lead } = setting();
    const id = makeDataset(db, lead);
    expect(editConditions(db, experimenter, id, { version: 1, conditions }, 7)).toEqual({
      ok: true,
      version: 2,
      changed: true
    });
    const found = datasetById(db, lead, id);
    expect(found).toMatchObject({ ok: true, dataset: { conditions, version: 2, updatedAt: 7 } });
    const [line] = db.select().from(event).where(eq(event.thing, id)).all();
    expect(JSON.parse(line.detail ?? '')).toEqual({ changed: 'name, device', version: 2 });
    // A second press changes nothing and is no conflict.
    expect(editConditions(db, experimenter, id, { version: 1, conditions })).toMatchObject({
      changed: false
    });
    db.$client.close();
  });

  it('tells the second of two editors what stands now, and who wrote it', () => {
    const { db, experimenter, lead } = setting();
    db.update(person).set({ name: 'First Editor' }).where(eq(person.id, experimenter.personId)).run();
    const id = makeDataset(db, lead);
    editConditions(db, experimenter, id, { version: 1, conditions }, 7);
    const second = { version: 1, conditions: { ...conditions, device: 'Marram' } };
    expect(editConditions(db, lead, id, second)).toEqual({
      ok: false,
      reason: 'stale',
      current: conditions,
      version: 2,
      by: 'First Editor',
      at: 7
    });
    expect(editConditions(db, lead, id, { ...second, version: 2 })).toMatchObject({ ok: true, version: 3 });
    db.$client.close();
  });

  it('refuses conditions that the counts contradict', () => {
    const { db, lead } = setting();
    const id = makeDataset(db, lead);
    const refused = editConditions(db, lead, id, { version: 1, conditions: { ...conditions, unit: 'pair' } });
    expect(refused).toMatchObject({
      reason: 'bad-conditions',
      problems: { unit: expect.stringContaining('even') }
    });
    db.$client.close();
  });

  it('does not know what is another team’s, put aside, or an observer’s to see alone', () => {
    const { db, lead, observer, stranger } = setting();
    const [id, aside] = [makeDataset(db, lead), makeDataset(db, lead, { deletedAt: 3 })];
    const unknown = { ok: false, reason: 'unknown' };
    for (const actor of [observer, stranger, { ...stranger, teamId: lead.teamId }])
      expect(editConditions(db, actor, id, { version: 1, conditions })).toEqual(unknown);
    expect(editConditions(db, lead, aside, { version: 1, conditions })).toEqual(unknown);
    for (const actor of [stranger, { ...stranger, teamId: lead.teamId }])
      expect(datasetById(db, actor, id)).toEqual(unknown);
    expect(datasetById(db, observer, id).ok).toBe(true);
    db.$client.close();
  });
});

describe('bulkEdit', () => {
  it('sets the chosen conditions alike and leaves the others', () => {
    const { db, lead } = setting();
    const ids = [
      makeDataset(db, lead, { firmware: 'ebb 3.1' }),
      makeDataset(db, lead, { device: 'Kelp', notes: 'n' })
    ];
    const edit = { datasets: [...ids, ids[0]], set: { device: 'Kelp', firmware: null, trials: 12 } };
    expect(bulkEdit(db, lead, edit)).toEqual({ ok: true, changed: 2 });
    const rows = db.select().from(dataset).all();
    for (const row of rows)
      expect(row).toMatchObject({ device: 'Kelp', firmware: null, trials: 12, version: 2 });
    expect(rows.map(({ notes }) => notes).sort()).toEqual(['n', null]);
    expect(bulkEdit(db, lead, edit)).toEqual({ ok: true, changed: 0 });
    db.$client.close();
  });

  it('changes none when one does not fit, or is not the team’s', () => {
    const { db, lead, observer, stranger } = setting();
    const [ours, large] = [
      makeDataset(db, lead),
      makeDataset(db, lead, {
        name: 'large',
        counts: '{"kind":"histogram","counts":[[0,9],[7,1]],"lump":null}'
      })
    ];
    const theirs = makeDataset(db, stranger);
    expect(bulkEdit(db, lead, { datasets: [ours, large], set: { trials: 5 } })).toMatchObject({
      reason: 'bad-conditions',
      troubles: [{ id: large, name: 'large' }]
    });
    const unknown = { ok: false, reason: 'unknown' };
    expect(bulkEdit(db, lead, { datasets: [ours, theirs], set: { device: 'X' } })).toEqual(unknown);
    expect(bulkEdit(db, observer, { datasets: [ours], set: { device: 'X' } })).toEqual(unknown);
    expect(
      db
        .select()
        .from(dataset)
        .all()
        .map(({ device }) => device)
    ).toEqual([null, null, null]);
    db.$client.close();
  });
});

describe('namesOfDatasets', () => {
  it('names those that may be edited, and none of another team', () => {
    const { db, lead, observer, stranger } = setting();
    const [b, a] = [makeDataset(db, lead, { name: 'b' }), makeDataset(db, lead, { name: 'a' })];
    const [theirs, aside] = [makeDataset(db, stranger), makeDataset(db, lead, { deletedAt: 1 })];
    const names = [
      { id: a, name: 'a' },
      { id: b, name: 'b' }
    ];
    expect(namesOfDatasets(db, lead, [b, a, theirs, aside])).toEqual(names);
    expect(namesOfDatasets(db, observer, [a, b])).toEqual([]);
    db.$client.close();
  });
});
