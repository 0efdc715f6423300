import { event, job } from '$lib/server/db/schema';
import { requeueAbandoned, requeueOwn } from '$lib/server/jobs/requeue';
import { isGone, newRunnerName } from '$lib/server/jobs/runner-name';
import { eq } from 'drizzle-orm';
import { spawnSync } from 'node:child_process';
import { hostname } from 'node:os';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../support/fresh-database';
import { jobOf, makeJob } from '../../../support/jobs';
import { makeMember, makeTeam } from '../../../support/people';

/** Number of a process that ran and is gone. */
const dead = spawnSync(process.execPath, ['-e', '']).pid;

function running(runner: string, attempts: number, heartbeatAt = Date.now()) {
  const db = freshDatabase();
  const id = makeJob(db, makeMember(db, makeTeam(db).id, 'lead'));
  db.update(job).set({ status: 'running', runner, attempts, heartbeatAt, share: 0.4, step: 'fit' }).run();
  return { db, id };
}

describe('isGone', () => {
  const now = 1_000_000;
  it.each([
    ['a process of this machine that ended', `${dead} ${hostname()} x`, now, true],
    ['an earlier process with the number of this one', `${process.pid} ${hostname()} x`, now, true],
    ['a process that lives', `${process.ppid} ${hostname()} x`, now, false],
    ['a living process that was silent for long', `${process.ppid} ${hostname()} x`, now - 31_000, true],
    ['another machine that showed life', '1 elsewhere x', now - 29_000, false],
    ['another machine that was silent for long', '1 elsewhere x', now - 31_000, true]
  ])('%s', (_, name, heartbeat, gone) => expect(isGone(name, heartbeat, now)).toBe(gone));

  it('is not said of a runner of this very process', () => {
    expect(isGone(newRunnerName(), now, now)).toBe(false);
  });
});

describe('requeueAbandoned', () => {
  it('gives the job of a dead process back to the queue', () => {
    const { db, id } = running(`${dead} ${hostname()} x`, 2);
    expect(requeueAbandoned(db, 'me')).toMatchObject([{ id }]);
    expect(jobOf(db, id)).toMatchObject({
      status: 'queued',
      runner: null,
      share: 0,
      step: null,
      attempts: 2
    });
  });

  it('gives it up after three attempts, with a reason and an event', () => {
    const { db, id } = running(`${dead} ${hostname()} x`, 3);
    requeueAbandoned(db, 'me', 99);
    expect(jobOf(db, id)).toMatchObject({ status: 'failed', endedAt: 99 });
    expect(jobOf(db, id).reason).toMatch(/^The server ended three times/);
    expect(db.select().from(event).where(eq(event.action, 'job.fail')).all()).toMatchObject([{ thing: id }]);
  });

  it('leaves alone what runs elsewhere, and what is its own', () => {
    const elsewhere = running('1 elsewhere x', 1);
    expect(requeueAbandoned(elsewhere.db, 'me')).toEqual([]);
    const own = running('me', 1, 0);
    expect(requeueAbandoned(own.db, 'me')).toEqual([]);
  });
});

describe('requeueOwn', () => {
  it('counts a stop in good order as no attempt', () => {
    const { db, id } = running('me', 3);
    requeueOwn(db, 'me');
    expect(jobOf(db, id)).toMatchObject({ status: 'queued', attempts: 2 });
  });
});
