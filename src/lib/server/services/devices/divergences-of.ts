import { inArray, sql } from 'drizzle-orm';
import type { KnownDivergence } from '../../../stats/versions/divergence-limit';
import type { CellDiagnosis } from '../../../stats/versions/types';
import type { Database } from '../../db/client';
import { report } from '../../db/schema';

export interface ReportDivergence {
  told: NonNullable<CellDiagnosis['divergence']>;
  /** What a limit is made from, but for the shots; null where no interval was found. */
  known: Omit<KnownDivergence, 'shots'> | null;
}

/** Divergence from the best independent trials, chance taken off, with its interval, by the id of the report; for few reports at once. */
export function divergencesOf(db: Pick<Database, 'select'>, ids: string[]): Map<string, ReportDivergence> {
  const part = (name: string) => sql<number | null>`json_extract(${report.document}, ${`$.fit.${name}`})`;
  const rows = db
    .select({
      id: report.id,
      value: part('divergenceInterval.value'),
      low: part('divergenceInterval.low'),
      high: part('divergenceInterval.high'),
      plugIn: part('divergence'),
      corrected: part('divergenceCorrected')
    })
    .from(report)
    .where(inArray(report.id, ids))
    .all();
  return new Map(
    rows.map(({ id, value, low, high, plugIn, corrected }): [string, ReportDivergence] => {
      const told = { value, low, high };
      if (plugIn === null || corrected === null || low === null || high === null)
        return [id, { told, known: null }];
      // The interval is 1.96 errors to either side, but for ends that were cut at 0.
      const error = Math.max(corrected - low, high - corrected) / 1.96;
      return [id, { told, known: { corrected, chance: plugIn - corrected, error } }];
    })
  );
}
