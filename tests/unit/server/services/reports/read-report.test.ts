import { newId } from '$lib/server/db/new-id';
import { dataset, report } from '$lib/server/db/schema';
import { compareReports } from '$lib/server/services/reports/compare-reports';
import { readReport } from '$lib/server/services/reports/read-report';
import { createHash } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { diagnoseInvented, makeDataset, makeReport } from '../../../../support/saved-reports';

async function setting() {
  const db = freshDatabase();
  const teamId = makeTeam(db).id;
  const actor = makeMember(db, teamId, 'observer');
  const stranger = makeMember(db, makeTeam(db).id, 'lead');
  const datasetId = makeDataset(db, teamId, null, { device: 'Tern' });
  const [first, second] = [
    await makeReport(db, { teamId, datasetId, createdBy: actor.personId }, { trials: 3 }, 10),
    await makeReport(db, { teamId, datasetId }, { trials: 12 }, 20)
  ];
  /** Puts a document in as a damaged disk would leave it: past the trigger. */
  const damage = (id: string, text: string, sum = createHash('sha256').update(text).digest('hex')) => {
    const row = db.select().from(report).where(eq(report.id, id)).get()!;
    db.delete(report).where(eq(report.id, id)).run();
    db.insert(report)
      .values({ ...row, document: text, sha256: sum })
      .run();
  };
  return { db, teamId, actor, stranger, datasetId, first, second, damage };
}

describe('readReport', () => {
  it('gives the frozen conditions beside those of now', async () => {
    const { db, actor, datasetId, first } = await setting();
    db.update(dataset).set({ device: 'Heron' }).where(eq(dataset.id, datasetId)).run();
    const read = readReport(db, actor, first.id);
    expect(read).toMatchObject({
      ok: true,
      report: { number: 1, by: 'Ada Invented', createdAt: 10, options: { trials: 3 } },
      document: { ok: true, diagnosis: (await diagnoseInvented({ trials: 3 })).document }
    });
    if (!read.ok) throw new Error(read.reason);
    expect(read.report.conditions.device).toBe('Tern');
    expect(read.report.conditionsNow.device).toBe('Heron');
    expect(createHash('sha256').update(read.report.text).digest('hex')).toBe(read.report.sha256);
  });

  it('knows nothing of other teams, of what was put aside, and of made-up ids', async () => {
    const { db, actor, stranger, datasetId, first, second } = await setting();
    const unknown = { ok: false, reason: 'unknown' };
    expect(readReport(db, stranger, first.id)).toEqual(unknown);
    expect(readReport(db, { ...stranger, teamId: actor.teamId }, first.id)).toEqual(unknown);
    expect(readReport(db, actor, newId())).toEqual(unknown);
    db.update(report).set({ deletedAt: 1 }).where(eq(report.id, first.id)).run();
    expect(readReport(db, actor, first.id)).toEqual(unknown);
    db.update(dataset).set({ deletedAt: 1 }).where(eq(dataset.id, datasetId)).run();
    expect(readReport(db, actor, second.id)).toEqual(unknown);
  });

  it('tells in words what is wrong with a damaged document, and still gives its bytes', async () => {
    const { db, actor, first, second, damage } = await setting();
    damage(first.id, '{"format":"severalty.diagnosis/1"}');
    damage(second.id, '{}', '0'.repeat(64));
    expect(readReport(db, actor, first.id)).toMatchObject({
      ok: true,
      report: { text: '{"format":"severalty.diagnosis/1"}' },
      document: { ok: false, problem: expect.stringContaining('at engine') }
    });
    expect(readReport(db, actor, second.id)).toMatchObject({
      document: { ok: false, problem: expect.stringContaining('sha256') }
    });
  });
});

describe('compareReports', () => {
  it('puts the older report first whichever way they are asked for', async () => {
    const { db, actor, first, second } = await setting();
    for (const [a, b] of [
      [first.id, second.id],
      [second.id, first.id]
    ]) {
      const compared = compareReports(db, actor, a, b);
      expect(compared).toMatchObject({ ok: true, first: { number: 1 }, second: { number: 2 } });
      if (!compared.ok) throw new Error(compared.reason);
      const options = compared.comparison.parts.find(({ id }) => id === 'options')!;
      expect(options.lines.filter(({ changed }) => changed)).toMatchObject([{ first: 3, second: 12 }]);
    }
  });

  it('refuses one and the same, another dataset, another team, and what cannot be read', async () => {
    const { db, teamId, actor, stranger, first, second, damage } = await setting();
    const elsewhere = await makeReport(db, { teamId, datasetId: makeDataset(db, teamId) });
    const foreign = await makeReport(db, {
      teamId: stranger.teamId,
      datasetId: makeDataset(db, stranger.teamId)
    });
    const reason = (a: string, b: string) => {
      const compared = compareReports(db, actor, a, b);
      return compared.ok ? 'ok' : compared.reason;
    };
    expect(reason(first.id, first.id)).toBe('same');
    expect(reason(first.id, elsewhere.id)).toBe('other-dataset');
    expect(reason(first.id, foreign.id)).toBe('unknown');
    expect(reason(newId(), first.id)).toBe('unknown');
    damage(second.id, '[]');
    expect(compareReports(db, actor, first.id, second.id)).toMatchObject({
      reason: 'unreadable',
      problem: expect.stringContaining('report 2')
    });
  });
});
