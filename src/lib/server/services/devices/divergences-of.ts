import { inArray, sql } from 'drizzle-orm';
import type { CellDiagnosis } from '../../../stats/versions/types';
import type { Database } from '../../db/client';
import { report } from '../../db/schema';

/** Divergence from the best independent trials, chance taken off, with its interval, by the id of the report; for few reports at once. */
export function divergencesOf(
  db: Pick<Database, 'select'>,
  ids: string[]
): Map<string, NonNullable<CellDiagnosis['divergence']>> {
  const part = (name: 'value' | 'low' | 'high') =>
    sql<number | null>`json_extract(${report.document}, ${`$.fit.divergenceInterval.${name}`})`;
  const rows = db
    .select({ id: report.id, value: part('value'), low: part('low'), high: part('high') })
    .from(report)
    .where(inArray(report.id, ids))
    .all();
  return new Map(rows.map(({ id, ...told }) => [id, told]));
}
