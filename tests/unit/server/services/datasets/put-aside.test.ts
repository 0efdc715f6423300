import { dataset, event, originalFile, report } from '$lib/server/db/schema';
import { purgeAside } from '$lib/server/services/datasets/purge-aside';
import { putAside } from '$lib/server/services/datasets/put-aside';
import { restoreDataset } from '$lib/server/services/datasets/restore-dataset';
import { describe, expect, it } from 'vitest';
import { makeDataset, makeReport } from '../../../../support/datasets';
import { setting, store } from './support';

const DAY = 86_400_000;
const unknown = { ok: false, reason: 'unknown' };

describe('putAside and restoreDataset', () => {
  it('a lead any, an experimenter their own, an observer none, a stranger none', () => {
    const { db, lead, experimenter, observer, stranger } = setting();
    const [leads, own] = [makeDataset(db, lead), makeDataset(db, experimenter, { name: 'own' })];
    for (const actor of [experimenter, observer, stranger, { ...stranger, teamId: lead.teamId }]) {
      expect(putAside(db, actor, leads)).toEqual(unknown);
    }
    expect(putAside(db, experimenter, own, 5)).toEqual({ ok: true, name: 'own' });
    expect(putAside(db, experimenter, own)).toEqual(unknown);
    for (const actor of [observer, stranger]) expect(restoreDataset(db, actor, own)).toEqual(unknown);
    expect(restoreDataset(db, lead, own)).toEqual({ ok: true, name: 'own' });
    expect(restoreDataset(db, lead, own)).toEqual(unknown);
    expect(putAside(db, lead, leads).ok).toBe(true);
    expect(restoreDataset(db, experimenter, leads)).toEqual(unknown);
    db.$client.close();
  });
});

describe('purgeAside', () => {
  it('removes for good after 30 days, with reports and files that nothing is left of', () => {
    const { db, lead } = setting();
    const now = 100 * DAY;
    const old = makeDataset(db, lead, { name: 'old', deletedAt: now - 30 * DAY - 1 });
    const young = makeDataset(db, lead, { name: 'young', deletedAt: now - 30 * DAY + 1 });
    const kept = makeDataset(db, lead, { name: 'kept' });
    for (const id of [old, young]) makeReport(db, lead, id);
    makeReport(db, lead, kept, { deletedAt: now - 31 * DAY });
    expect(purgeAside(db, now)).toEqual({ datasets: 1, reports: 1, files: 1 });
    expect(
      db
        .select()
        .from(dataset)
        .all()
        .map(({ name }) => name)
    ).toEqual(['young', 'kept']);
    expect(
      db
        .select()
        .from(report)
        .all()
        .map(({ datasetId }) => datasetId)
    ).toEqual([young]);
    expect(db.select().from(originalFile).all()).toHaveLength(2);
    expect(
      db
        .select()
        .from(event)
        .all()
        .map(({ action }) => action)
    ).toEqual(['dataset.purge', 'report.purge']);
    expect(purgeAside(db, now)).toEqual({ datasets: 0, reports: 0, files: 0 });
    expect(db.$client.pragma('foreign_key_check')).toEqual([]);
    db.$client.close();
  });

  it('keeps a file of an upload under way for a day', () => {
    const { db, lead } = setting();
    store(db, lead, '0,1\n1,2\n');
    expect(purgeAside(db).files).toBe(0);
    expect(purgeAside(db, Date.now() + DAY + 1000).files).toBe(1);
    db.$client.close();
  });
});
