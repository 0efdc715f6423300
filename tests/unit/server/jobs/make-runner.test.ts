import { documentText } from '$lib/model/document-text';
import { job, report } from '$lib/server/db/schema';
import type { SaveReport } from '$lib/server/jobs/end-job';
import { makeRunner, type Runner, type RunnerSettings } from '$lib/server/jobs/make-runner';
import { saveReport } from '$lib/server/services/reports/save-report';
import { diagnose } from '$lib/stats/diagnose';
import type { DiagnoseOptions } from '$lib/stats/types';
import { eq } from 'drizzle-orm';
import { afterEach, describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../support/fresh-database';
import { jobOf, makeJob, ODD_WORKER, until, untilStatus } from '../../../support/jobs';
import { makeMember, makeTeam } from '../../../support/people';
import { inventedCounts } from '../../../support/saved-reports';

const runners: Runner[] = [];
afterEach(async () => {
  await Promise.all(runners.splice(0).map((runner) => runner.stop()));
});

function setting() {
  const db = freshDatabase();
  const actor = makeMember(db, makeTeam(db).id, 'experimenter');
  const start = (settings: RunnerSettings = {}, save: SaveReport = saveReport) => {
    const runner = makeRunner(db, save, { threads: 1, ...settings });
    runners.push(runner);
    return runner;
  };
  return { db, actor, start };
}

describe('a runner', () => {
  it('saves the very document that diagnose gives for the same counts and options', async () => {
    const { db, actor, start } = setting();
    const id = makeJob(db, actor, 7);
    start();
    const row = await untilStatus(db, id, 'done');
    const saved = db.select().from(report).where(eq(report.id, row.reportId!)).get()!;
    const options = JSON.parse(row.options) as DiagnoseOptions;
    expect(saved.document).toBe(documentText(await diagnose(inventedCounts, options)));
    expect(saved).toMatchObject({ number: 1, createdBy: actor.personId, datasetId: row.datasetId });
    expect(row).toMatchObject({ share: 1, attempts: 1, step: null, reason: null });
  });

  it('fails a job with the reason that the engine gives', async () => {
    const { db, actor, start } = setting();
    const id = makeJob(db, actor);
    db.update(job)
      .set({ options: JSON.stringify({ ...JSON.parse(jobOf(db, id).options), trials: 1 }) })
      .run();
    start();
    expect((await untilStatus(db, id, 'failed')).reason).toMatch(/trials/);
    expect(db.select().from(report).all()).toEqual([]);
  });

  it.each([
    [1, /thread that ran this diagnosis ended before it was done/],
    [2, /needed more than the 24 MB of memory/],
    [3, /a planted fault/]
  ])('outlives a thread that goes wrong (way %i), and says why', async (seed, reason) => {
    const { db, actor, start } = setting();
    const bad = makeJob(db, actor, seed);
    const next = makeJob(db, actor, 99);
    start({ file: ODD_WORKER, memory: 24 });
    expect((await untilStatus(db, bad, 'failed')).reason).toMatch(reason);
    expect((await untilStatus(db, next, 'failed')).reason).toBe('The odd thread refuses everything.');
  });

  it('fails a job whose worker file is missing, and does not wait for ever', async () => {
    const { db, actor, start } = setting();
    const id = makeJob(db, actor);
    start({ file: '/nowhere/worker.js' });
    expect((await untilStatus(db, id, 'failed')).reason).toMatch(/stopped with an error/);
  });

  it.each([4, 5])('ends a cancelled job within a second (way %i), and takes the next', async (seed) => {
    const { db, actor, start } = setting();
    const id = makeJob(db, actor, seed);
    const next = makeJob(db, actor, 99);
    const runner = start({ file: ODD_WORKER });
    await untilStatus(db, id, 'running');
    if (seed === 4)
      await until(
        () => jobOf(db, id),
        ({ share, step }) => share === 0.5 && step === 'resampling'
      );
    // As another process does it: only the row says so.
    db.update(job).set({ status: 'cancelled', endedAt: 5 }).where(eq(job.id, id)).run();
    const before = Date.now();
    if (seed === 5) runner.abort(id);
    await untilStatus(db, next, 'failed');
    expect(Date.now() - before).toBeLessThan(2_000);
    expect(jobOf(db, id)).toMatchObject({ status: 'cancelled', endedAt: 5, reportId: null });
  });

  it('saves nothing for a job that was given to another runner meanwhile', async () => {
    const { db, actor, start } = setting();
    const id = makeJob(db, actor, 7);
    let asked = 0;
    start({}, (tx, given, now) => {
      asked++;
      return saveReport(tx, given, now);
    });
    db.update(job).set({ runner: 'another' }).where(eq(job.id, id)).run();
    const marker = makeJob(db, actor, 8);
    await untilStatus(db, marker, 'done');
    expect(asked).toBe(1);
    expect(jobOf(db, id)).toMatchObject({ status: 'running', runner: 'another' });
  });

  it('saves report and end together or not at all', async () => {
    const { db, actor, start } = setting();
    const id = makeJob(db, actor, 7);
    start({}, (tx, given, now) => {
      saveReport(tx, given, now);
      throw new Error('broken off');
    });
    const row = await untilStatus(db, id, 'failed');
    expect(row.reason).toBe('The report could not be saved: broken off');
    expect(db.select().from(report).all()).toEqual([]);
  });

  it('keeps the result while the database is full, and saves it then', async () => {
    const { db, actor, start } = setting();
    const id = makeJob(db, actor, 7);
    let full = 2;
    start({}, (tx, given, now) => {
      if (full-- > 0) throw Object.assign(new Error('database or disk is full'), { code: 'SQLITE_FULL' });
      return saveReport(tx, given, now);
    });
    expect((await untilStatus(db, id, 'done')).attempts).toBe(1);
    expect(db.select().from(report).all()).toHaveLength(1);
  });

  it('gives its jobs back when it stops, and touches the database no more', async () => {
    const { db, actor, start } = setting();
    const id = makeJob(db, actor, 4);
    const runner = start({ file: ODD_WORKER });
    await untilStatus(db, id, 'running');
    const stopping = runner.stop();
    expect(jobOf(db, id)).toMatchObject({ status: 'queued', attempts: 0, runner: null });
    db.$client.close();
    await stopping;
  });

  it('fails a job whose dataset was put aside before its turn', async () => {
    const { db, actor, start } = setting();
    const id = makeJob(db, actor, 7);
    db.$client.exec('update dataset set deleted_at = 1');
    start();
    expect((await untilStatus(db, id, 'failed')).reason).toMatch(/put aside/);
  });
});
