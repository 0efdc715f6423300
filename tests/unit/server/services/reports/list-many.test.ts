import { readReportQuery } from '$lib/model/team/reports/report-query';
import { newId } from '$lib/server/db/new-id';
import { report } from '$lib/server/db/schema';
import { listReports } from '$lib/server/services/reports/list-reports';
import { eq } from 'drizzle-orm';
import { expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { makeDataset, makeReport } from '../../../../support/saved-reports';

it('lists a page of 10 000 reports of 10 000 datasets without a wait', async () => {
  const db = freshDatabase();
  const teamId = makeTeam(db).id;
  const actor = makeMember(db, teamId, 'observer');
  const first = makeDataset(db, teamId);
  const made = await makeReport(db, { teamId, datasetId: first });
  const row = db.select().from(report).where(eq(report.id, made.id)).get()!;
  // Documents are tens of kB when N is large: a sort that carried them along would show.
  const document = row.document + ' '.repeat(20_000);
  db.transaction(() => {
    for (let i = 1; i < 10_000; i++) {
      const datasetId = makeDataset(db, teamId, null, { name: `Chain ${i}`, device: `Device ${i % 7}` });
      db.insert(report)
        .values({ ...row, document, id: newId(), datasetId, createdAt: i })
        .run();
    }
  });
  const searches = [
    '',
    'q=chain+99',
    'device=Device+3&sort=dataset',
    'verdict=undecided',
    'sort=verdict&page=150'
  ];
  for (const search of searches) {
    const since = performance.now();
    const list = listReports(db, actor, readReportQuery(new URLSearchParams(search)));
    const took = performance.now() - since;
    expect(list.all).toBe(10_000);
    // Measured 0.06 to 0.3 s with both cores busy.
    expect(took, search).toBeLessThan(2_000);
  }
});
