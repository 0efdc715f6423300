import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { remark } from '../../db/schema';

/**
 * The thread of a report that an author may answer and settle: members any of it, those who came by a link only
 * threads that were begun through it. The team's own threads and those of other links do not exist for them.
 */
export function threadFor(
  db: Pick<Database, 'select'>,
  reportId: string,
  threadId: string,
  linkId: string | null
): { section: string; settledAt: number | null } | undefined {
  return db
    .select({ section: remark.section, settledAt: remark.settledAt })
    .from(remark)
    .where(
      and(
        eq(remark.id, threadId),
        eq(remark.reportId, reportId),
        isNull(remark.threadId),
        linkId === null ? undefined : eq(remark.linkId, linkId)
      )
    )
    .get();
}
