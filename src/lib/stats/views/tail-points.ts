import { clopperPearson } from '../numerics/clopper-pearson';
import type { TailBounds } from '../nulls/null-law';
import type { DistributionPoint, TailPoint } from '../types';
import type { LawTable } from './law-table';

/**
 * Both tails: share of shots at or beyond each count with its Clopper–Pearson interval, the fitted tail, and
 * three bounds: Chernoff of the fitted law e^{−N I(n/N)}, Chernoff from the mean alone, and Hoeffding's
 * extremal tail (with misreads, what follows from these for kinks as read). Counts above the mean belong to the high side, below to the low side.
 */
export function tailPoints(
  points: DistributionPoint[],
  shots: number,
  table: LawTable,
  bounds: TailBounds
): TailPoint[] {
  const { mean } = table;
  const out: TailPoint[] = [];
  let seen = 0;
  for (const point of points) {
    seen += point.shots;
    // Inside a lump nothing can be told apart: a closing row ends no low tail, an opening one begins no high tail.
    if (point.count < mean && (!point.lump || point.below)) out.push(at(point.count, 'low', seen));
  }
  seen = 0;
  const high: TailPoint[] = [];
  for (const point of [...points].reverse()) {
    seen += point.shots;
    if (point.count > mean && !point.below) high.push(at(point.count, 'high', seen));
  }
  return out.concat(high.reverse());

  function at(count: number, side: 'high' | 'low', tail: number): TailPoint {
    const { low, high: upper } = clopperPearson(tail, shots);
    return {
      count,
      side,
      shots: tail,
      observed: tail / shots,
      low,
      high: upper,
      fitted: side === 'high' ? table.upper(count) : table.lower(count),
      chernoff: Math.exp(-table.rate(count)),
      meanChernoff: Math.exp(bounds.meanChernoff(side, count)),
      hoeffding: Math.exp(bounds.hoeffding(side, count))
    };
  }
}
