import { compareResults } from '$lib/model/compare/compare-results';
import type { Comparison } from '$lib/model/compare/compared';
import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import type { SavedReport } from './find-report';
import { readReport } from './read-report';

export type CompareReports =
  | { ok: true; first: SavedReport; second: SavedReport; comparison: Comparison }
  | { ok: false; reason: 'unknown' | 'same' | 'other-dataset' }
  /** One of the documents cannot be read; which and why, in words. */
  | { ok: false; reason: 'unreadable'; problem: string };

/** Two reports of one dataset, the older one first whichever way they were asked for. */
export function compareReports(db: Database, actor: Actor, a: string, b: string): CompareReports {
  const read = [readReport(db, actor, a), readReport(db, actor, b)];
  const [one, other] = read;
  if (!one.ok || !other.ok) return { ok: false, reason: 'unknown' };
  if (one.report.id === other.report.id) return { ok: false, reason: 'same' };
  if (one.report.datasetId !== other.report.datasetId) return { ok: false, reason: 'other-dataset' };
  const [first, second] = one.report.number < other.report.number ? [one, other] : [other, one];
  for (const { report, document } of [first, second])
    if (!document.ok)
      return { ok: false, reason: 'unreadable', problem: `report ${report.number}: ${document.problem}` };
  if (!first.document.ok || !second.document.ok) return { ok: false, reason: 'unknown' };
  const comparison = compareResults(
    { document: first.document.diagnosis, options: first.report.options },
    { document: second.document.diagnosis, options: second.report.options }
  );
  return { ok: true, first: first.report, second: second.report, comparison };
}
