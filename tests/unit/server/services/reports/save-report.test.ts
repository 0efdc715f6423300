import { documentText } from '$lib/model/document-text';
import { dataset, event, report } from '$lib/server/db/schema';
import { saveReport } from '$lib/server/services/reports/save-report';
import { eq, sql } from 'drizzle-orm';
import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { diagnoseInvented, makeDataset, makeReport } from '../../../../support/saved-reports';

function setting() {
  const db = freshDatabase();
  const teamId = makeTeam(db).id;
  const { personId } = makeMember(db, teamId, 'experimenter');
  return {
    db,
    teamId,
    personId,
    datasetId: makeDataset(db, teamId, personId, { device: 'Tern', holdTime: 2 })
  };
}

describe('saveReport', () => {
  it('stores the bytes of the document, their sha256 and the conditions of the moment', async () => {
    const { db, teamId, personId, datasetId } = setting();
    const made = await diagnoseInvented();
    const { id, number } = db.transaction((tx) =>
      saveReport(tx, { teamId, datasetId, ...made, createdBy: personId }, 77)
    );
    db.update(dataset).set({ device: 'Heron' }).where(eq(dataset.id, datasetId)).run();
    const row = db.select().from(report).where(eq(report.id, id)).get()!;
    expect(number).toBe(1);
    expect(row.document).toBe(documentText(made.document));
    expect(row.sha256).toBe(createHash('sha256').update(Buffer.from(row.document)).digest('hex'));
    expect(JSON.parse(row.options)).toEqual(made.options);
    expect(JSON.parse(row.conditions)).toMatchObject({ device: 'Tern', holdTime: 2, firmware: null });
    expect(row).toMatchObject({ teamId, datasetId, createdBy: personId, createdAt: 77, deletedAt: null });
    expect([row.verdict, row.engineVersion]).toEqual([
      made.document.answer.verdict,
      made.document.engine.version
    ]);
  });

  it('counts up within a dataset, over what was put aside too', async () => {
    const { db, teamId, datasetId } = setting();
    const other = makeDataset(db, teamId);
    const second = async () => (await makeReport(db, { teamId, datasetId })).number;
    expect(await second()).toBe(1);
    const aside = await makeReport(db, { teamId, datasetId });
    db.update(report).set({ deletedAt: 5 }).where(eq(report.id, aside.id)).run();
    expect(await second()).toBe(3);
    expect((await makeReport(db, { teamId, datasetId: other })).number).toBe(1);
  });

  it('tells the events who made it', async () => {
    const { db, teamId, personId, datasetId } = setting();
    const { id } = await makeReport(db, { teamId, datasetId, createdBy: personId }, {}, 9);
    expect(db.select().from(event).get()).toMatchObject({
      action: 'report.make',
      at: 9,
      teamId,
      personId,
      thing: id
    });
  });

  it('leaves nothing behind when the transaction fails', async () => {
    const { db, teamId, datasetId } = setting();
    const made = await diagnoseInvented();
    expect(() =>
      db.transaction((tx) => {
        saveReport(tx, { teamId, datasetId, ...made, createdBy: null });
        throw new Error('the job was cancelled');
      })
    ).toThrow('cancelled');
    expect(
      db
        .select({ n: sql<number>`count(*)` })
        .from(report)
        .get()
    ).toEqual({ n: 0 });
    expect(
      db
        .select({ n: sql<number>`count(*)` })
        .from(event)
        .get()
    ).toEqual({ n: 0 });
  });

  it('makes no report of a dataset of another team', async () => {
    const { db, datasetId } = setting();
    const stranger = makeTeam(db).id;
    await expect(makeReport(db, { teamId: stranger, datasetId })).rejects.toThrow('gone');
  });

  it('cannot be changed afterwards', async () => {
    const { db, teamId, datasetId } = setting();
    const { id } = await makeReport(db, { teamId, datasetId });
    const change = (values: Partial<typeof report.$inferInsert>) =>
      db.update(report).set(values).where(eq(report.id, id)).run();
    for (const values of [
      { document: '{}' },
      { sha256: '0' },
      { options: '{}' },
      { verdict: 'compatible' as const },
      { engineVersion: '9' },
      { conditions: '{}' },
      { number: 9 },
      { createdAt: 1 }
    ])
      expect(() => change(values)).toThrow('a report is never changed');
    expect(change({ deletedAt: 1 }).changes).toBe(1);
  });
});
