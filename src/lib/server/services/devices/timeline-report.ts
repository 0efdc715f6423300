import { createHash } from 'node:crypto';
import { engineVersion } from '../../../stats/engine-version';
import type { VersionsOptions, VersionsReport } from '../../../stats/versions/types';
import { versionsReport } from '../../../stats/versions/versions-report';
import type { Database } from '../../db/client';
import { withCounts, type CellFacts } from '../gates/gate-cells';

/** Reports kept in memory: one of 50 versions of 100 groups takes some 3 MB. */
const KEPT = 8;

const kept = new Map<string, VersionsReport>();

/**
 * The report of a device's versions, from memory where its datasets and what is asked are the same as before. Counts stand
 * under their digests: reading thousands of them takes longer than all the mathematics.
 */
export async function timelineReport(
  db: Pick<Database, 'select'>,
  facts: CellFacts[],
  options: VersionsOptions
): Promise<VersionsReport> {
  const key = createHash('sha256')
    .update(JSON.stringify([engineVersion, options, facts]))
    .digest('hex');
  const known = kept.get(key);
  const report = known ?? (await versionsReport(withCounts(db, facts), options));
  // What was asked for last goes last.
  kept.delete(key);
  kept.set(key, report);
  for (const old of kept.keys()) {
    if (kept.size <= KEPT) break;
    kept.delete(old);
  }
  return report;
}
