import { event, remark } from '$lib/server/db/schema';
import { addRemark } from '$lib/server/services/remarks/add-remark';
import { settleThread } from '$lib/server/services/remarks/settle-thread';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { given, remarkSetting } from '../../../../support/remark-setting';

describe('settleThread', () => {
  it('notes who settled it first, and opens it again', async () => {
    const { db, maker, observer, member, say, reportId } = await remarkSetting();
    const { threadId } = given(addRemark(db, member(maker), say('x')));
    const settle = (actor: typeof maker, settled: boolean, now: number) =>
      settleThread(db, member(actor), { reportId, threadId, settled }, now);
    const row = () => db.select().from(remark).where(eq(remark.id, threadId)).get()!;
    expect(settle(observer, true, 5)).toEqual({ ok: true, changed: true });
    expect(settle(maker, true, 6)).toEqual({ ok: true, changed: false });
    expect(row()).toMatchObject({ settledAt: 5, settledBy: observer.personId });
    expect(settle(maker, false, 7)).toEqual({ ok: true, changed: true });
    expect(row()).toMatchObject({ settledAt: null, settledBy: null });
    const told = db.select().from(event).all();
    expect(told.map(({ action }) => action).slice(-2)).toEqual(['remark.settle', 'remark.reopen']);
  });

  it('knows first remarks only, of this report and this team', async () => {
    const { db, maker, stranger, member, say, reportId } = await remarkSetting();
    const { threadId } = given(addRemark(db, member(maker), say('x')));
    const answer = given(addRemark(db, member(maker), say('y', threadId)));
    const unknown = { ok: false, reason: 'unknown' };
    const ask = (actor: typeof maker, report: string, thread: string) =>
      settleThread(db, member(actor), { reportId: report, threadId: thread, settled: true });
    expect(ask(maker, reportId, answer.id)).toEqual(unknown);
    expect(ask(maker, 'other', threadId)).toEqual(unknown);
    expect(ask(stranger, reportId, threadId)).toEqual(unknown);
  });

  it('notes no person where the link hides referees', async () => {
    const { db, makeLink, makePerson, referee, say, reportId } = await remarkSetting();
    const id = makeLink({ hidesReferees: true });
    const ruth = referee(id, '', makePerson('Ruth').id);
    const { threadId } = given(addRemark(db, ruth, say('x')));
    expect(settleThread(db, ruth, { reportId, threadId, settled: true }, 9).ok).toBe(true);
    expect(db.select().from(remark).get()).toMatchObject({ settledAt: 9, settledBy: null });
  });
});
