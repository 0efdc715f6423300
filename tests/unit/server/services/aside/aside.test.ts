import { eq } from 'drizzle-orm';
import { dataset, event, originalFile, report } from '$lib/server/db/schema';
import { KEPT_ASIDE } from '$lib/server/services/aside/kept-aside';
import { listAside } from '$lib/server/services/aside/list-aside';
import { purgeAside } from '$lib/server/services/aside/purge';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { makeDataset, makeReport } from '../../../../support/saved-reports';

const DAY = 24 * 60 * 60 * 1000;

async function setting() {
  const db = freshDatabase();
  const team = makeTeam(db);
  const lead = makeMember(db, team.id, 'lead');
  const experimenter = makeMember(db, team.id, 'experimenter');
  const observer = makeMember(db, team.id, 'observer');
  const stranger = makeMember(db, makeTeam(db).id, 'lead');
  const theirs = makeDataset(db, team.id, experimenter.personId, { name: 'A' });
  const leads = makeDataset(db, team.id, lead.personId, { name: 'B' });
  const kept = makeDataset(db, team.id, lead.personId, { name: 'C' });
  const one = await makeReport(db, { teamId: team.id, datasetId: kept, createdBy: experimenter.personId });
  const two = await makeReport(db, { teamId: team.id, datasetId: leads });
  const aside = (table: typeof dataset | typeof report, id: string, at: number) =>
    db.update(table).set({ deletedAt: at, deletedBy: lead.personId }).where(eq(table.id, id)).run();
  return { db, team, lead, experimenter, observer, stranger, theirs, leads, kept, one, two, aside };
}

describe('listAside', () => {
  it('lists what can be brought back, with the days left and whether the actor may', async () => {
    const { db, lead, experimenter, observer, stranger, theirs, leads, one, two, aside } = await setting();
    aside(dataset, theirs, 1000);
    aside(dataset, leads, 2000);
    aside(report, one.id, 3000);
    // Went with its dataset, or before it: comes back with it.
    aside(report, two.id, 2000);
    expect(listAside(db, lead, 3000)).toMatchObject([
      { id: one.id, kind: 'report', name: 'Report 1 of C', daysLeft: 30, mayRestore: true },
      { id: leads, kind: 'dataset', name: 'B', by: 'Ada Invented', daysLeft: 30, mayRestore: true },
      { id: theirs, kind: 'dataset', name: 'A', daysLeft: 30, mayRestore: true }
    ]);
    const may = (actor: typeof lead) =>
      listAside(db, actor, 3000)
        .filter(({ mayRestore }) => mayRestore)
        .map(({ id }) => id);
    expect(may(experimenter)).toEqual([one.id, theirs]);
    expect(may(observer)).toEqual([]);
    expect(listAside(db, observer, 3000)).toHaveLength(3);
    expect(listAside(db, stranger, 3000)).toEqual([]);
    expect(listAside(db, { ...stranger, teamId: lead.teamId }, 3000)).toEqual([]);
  });

  it('counts the days down to none', async () => {
    const { db, lead, theirs, aside } = await setting();
    aside(dataset, theirs, 0);
    const left = (now: number) => listAside(db, lead, now).map(({ daysLeft }) => daysLeft);
    expect([left(1), left(DAY), left(29 * DAY), left(30 * DAY - 1), left(30 * DAY)]).toEqual([
      [30],
      [29],
      [1],
      [1],
      []
    ]);
  });
});

describe('purgeAside', () => {
  it('removes after 30 days, to the millisecond, with the reports and the file that nothing needs', async () => {
    const { db, team, leads, kept, one, two, aside } = await setting();
    // Another dataset of the same file, which stays.
    const [{ fileId }] = db.select().from(dataset).where(eq(dataset.id, kept)).all();
    const twin = makeDataset(db, team.id, null, { name: 'D', fileId });
    aside(dataset, leads, 1000);
    aside(dataset, twin, 1000);
    aside(report, one.id, 1001);
    const files = () => db.select({ id: originalFile.id }).from(originalFile).all().length;
    const before = files();
    expect(purgeAside(db, 1000 + KEPT_ASIDE - 1)).toMatchObject({ datasets: 0, reports: 0 });
    // makeDataset gives every dataset a file of its own; the twin's was never used and went with the first purge.
    expect(files()).toBe(before - 1);
    expect(purgeAside(db, 1000 + KEPT_ASIDE)).toEqual({ datasets: 2, reports: 0, files: 1 });
    expect(db.select({ id: report.id }).from(report).all()).toEqual([{ id: one.id }]);
    expect(purgeAside(db, 1001 + KEPT_ASIDE)).toEqual({ datasets: 0, reports: 1, files: 0 });
    expect(db.select().from(dataset).where(eq(dataset.id, kept)).all()).toHaveLength(1);
    expect(db.select().from(originalFile).where(eq(originalFile.id, fileId)).all()).toHaveLength(1);
    expect(two.number).toBe(1);
    expect(
      db
        .select({ action: event.action, detail: event.detail })
        .from(event)
        .all()
        .filter(({ action }) => action.endsWith('purge'))
    ).toEqual([
      { action: 'dataset.purge', detail: '{"name":"B"}' },
      { action: 'dataset.purge', detail: '{"name":"D"}' },
      { action: 'report.purge', detail: null }
    ]);
    expect(db.$client.pragma('foreign_key_check')).toEqual([]);
  });

  it('leaves a file alone for a day whose datasets are not saved yet', async () => {
    const { db, team } = await setting();
    const at = 40 * DAY;
    db.insert(originalFile)
      .values({
        id: 'x',
        teamId: team.id,
        name: 'f',
        sha256: 'x',
        size: 0,
        bytes: Buffer.of(),
        createdAt: at
      })
      .run();
    expect(purgeAside(db, at + DAY - 1).files).toBe(0);
    expect(purgeAside(db, at + DAY).files).toBe(1);
  });
});
