import { putAside } from '$lib/server/services/datasets/put-aside';
import { restoreDataset } from '$lib/server/services/datasets/restore-dataset';
import { describe, expect, it } from 'vitest';
import { makeDataset } from '../../../../support/datasets';
import { setting } from './support';

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
