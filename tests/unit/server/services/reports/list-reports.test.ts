import { readReportQuery } from '$lib/model/team/reports/report-query';
import { newId } from '$lib/server/db/new-id';
import { dataset, membership, remark, report } from '$lib/server/db/schema';
import { listReports } from '$lib/server/services/reports/list-reports';
import { reportFacets } from '$lib/server/services/reports/report-facets';
import { reportsOfDataset } from '$lib/server/services/reports/reports-of-dataset';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { makeDataset, makeReport } from '../../../../support/saved-reports';

const ask = (search = '') => readReportQuery(new URLSearchParams(search));

async function setting() {
  const db = freshDatabase();
  const [ours, theirs] = [makeTeam(db), makeTeam(db)];
  const observer = makeMember(db, ours.id, 'observer');
  const maker = makeMember(db, ours.id, 'experimenter');
  const tern = makeDataset(db, ours.id, null, { name: 'Slow quench', device: 'Tern', shots: 10 });
  const knot = makeDataset(db, ours.id, null, { name: 'fast_quench', device: 'Knot', firmware: '2.1' });
  const foreign = makeDataset(db, theirs.id, null, { name: 'Slow foreign', device: 'Gull' });
  const made = [
    await makeReport(db, { teamId: ours.id, datasetId: tern, createdBy: maker.personId }, {}, 1),
    await makeReport(db, { teamId: ours.id, datasetId: knot }, { trials: 3 }, 2),
    await makeReport(db, { teamId: ours.id, datasetId: tern }, { seed: 5 }, 3)
  ];
  const other = await makeReport(db, { teamId: theirs.id, datasetId: foreign }, {}, 4);
  return { db, ours, theirs, observer, maker, tern, knot, foreign, made, other };
}

describe('listReports', () => {
  it('gives the reports of the actor’s team alone, newest first', async () => {
    const { db, observer, made } = await setting();
    const list = listReports(db, observer, ask());
    expect(list).toMatchObject({ total: 3, all: 3, page: 1 });
    expect(list.rows.map(({ id }) => id)).toEqual([made[2].id, made[1].id, made[0].id]);
    expect(list.rows[2]).toMatchObject({
      number: 1,
      dataset: 'Slow quench',
      device: 'Tern',
      by: 'Ada Invented',
      threads: 0
    });
  });

  it('puts the one saved last first where times are equal, whatever the ids', async () => {
    const { db, ours, observer, tern } = await setting();
    const ids: string[] = [];
    for (let i = 0; i < 6; i++)
      ids.push((await makeReport(db, { teamId: ours.id, datasetId: tern }, {}, 9)).id);
    const listed = (search: string) =>
      listReports(db, observer, ask(search))
        .rows.map(({ id }) => id)
        .filter((id) => ids.includes(id));
    expect(listed('')).toEqual([...ids].reverse());
    expect(listed('order=up')).toEqual(ids);
    expect(listed('sort=device')).toEqual([...ids].reverse());
  });

  it('finds by words, verdict, device and dataset; nothing of another team by any of them', async () => {
    const { db, observer, tern, foreign, made } = await setting();
    const found = (search: string) => listReports(db, observer, ask(search)).rows.map(({ id }) => id);
    expect(found('q=QUENCH+2.1')).toEqual([made[1].id]);
    // An underscore is a letter like any other.
    expect(found('q=t_q')).toEqual([made[1].id]);
    expect(found('device=Tern')).toEqual([made[2].id, made[0].id]);
    expect(found(`dataset=${tern}`)).toHaveLength(2);
    expect(found('q=foreign')).toEqual([]);
    expect(found(`dataset=${foreign}`)).toEqual([]);
    const verdicts = ['compatible', 'ruled-out', 'undecided'].map((verdict) => found(`verdict=${verdict}`));
    expect(verdicts.flat().sort()).toEqual(made.map(({ id }) => id).sort());
    for (const [i, verdict] of ['compatible', 'ruled-out', 'undecided'].entries())
      for (const id of verdicts[i])
        expect(db.select().from(report).where(eq(report.id, id)).get()!.verdict).toBe(verdict);
  });

  it('sorts and pages, and gives the last page for one behind it', async () => {
    const { db, observer, made } = await setting();
    const names = (search: string) => listReports(db, observer, ask(search)).rows.map((row) => row.dataset);
    expect(names('sort=dataset&order=up')).toEqual(['fast_quench', 'Slow quench', 'Slow quench']);
    expect(names('sort=shots&order=up')[2]).toBe('fast_quench');
    // Nobody's name comes last either way.
    for (const order of ['up', 'down'])
      expect(listReports(db, observer, ask(`sort=by&order=${order}`)).rows[0].id).toBe(made[0].id);
    const page = listReports(db, observer, { ...ask(), size: 2, page: 9 });
    expect(page.page).toBe(2);
    expect(page.rows.map(({ id }) => id)).toEqual([made[0].id]);
  });

  it('counts threads of remarks, and finds the reports with open ones', async () => {
    const { db, observer, made } = await setting();
    const base = { section: 'law', body: 'x', signedAs: 'x', createdAt: 1 };
    const [open, settled] = [newId(), newId()];
    db.insert(remark)
      .values([
        { ...base, id: open, reportId: made[0].id },
        { ...base, id: newId(), reportId: made[0].id, threadId: open },
        { ...base, id: settled, reportId: made[1].id, settledAt: 2 }
      ])
      .run();
    const rows = listReports(db, observer, ask('sort=made&order=up')).rows;
    expect(rows.map((row) => [row.threads, row.open])).toEqual([
      [1, 1],
      [1, 0],
      [0, 0]
    ]);
    expect(listReports(db, observer, ask('remarks=open')).rows.map(({ id }) => id)).toEqual([made[0].id]);
  });

  it('leaves out what was put aside, with its dataset too, and shows nothing to one who left the team', async () => {
    const { db, observer, knot, tern, made } = await setting();
    db.update(report).set({ deletedAt: 5 }).where(eq(report.id, made[0].id)).run();
    db.update(dataset).set({ deletedAt: 5 }).where(eq(dataset.id, knot)).run();
    expect(listReports(db, observer, ask()).rows.map(({ id }) => id)).toEqual([made[2].id]);
    expect(reportFacets(db, observer, tern)).toEqual({ devices: ['Tern'], dataset: 'Slow quench' });
    expect(reportsOfDataset(db, observer, tern).map(({ number }) => number)).toEqual([2]);
    db.delete(membership).where(eq(membership.personId, observer.personId)).run();
    expect(listReports(db, observer, ask())).toMatchObject({ rows: [], total: 0, all: 0 });
    expect(reportFacets(db, observer, tern)).toEqual({ devices: [], dataset: null });
    expect(reportsOfDataset(db, observer, tern)).toEqual([]);
  });
});
