import { openDatabase } from '$lib/server/db/client';
import { migrateDatabase } from '$lib/server/db/migrate';
import { dataset } from '$lib/server/db/schema';
import { claimJob, type Turns } from '$lib/server/jobs/claim-job';
import { enqueueJobs } from '$lib/server/services/jobs/enqueue-jobs';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../support/fresh-database';
import { jobOf, makeJob } from '../../../support/jobs';
import { makeMember, makeTeam } from '../../../support/people';
import { makeDataset } from '../../../support/saved-reports';

const lead = (db: ReturnType<typeof freshDatabase>) => makeMember(db, makeTeam(db).id, 'lead');

describe('claimJob', () => {
  it('gives nothing when nothing waits', () => {
    expect(claimJob(freshDatabase(), 'r', new Map())).toBeNull();
  });

  it('takes the oldest of a team, and says so in the row', () => {
    const db = freshDatabase();
    const actor = lead(db);
    makeJob(db, actor, 1, 20);
    const older = makeJob(db, actor, 1, 10);
    const claimed = claimJob(db, 'the runner', new Map(), 77);
    expect(claimed).toMatchObject({ id: older, teamId: actor.teamId });
    expect(JSON.parse(claimed!.options)).toMatchObject({ trials: 12, resamples: 19 });
    expect(jobOf(db, older)).toMatchObject({
      status: 'running',
      runner: 'the runner',
      attempts: 1,
      startedAt: 77,
      heartbeatAt: 77
    });
  });

  it('keeps the order in which jobs of one moment were asked for', () => {
    const db = freshDatabase();
    const actor = lead(db);
    const asked = Array.from({ length: 12 }, () => makeJob(db, actor, 1, 5));
    const taken = asked.map(() => claimJob(db, 'r', new Map())!.id);
    expect(taken).toEqual(asked);
  });

  it('lets one job of a team pass 500 of another that came before', () => {
    const db = freshDatabase();
    const many = lead(db);
    const one = lead(db);
    const datasets = Array.from({ length: 500 }, () => makeDataset(db, many.teamId));
    expect(enqueueJobs(db, many, datasets, {}, 0)).toMatchObject({ ok: true });
    const late = makeJob(db, one, 1, 10_000);
    const turns: Turns = new Map();
    const first = [claimJob(db, 'r', turns)!.id, claimJob(db, 'r', turns)!.id];
    expect(first).toContain(late);
  });

  it('goes round the teams on a single thread too', () => {
    const db = freshDatabase();
    const teams = [lead(db), lead(db), lead(db)];
    for (const [i, team] of teams.entries()) for (let j = 0; j < 4; j++) makeJob(db, team, 1, i * 100 + j);
    const turns: Turns = new Map();
    const order = Array.from({ length: 9 }, () => {
      const { id, teamId } = claimJob(db, 'r', turns)!;
      db.$client.prepare(`update job set status = 'done' where id = ?`).run(id);
      return teams.findIndex((team) => team.teamId === teamId);
    });
    expect(order).toEqual([0, 1, 2, 0, 1, 2, 0, 1, 2]);
  });

  it('gives each job to one of two connections only', () => {
    const folder = mkdtempSync(join(tmpdir(), 'severalty-claim-'));
    const [one, two] = [0, 1].map(() => openDatabase(join(folder, 'jobs.sqlite')));
    migrateDatabase(one);
    const actor = lead(one);
    for (let i = 0; i < 10; i++) makeJob(one, actor, 1, i);
    const taken = Array.from({ length: 6 }, () => [
      claimJob(one, 'one', new Map())?.id,
      claimJob(two, 'two', new Map())?.id
    ]).flat();
    expect(new Set(taken).size).toBe(11);
    expect(taken.slice(10)).toEqual([undefined, undefined]);
    one.$client.close();
    two.$client.close();
    rmSync(folder, { recursive: true });
  });

  it('brings no counts of a dataset that was put aside', () => {
    const db = freshDatabase();
    makeJob(db, lead(db));
    db.update(dataset).set({ deletedAt: 1 }).run();
    expect(claimJob(db, 'r', new Map())!.counts).toBeNull();
  });
});
