import type { Verdict } from '$lib/stats/types';
import { and, desc, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { report } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

export interface ReportEntry {
  id: string;
  number: number;
  verdict: Verdict;
  engineVersion: string;
  createdAt: number;
}

/** The reports of one dataset, newest first: for its page, and to choose what to compare with. */
export function reportsOfDataset(db: Database, actor: Actor, datasetId: string): ReportEntry[] {
  return db
    .select({
      id: report.id,
      number: report.number,
      verdict: report.verdict,
      engineVersion: report.engineVersion,
      createdAt: report.createdAt
    })
    .from(report)
    .where(
      and(eq(report.datasetId, datasetId), isNull(report.deletedAt), mayWhere(actor, 'see', report.teamId))
    )
    .orderBy(desc(report.number))
    .all();
}
