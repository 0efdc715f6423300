import { MOST_JOBS } from '$lib/model/team/jobs/job-request';
import { dataset, event, job } from '$lib/server/db/schema';
import { enqueueJobs } from '$lib/server/services/jobs/enqueue-jobs';
import { defaultOptions } from '$lib/stats/default-options';
import type { DiagnoseOptions } from '$lib/stats/types';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { jobOf } from '../../../../support/jobs';
import { makeMember, makeTeam } from '../../../../support/people';
import { makeDataset } from '../../../../support/saved-reports';

function setting() {
  const db = freshDatabase();
  const teamId = makeTeam(db).id;
  const actor = makeMember(db, teamId, 'experimenter');
  const datasetId = makeDataset(db, teamId, null, {
    trials: 24,
    unit: 'pair',
    geometry: 'ring-bonds',
    misread: 0.02
  });
  return { db, teamId, actor, datasetId };
}

function idOf(result: ReturnType<typeof enqueueJobs>): string {
  if (!result.ok) throw new Error(result.reason);
  return result.jobs[0].id;
}

describe('enqueueJobs', () => {
  it('takes what is known of the experiment from the dataset, and how hard to look from who asks', () => {
    const { db, teamId, actor, datasetId } = setting();
    const id = idOf(enqueueJobs(db, actor, [datasetId], { resamples: 99, seed: 7, alpha: undefined }, 55));
    const row = jobOf(db, id);
    expect(JSON.parse(row.options)).toEqual({
      ...defaultOptions,
      trials: 24,
      unit: 'pair',
      geometry: 'ring-bonds',
      misread: 0.02,
      resamples: 99,
      seed: 7
    });
    expect(row).toMatchObject({ teamId, status: 'queued', createdBy: actor.personId, createdAt: 55 });
    expect(db.select().from(event).all()).toMatchObject([{ action: 'job.queue', thing: id, at: 55 }]);
  });

  it('takes counts kept and the uncertainty of the misread rate with it, and leaves them out where not stated', () => {
    const { db, actor } = setting();
    const experiment = { trials: 24, misread: 0.02, misreadUncertainty: 0.003, kept: '1-9' };
    const stated = makeDataset(db, actor.teamId, null, experiment);
    const options = JSON.parse(jobOf(db, idOf(enqueueJobs(db, actor, [stated]))).options) as DiagnoseOptions;
    expect(options).toMatchObject({ misreadUncertainty: 0.003, kept: { from: 1, to: 9 } });
    const bare = makeDataset(db, actor.teamId, null, { trials: 24 });
    const without = JSON.parse(jobOf(db, idOf(enqueueJobs(db, actor, [bare]))).options) as DiagnoseOptions;
    expect('kept' in without || 'misreadUncertainty' in without).toBe(false);
  });

  it('gives a second click the job that is there already', () => {
    const { db, actor, datasetId } = setting();
    const id = idOf(enqueueJobs(db, actor, [datasetId]));
    expect(enqueueJobs(db, actor, [datasetId, datasetId])).toEqual({
      ok: true,
      jobs: [{ id, datasetId, already: true }]
    });
    expect(idOf(enqueueJobs(db, actor, [datasetId], { seed: 9 }))).not.toBe(id);
    db.update(job).set({ status: 'done' }).run();
    expect(idOf(enqueueJobs(db, actor, [datasetId]))).not.toBe(id);
  });

  it('queues all or none: of another team, put aside, or unknown', () => {
    const { db, actor, datasetId } = setting();
    const foreign = makeDataset(db, makeTeam(db).id);
    const aside = makeDataset(db, actor.teamId, null, { deletedAt: 3 });
    for (const other of [foreign, aside, 'unknown'])
      expect(enqueueJobs(db, actor, [datasetId, other])).toEqual({ ok: false, reason: 'unknown' });
    expect(db.select().from(job).all()).toEqual([]);
  });

  it('refuses an observer, and a member who left, also when the route forgot to ask', () => {
    const { db, teamId, actor, datasetId } = setting();
    const observer = makeMember(db, teamId, 'observer');
    const pretender = { ...observer, role: 'lead' as const };
    for (const who of [observer, pretender])
      expect(enqueueJobs(db, who, [datasetId])).toEqual({ ok: false, reason: 'unknown' });
    db.$client.prepare('delete from membership where person_id = ?').run(actor.personId);
    expect(enqueueJobs(db, actor, [datasetId])).toEqual({ ok: false, reason: 'unknown' });
  });

  it.each([
    [{ alpha: 0.7 }, /alpha/],
    [{ resamples: 5 }, /resamples/],
    [{ seed: -1 }, /seed/],
    [{ tolerance: 0 }, /tolerance/],
    [{ alpha: NaN }, /alpha/]
  ])('refuses %o in words', (hardness, why) => {
    const { db, actor, datasetId } = setting();
    expect(enqueueJobs(db, actor, [datasetId], hardness)).toEqual({
      ok: false,
      reason: 'bad-options',
      why: expect.stringMatching(why)
    });
  });

  it('lets a team have so many waiting and no more', () => {
    const { db, actor, datasetId } = setting();
    enqueueJobs(db, actor, [datasetId]);
    const row = db.select().from(job).get()!;
    for (let i = 1; i < MOST_JOBS; i++)
      db.insert(job)
        .values({ ...row, id: `copy ${i}` })
        .run();
    expect(enqueueJobs(db, actor, [datasetId], { seed: 2 })).toEqual({
      ok: false,
      reason: 'too-many',
      queued: MOST_JOBS,
      most: MOST_JOBS
    });
    db.update(job).set({ status: 'running' }).where(eq(job.id, 'copy 1')).run();
    expect(enqueueJobs(db, actor, [datasetId], { seed: 2 })).toMatchObject({ ok: true });
  });

  it('takes the conditions at the moment of asking', () => {
    const { db, actor, datasetId } = setting();
    const id = idOf(enqueueJobs(db, actor, [datasetId]));
    db.update(dataset).set({ trials: 30 }).run();
    expect(JSON.parse(jobOf(db, id).options)).toMatchObject({ trials: 24 });
  });
});
