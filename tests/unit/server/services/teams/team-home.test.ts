import { eq } from 'drizzle-orm';
import { newId } from '$lib/server/db/new-id';
import { dataset, job, link, remark } from '$lib/server/db/schema';
import { teamHome } from '$lib/server/services/teams/team-home';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { makeDataset, makeReport } from '../../../../support/saved-reports';

const NOTHING = {
  reports: { total: 0, newest: [] },
  waiting: { total: 0, newest: [] },
  datasets: 0,
  remarks: { total: 0, newest: [] },
  jobs: { total: 0, first: [] }
};

describe('teamHome', () => {
  it('shows what is new and what waits, to members alone', async () => {
    const db = freshDatabase();
    const team = makeTeam(db);
    const observer = makeMember(db, team.id, 'observer');
    const stranger = makeMember(db, makeTeam(db).id, 'lead');
    expect(teamHome(db, observer)).toEqual(NOTHING);

    const done = makeDataset(db, team.id, null, { name: 'Done' });
    const waits = makeDataset(db, team.id, null, { name: 'Waits', createdAt: 9 });
    const aside = makeDataset(db, team.id, null, { name: 'Aside', deletedAt: 3 });
    const { id: reportId } = await makeReport(db, { teamId: team.id, datasetId: done }, {}, 7);
    const hidden = await makeReport(db, { teamId: team.id, datasetId: aside }, {}, 8);

    const linkId = newId();
    const options = { audience: 'anyone', shows: 'report', blind: true, allowsRemarks: true } as const;
    db.insert(link)
      .values({
        ...options,
        id: linkId,
        teamId: team.id,
        reportId,
        tokenHash: 'h',
        label: 'x',
        hidesReferees: true,
        createdAt: 1
      })
      .run();
    const [open, settled, answer] = [newId(), newId(), newId()];
    const said = { reportId, section: 'answer', signedAs: 'Rea Feree' };
    db.insert(remark)
      .values([
        { ...said, id: open, linkId, body: 'x'.repeat(300), createdAt: 10 },
        { ...said, id: settled, body: 'settled', createdAt: 11, settledAt: 12 },
        { ...said, id: answer, threadId: open, body: 'answer', createdAt: 20 },
        { ...said, id: newId(), reportId: hidden.id, body: 'on what is put aside', createdAt: 21 }
      ])
      .run();
    const work = { teamId: team.id, options: '{}', createdAt: 1 };
    db.insert(job)
      .values([
        { ...work, id: 'q', datasetId: waits, status: 'queued' },
        { ...work, id: 'r', datasetId: done, status: 'running', share: 0.25 },
        { ...work, id: 'd', datasetId: done, status: 'done' }
      ])
      .run();

    expect(teamHome(db, observer)).toEqual({
      reports: {
        total: 1,
        newest: [
          {
            id: reportId,
            number: 1,
            dataset: 'Done',
            verdict: expect.any(String) as string,
            createdAt: 7,
            by: null
          }
        ]
      },
      waiting: { total: 1, newest: [{ id: waits, name: 'Waits', shots: 100, createdAt: 9 }] },
      datasets: 2,
      remarks: {
        total: 1,
        newest: [
          {
            id: open,
            reportId,
            number: 1,
            dataset: 'Done',
            section: 'answer',
            body: `${'x'.repeat(160)}…`,
            by: 'A referee',
            at: 20
          }
        ]
      },
      jobs: {
        total: 2,
        first: [
          { id: 'r', dataset: 'Done', running: true, share: 0.25 },
          { id: 'q', dataset: 'Waits', running: false, share: 0 }
        ]
      }
    });
    expect(teamHome(db, { ...stranger, teamId: team.id })).toEqual(NOTHING);
    expect(teamHome(db, stranger)).toEqual(NOTHING);
    db.delete(dataset).where(eq(dataset.id, done)).run();
    expect(teamHome(db, observer)).toMatchObject({ reports: { total: 0 }, remarks: { total: 0 } });
  });
});
