import { sayGroup, type DeviceCell } from '../../../model/team/devices/cell';
import { readKept } from '../../../model/read-kept';
import { toHistogram } from '../../../stats/input/to-histogram';
import type { CountData } from '../../../stats/types';
import type { VersionCell } from '../../../stats/versions/types';
import { inArray } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';

/** What a gate judges of a cell, without its counts: for these its digest stands. */
export type CellFacts = Omit<VersionCell, 'histogram'> & { id: string; digest: string };

/** Datasets without a group, where another group took the name that they would have. */
const NAMELESS = 'no group named';

/** Facts of the datasets that stand for cells. */
export function cellFacts(db: Pick<Database, 'select'>, cells: DeviceCell[]): CellFacts[] {
  const { trials, unit, geometry, misread, kept, digest } = dataset;
  const ids = cells.map((cell) => cell.dataset.id);
  const columns = { id: dataset.id, trials, unit, geometry, misread, kept, digest };
  const rows = db.select(columns).from(dataset).where(inArray(dataset.id, ids)).all();
  const of = new Map(rows.map((row) => [row.id, row]));
  const taken = cells.some(({ group }) => group === sayGroup(null));
  return cells.flatMap((cell): CellFacts[] => {
    const row = of.get(cell.dataset.id);
    if (!row) return [];
    const diagnosis = cell.report ? { verdict: cell.report.verdict, divergence: null } : null;
    const named = {
      group: cell.group === null && taken ? NAMELESS : sayGroup(cell.group),
      version: cell.firmware,
      label: cell.dataset.name
    };
    return [{ ...row, ...named, kept: row.kept === null ? null : readKept(row.kept), diagnosis }];
  });
}

/** The same with their counts, as the mathematics takes them. */
export function withCounts(db: Pick<Database, 'select'>, facts: CellFacts[]): VersionCell[] {
  const ids = facts.map(({ id }) => id);
  const rows = db
    .select({ id: dataset.id, counts: dataset.counts })
    .from(dataset)
    .where(inArray(dataset.id, ids))
    .all();
  const of = new Map(rows.map(({ id, counts }) => [id, JSON.parse(counts) as CountData]));
  return facts.map(({ id, digest: _digest, ...cell }) => ({ ...cell, histogram: toHistogram(of.get(id)!) }));
}
