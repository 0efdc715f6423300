import { clopperPearson } from '../numerics/clopper-pearson';
import type { DistributionPoint, Histogram } from '../types';
import type { LawTable } from './law-table';

/**
 * Counts against the fitted law: h_n/S with its Clopper–Pearson 95 % interval beside f_n, for each count of
 * the table, and a first and a last row for lumps.
 */
export function distribution(
  histogram: Histogram,
  shots: number,
  trials: number | null,
  table: LawTable
): DistributionPoint[] {
  const seen = new Map(histogram.counts);
  const { lump, below = null } = histogram;
  const point = (count: number, of: number, fitted: number, lumped: boolean): DistributionPoint => {
    const { low, high } = clopperPearson(of, shots);
    return {
      count,
      density: trials ? count / trials : null,
      shots: of,
      observed: of / shots,
      low,
      high,
      fitted,
      lump: lumped
    };
  };
  const out: DistributionPoint[] = [];
  if (below)
    out.push({ ...point(below.to, below.shots, Math.min(1, table.lower(below.to)), true), below: true });
  for (let i = 0; i < table.f.length; i++) {
    const count = table.first + i;
    if (below && count <= below.to) continue;
    if (lump && count >= lump.from) break;
    out.push(point(count, seen.get(count) ?? 0, table.f[i], false));
  }
  if (lump) out.push(point(lump.from, lump.shots, Math.min(1, table.upper(lump.from)), true));
  return out;
}
