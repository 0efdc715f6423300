import { sql } from 'drizzle-orm';
import { report } from '../../db/schema';

/** Threads of remarks on a report. */
export const threads = sql<number>`(select count(*) from remark t where t.report_id = ${report.id} and t.thread_id is null)`;

/** Those of them that are not settled. */
export const openThreads = sql<number>`(select count(*) from remark t where t.report_id = ${report.id}
  and t.thread_id is null and t.settled_at is null)`;
