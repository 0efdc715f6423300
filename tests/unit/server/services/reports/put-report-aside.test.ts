import { can } from '$lib/server/access/can';
import { dataset, event, report } from '$lib/server/db/schema';
import { putReportAside } from '$lib/server/services/reports/put-report-aside';
import { restoreReport } from '$lib/server/services/reports/restore-report';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { makeDataset, makeReport } from '../../../../support/saved-reports';

async function setting() {
  const db = freshDatabase();
  const teamId = makeTeam(db).id;
  const [lead, maker, other, observer] = (['lead', 'experimenter', 'experimenter', 'observer'] as const).map(
    (role) => makeMember(db, teamId, role)
  );
  const stranger = makeMember(db, makeTeam(db).id, 'lead');
  const datasetId = makeDataset(db, teamId);
  const { id } = await makeReport(db, { teamId, datasetId, createdBy: maker.personId });
  const aside = () => db.select().from(report).where(eq(report.id, id)).get()!.deletedAt;
  return { db, lead, maker, other, observer, stranger, datasetId, id, aside };
}

describe('putReportAside and restoreReport', () => {
  it('are for leads, and for experimenters with what they made, as can() says', async () => {
    const { db, id, aside, stranger, ...people } = await setting();
    const { lead, maker, other, observer } = people;
    const unknown = { ok: false, reason: 'unknown' };
    for (const actor of [lead, maker, other, observer]) {
      const allowed = can({ kind: 'member', ...actor }, 'delete', { createdBy: maker.personId });
      expect(putReportAside(db, actor, id, 7)).toEqual(allowed ? { ok: true, number: 1 } : unknown);
      expect(aside()).toBe(allowed ? 7 : null);
      db.update(report).set({ deletedAt: 7 }).where(eq(report.id, id)).run();
      expect(restoreReport(db, actor, id, 8)).toEqual(allowed ? { ok: true, number: 1 } : unknown);
      expect(aside()).toBe(allowed ? null : 7);
      db.update(report).set({ deletedAt: null }).where(eq(report.id, id)).run();
    }
    expect(putReportAside(db, stranger, id)).toEqual(unknown);
    expect(putReportAside(db, { ...stranger, teamId: lead.teamId }, id)).toEqual(unknown);
    expect(aside()).toBeNull();
  });

  it('do each thing once, and tell the events', async () => {
    const { db, lead, id } = await setting();
    expect(putReportAside(db, lead, id, 5).ok).toBe(true);
    expect(putReportAside(db, lead, id, 6).ok).toBe(false);
    expect(restoreReport(db, lead, id, 7).ok).toBe(true);
    expect(restoreReport(db, lead, id, 8).ok).toBe(false);
    const told = db.select().from(event).where(eq(event.personId, lead.personId)).all();
    expect(told.map(({ action, at, thing }) => [action, at, thing])).toEqual([
      ['report.aside', 5, id],
      ['report.restore', 7, id]
    ]);
  });

  it('do not bring a report back whose dataset is put aside', async () => {
    const { db, lead, id, datasetId, aside } = await setting();
    putReportAside(db, lead, id, 5);
    db.update(dataset).set({ deletedAt: 6 }).where(eq(dataset.id, datasetId)).run();
    expect(restoreReport(db, lead, id)).toEqual({ ok: false, reason: 'dataset-aside' });
    expect(aside()).toBe(5);
  });
});
