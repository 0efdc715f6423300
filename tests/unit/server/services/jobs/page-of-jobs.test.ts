import { job } from '$lib/server/db/schema';
import { pageOfJobs } from '$lib/server/services/jobs/page-of-jobs';
import { eq } from 'drizzle-orm';
import { expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeJob } from '../../../../support/jobs';
import { makeMember, makeTeam } from '../../../../support/people';

it('gives a team’s jobs newest first, page by page, of a status or dataset, and no other team’s', () => {
  const db = freshDatabase();
  const actor = makeMember(db, makeTeam(db).id, 'experimenter');
  const stranger = makeMember(db, makeTeam(db).id, 'lead');
  const ids = [1, 2, 3, 4, 5].map((at) => makeJob(db, actor, 1, at));
  db.update(job).set({ status: 'failed', reason: 'why' }).where(eq(job.id, ids[1])).run();
  const page = (asked: Partial<Parameters<typeof pageOfJobs>[2]>, who = actor) => {
    const found = pageOfJobs(db, who, { limit: 2, ...asked });
    if (!found.ok) throw new Error(found.reason);
    return { ids: found.page.entries.map(({ id }) => id), next: found.page.next };
  };
  const first = page({});
  expect(first.ids).toEqual([ids[4], ids[3]]);
  const second = page({ after: first.next! });
  expect(second.ids).toEqual([ids[2], ids[1]]);
  expect(page({ after: second.next! })).toEqual({ ids: [ids[0]], next: null });
  expect(page({ status: 'failed' })).toEqual({ ids: [ids[1]], next: null });
  const { datasetId } = db.select().from(job).where(eq(job.id, ids[2])).get()!;
  expect(page({ dataset: datasetId, limit: 50 }).ids).toContain(ids[2]);
  expect(page({}, stranger)).toEqual({ ids: [], next: null });
  expect(pageOfJobs(db, actor, { limit: 2, after: 'none' })).toEqual({ ok: false, reason: 'bad-cursor' });
});
