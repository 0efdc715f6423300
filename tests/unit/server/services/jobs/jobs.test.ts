import { event, job } from '$lib/server/db/schema';
import { cancelJob } from '$lib/server/services/jobs/cancel-job';
import { jobStatuses } from '$lib/server/services/jobs/job-statuses';
import { listJobs } from '$lib/server/services/jobs/list-jobs';
import { retryJob } from '$lib/server/services/jobs/retry-job';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { jobOf, makeJob } from '../../../../support/jobs';
import { makeMember, makeTeam } from '../../../../support/people';
import { makeReport } from '../../../../support/saved-reports';

function setting() {
  const db = freshDatabase();
  const actor = makeMember(db, makeTeam(db).id, 'experimenter');
  const stranger = makeMember(db, makeTeam(db).id, 'lead');
  const observer = makeMember(db, actor.teamId, 'observer');
  const set = (id: string, more: Partial<typeof job.$inferInsert>) =>
    db.update(job).set(more).where(eq(job.id, id)).run();
  return { db, actor, stranger, observer, set };
}

const all = { show: 'all', page: 1 } as const;

describe('listJobs', () => {
  it('gives running, then waiting in their order, then ended with the newest first', () => {
    const { db, actor, set } = setting();
    const ids = [1, 2, 3, 4, 5].map((at) => makeJob(db, actor, 1, at));
    set(ids[0], { status: 'done', endedAt: 50 });
    set(ids[1], { status: 'failed', endedAt: 60, reason: 'why' });
    set(ids[4], { status: 'running', startedAt: 70, share: 0.25, step: 'fit' });
    const list = listJobs(db, actor, all, 90);
    expect(list.rows.map(({ id }) => id)).toEqual([ids[4], ids[2], ids[3], ids[1], ids[0]]);
    expect(list.rows[0]).toMatchObject({ share: 0.25, step: 'fit', elapsed: 20, by: 'Ada Invented' });
    expect(list).toMatchObject({ total: 5, queued: 2, running: 1, page: 1 });
  });

  it('filters, and gives the last page for one behind it', () => {
    const { db, actor, set } = setting();
    const ids = Array.from({ length: 60 }, (_, i) => makeJob(db, actor, 1, i));
    set(ids[0], { status: 'cancelled', endedAt: 1 });
    expect(listJobs(db, actor, { show: 'failed', page: 1 }).rows.map(({ id }) => id)).toEqual([ids[0]]);
    const last = listJobs(db, actor, { show: 'active', page: 9 });
    expect(last).toMatchObject({ page: 2, total: 59 });
    expect(last.rows.map(({ id }) => id)).toEqual(ids.slice(51));
  });

  it('shows a team its own jobs alone, and a report until it is put aside', async () => {
    const { db, actor, stranger, observer, set } = setting();
    const id = makeJob(db, actor);
    const place = { teamId: actor.teamId, datasetId: jobOf(db, id).datasetId };
    const report = await makeReport(db, place);
    set(id, { status: 'done', reportId: report.id, endedAt: 1 });
    expect(listJobs(db, stranger, all)).toMatchObject({ rows: [], total: 0 });
    expect(listJobs(db, observer, all).rows[0].report).toEqual({ id: report.id, number: 1 });
    db.$client.exec('update report set deleted_at = 1');
    expect(listJobs(db, observer, all).rows[0].report).toBeNull();
  });
});

describe('cancelJob', () => {
  it.each(['queued', 'running'] as const)('ends a %s job at once, with an event', (status) => {
    const { db, actor, set } = setting();
    const id = makeJob(db, actor);
    set(id, { status });
    expect(cancelJob(db, actor, id, 77)).toEqual({ ok: true });
    expect(jobOf(db, id)).toMatchObject({ status: 'cancelled', endedAt: 77 });
    expect(db.select().from(event).where(eq(event.action, 'job.cancel')).all()).toMatchObject([
      { thing: id, at: 77 }
    ]);
  });

  it.each(['done', 'failed', 'cancelled'] as const)('leaves a %s job as it is', (status) => {
    const { db, actor, set } = setting();
    const id = makeJob(db, actor);
    set(id, { status, endedAt: 5 });
    expect(cancelJob(db, actor, id)).toEqual({ ok: false, reason: 'ended' });
    expect(jobOf(db, id)).toMatchObject({ status, endedAt: 5 });
  });

  it('knows no job of another team, and lets no observer cancel', () => {
    const { db, actor, stranger, observer } = setting();
    const id = makeJob(db, actor);
    for (const who of [stranger, observer])
      expect(cancelJob(db, who, id)).toEqual({ ok: false, reason: 'unknown' });
    expect(jobOf(db, id).status).toBe('queued');
  });
});

describe('retryJob', () => {
  it('makes a new job, as hard as the old one, with the conditions of now', () => {
    const { db, actor, set } = setting();
    const id = makeJob(db, actor, 7);
    set(id, { status: 'failed', reason: 'why' });
    db.$client.exec('update dataset set trials = 40');
    const again = retryJob(db, actor, id);
    if (!again.ok) throw new Error(again.reason);
    expect(JSON.parse(jobOf(db, again.jobs[0].id).options)).toMatchObject({
      seed: 7,
      resamples: 19,
      trials: 40
    });
    expect(jobOf(db, id)).toMatchObject({ status: 'failed', reason: 'why' });
  });

  it('asks again only for what failed or was cancelled, and only for the team', () => {
    const { db, actor, stranger, observer, set } = setting();
    const id = makeJob(db, actor);
    expect(retryJob(db, actor, id)).toEqual({ ok: false, reason: 'not-failed' });
    set(id, { status: 'cancelled' });
    for (const who of [stranger, observer])
      expect(retryJob(db, who, id)).toEqual({ ok: false, reason: 'unknown' });
  });
});

describe('jobStatuses', () => {
  it('gives the job that runs or waits, else the last one', () => {
    const { db, actor, stranger, set } = setting();
    const [first, second] = [makeJob(db, actor, 1, 1), makeJob(db, actor, 2, 2)];
    const [one, two] = [jobOf(db, first).datasetId, jobOf(db, second).datasetId];
    set(second, { datasetId: one });
    expect(jobStatuses(db, actor, [one, two])).toMatchObject({ [one]: { id: second } });
    set(first, { status: 'running' });
    set(second, { status: 'failed' });
    expect(jobStatuses(db, actor, [one])[one].id).toBe(first);
    expect(jobStatuses(db, stranger, [one])).toEqual({});
  });
});
