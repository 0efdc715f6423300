import { job } from '$lib/server/db/schema';
import { tellJobChange } from '$lib/server/jobs/job-changes';
import { jobStream } from '$lib/server/services/jobs/job-stream';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeJob, until } from '../../../../support/jobs';
import { makeMember, makeTeam } from '../../../../support/people';

function setting() {
  const db = freshDatabase();
  const actor = makeMember(db, makeTeam(db).id, 'observer');
  const asker = makeMember(db, actor.teamId, 'lead');
  const leaving = new AbortController();
  const reader = jobStream(db, actor, leaving.signal).getReader();
  let text = '';
  let ended = false;
  const reading = (async () => {
    const decoder = new TextDecoder();
    for (;;) {
      const { value, done } = await reader.read();
      if (done) break;
      text += decoder.decode(value);
    }
    ended = true;
  })();
  const untilText = (pattern: RegExp) =>
    until(
      () => text,
      (all) => pattern.test(all),
      5_000
    );
  return { db, actor, asker, leaving, reader, reading, untilText, text: () => text, ended: () => ended };
}

describe('jobStream', () => {
  it('begins with the state of now, and tells of what is queued and of what changes', async () => {
    const { db, asker, leaving, reading, untilText } = setting();
    await untilText(/event: state\ndata: {"queued":0,"running":0}/);
    const id = makeJob(db, asker);
    await untilText(/"queued":1,"running":0/);
    db.update(job).set({ status: 'running', share: 0.5 }).where(eq(job.id, id)).run();
    tellJobChange(asker.teamId, id);
    await untilText(new RegExp(`event: job\\ndata: {"id":"${id}","status":"running".*"share":0.5`));
    leaving.abort();
    await reading;
  });

  it('tells of what another process did, which no one here was told of', async () => {
    const { db, asker, leaving, reading, untilText } = setting();
    const id = makeJob(db, asker);
    await untilText(/"queued":1/);
    db.update(job).set({ status: 'done', endedAt: Date.now() }).where(eq(job.id, id)).run();
    await untilText(new RegExp(`"id":"${id}","status":"done"`));
    leaving.abort();
    await reading;
  });

  it('says nothing of other teams', async () => {
    const { db, leaving, reading, untilText, text } = setting();
    const other = makeMember(db, makeTeam(db).id, 'lead');
    await untilText(/event: state/);
    const id = makeJob(db, other);
    db.update(job).set({ status: 'running' }).run();
    tellJobChange(other.teamId, id);
    await new Promise((resolve) => setTimeout(resolve, 2_500));
    expect(text()).not.toContain('event: job');
    expect(text().match(/event: state/g)).toHaveLength(1);
    leaving.abort();
    await reading;
  });

  it.each([
    ['leaves the team', 'delete from membership where person_id = ?'],
    ['is disabled', 'update person set disabled_at = 1 where id = ?'],
    ['changes the password', 'update person set session_version = 1 where id = ?']
  ])('ends when the reader %s', async (_, sql) => {
    const { db, actor, untilText, ended } = setting();
    await untilText(/event: state/);
    db.$client.prepare(sql).run(actor.personId);
    await until(ended, Boolean, 5_000);
  });

  it('ends when the reader goes away, one way or the other, and when the database is closed', async () => {
    const cancelled = setting();
    await cancelled.untilText(/event: state/);
    await cancelled.reader.cancel();
    const aborted = setting();
    aborted.leaving.abort();
    await until(aborted.ended, Boolean, 1_000);
    const closed = setting();
    closed.db.$client.close();
    await until(closed.ended, Boolean, 5_000);
    const holder = globalThis as { [key: symbol]: Map<string, unknown> | undefined };
    const listened = holder[Symbol.for('severalty.job-listeners')];
    for (const { actor } of [cancelled, aborted, closed]) expect(listened?.has(actor.teamId)).toBe(false);
  });
});
