import { defaultOptions } from '$lib/stats/default-options';
import { person, dataset, sweep } from '$lib/server/db/schema';
import type { Database } from '$lib/server/db/client';
import { saveReportAndSweep } from '$lib/server/services/demo-team/save-report-and-sweep';
import { seedDemoTeam } from '$lib/server/services/demo-team/seed-demo-team';
import { seedSamples } from '$lib/server/services/seed-samples';
import type { SweepReport } from '$lib/stats/sweep/types';
import { isNotNull } from 'drizzle-orm';
import { expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { diagnoseNine } from '../../../../support/links';

it('the invented sweep is made with the answer of its last ramp, once, and by nobody else’s', async () => {
  const db = freshDatabase();
  seedSamples(db);
  await seedDemoTeam(db);
  expect(db.select().from(sweep).all()).toEqual([]);
  const { document } = await diagnoseNine();
  const maker = db
    .select()
    .from(person)
    .all()
    .find(({ email }) => email.startsWith('iven'))!;
  const ramps = db.select().from(dataset).where(isNotNull(dataset.quenchTime)).all();
  expect(ramps).toHaveLength(6);
  const save = (on: Database, datasetId: string, createdBy: string | null) =>
    on.transaction((tx) =>
      saveReportAndSweep(tx, {
        teamId: ramps[0].teamId,
        datasetId,
        document,
        options: defaultOptions,
        createdBy
      })
    );
  for (const { id } of ramps.slice(1)) save(db, id, maker.id);
  save(db, ramps[0].id, null);
  expect(db.select().from(sweep).all()).toEqual([]);
  db.run('delete from report where created_by is null');
  save(db, ramps[0].id, maker.id);
  const made = db.select().from(sweep).all();
  expect(made).toHaveLength(1);
  const { points } = JSON.parse(made[0].document) as SweepReport;
  expect(points).toHaveLength(6);
  for (const point of points) {
    expect(point.dataset!.verdict).toBe(document.answer.verdict);
    expect(point.dataset!.dispersion).toEqual(document.moments.dispersion);
  }
  save(db, ramps[1].id, maker.id);
  expect(db.select().from(sweep).all()).toHaveLength(1);
});
