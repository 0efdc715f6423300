import { eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { remark } from '../../db/schema';
import { recordEvent } from '../events/record-event';
import { signRemark, type RemarkAuthor } from './remark-author';
import { threadFor } from './thread-for';

export type SettleThread =
  /** `changed`: false when somebody had done the same before. */
  { ok: true; changed: boolean } | { ok: false; reason: 'unknown' | 'not-allowed' | 'name' };

/** Settles a thread, or opens it again: whoever may remark in it may do either. The first to settle is kept. */
export function settleThread(
  db: Database,
  author: RemarkAuthor,
  { reportId, threadId, settled }: { reportId: string; threadId: string; settled: boolean },
  now = Date.now()
): SettleThread {
  return db.transaction(
    (tx): SettleThread => {
      const signed = signRemark(tx, author, reportId, now);
      if (!signed.ok) return signed;
      const { teamId, shownPersonId, linkId, shownAt } = signed.signature;
      const thread = threadFor(tx, reportId, threadId, linkId);
      if (!thread) return { ok: false, reason: 'unknown' };
      if ((thread.settledAt !== null) === settled) return { ok: true, changed: false };
      // Where the link hides referees nobody is noted: the name would show.
      tx.update(remark)
        .set(settled ? { settledAt: now, settledBy: shownPersonId } : { settledAt: null, settledBy: null })
        .where(eq(remark.id, threadId))
        .run();
      recordEvent(
        tx,
        {
          action: settled ? 'remark.settle' : 'remark.reopen',
          teamId,
          personId: shownPersonId,
          linkId,
          thing: reportId,
          detail: { section: thread.section }
        },
        shownAt
      );
      return { ok: true, changed: true };
    },
    { behavior: 'immediate' }
  );
}
