import { evenDispersionFactors } from '../moments/even-dispersion-factors';
import type { Interval } from '../types';
import type { BatchParts } from './batch-parts';
import type { BatchOrder, BatchSplit } from './types';
import type { WithinBatches } from './within-batches';

/** More batches than this are not listed one by one. */
const mostListed = 200;
/** Fewer shots beside the batches' means than this are never called compatible, as in the answer. */
const fewest = 50;

/**
 * The excess of a shot list, split by batch, and whether it is still there within batches.
 *
 * Within: the pooled variance less the mean ceiling of the batches. Between: the rest. The variance of the batches' true
 * means has limits by chi-square of the mean square between batches (B − 1 degrees of freedom), the variance within
 * taken as known; a limit below 0 is 0.
 *
 * Verdict: `excess` where the pooled test and the batches one by one, allowed for together (2·min(p, tested·p of the
 * worst)), are at or under α; `compatible` where not, and the upper 95 % limit of the dispersion within batches is below
 * 1 + tolerance; otherwise `undecided`. An excess within batches is `undecided` too where their neighbouring shots resemble
 * each other and show no excess between them (the lower 95 % limit is at or under 1): drift inside batches makes that.
 *
 * @param order of the shots within their batches
 * @param excess variance of all shots less its ceiling
 */
export function splitExcess(
  parts: BatchParts,
  found: WithinBatches,
  order: BatchOrder | null,
  excess: number,
  { alpha, tolerance }: { alpha: number; tolerance: number }
): BatchSplit {
  const { dispersion, ceiling, freedom, p, lines } = found;
  const times = (factor: number | null) => (factor === null ? null : (factor - 1) * ceiling);
  const inside = parts.within - ceiling;
  const tested = lines.filter((line) => line.p !== null);
  const worst = tested.length > 0 ? tested.reduce((a, b) => (b.p! < a.p! ? b : a)) : null;
  const single = worst === null ? null : Math.min(1, tested.length * worst.p!);
  const together = p === null ? single : single === null ? p : Math.min(1, 2 * Math.min(p, single));
  const decided = together !== null && together <= alpha;
  const drifting = insideBatches(order);
  const narrow = dispersion.high !== null && dispersion.high < 1 + tolerance && freedom >= fewest;
  return {
    batches: lines.length,
    dispersion,
    excessWithin: {
      value: dispersion.value === null ? null : inside,
      low: times(dispersion.low),
      high: times(dispersion.high)
    },
    excessBetween: excess - inside,
    excess,
    meansVariance: meansVariance(parts),
    p,
    smallestP: found.smallestP,
    source: found.source,
    resamples: found.resamples,
    tested: tested.length,
    worst,
    pTogether: together,
    order,
    verdict: decided
      ? drifting
        ? 'undecided'
        : 'excess'
      : together !== null && narrow
        ? 'compatible'
        : 'undecided',
    each: lines.length > mostListed ? [] : lines
  };
}

/** Whether slow changes inside batches would do for what is seen there. */
export const insideBatches = (order: BatchOrder | null | undefined): boolean =>
  !!order?.moved && order.dispersion.low !== null && order.dispersion.low <= 1;

function meansVariance({ within, between, size, batches }: BatchParts): Interval {
  const square = within + size * between;
  const { low, high } = evenDispersionFactors(batches.length, null, 0.025);
  const at = (factor: number) => Math.max(0, (square * factor - within) / size);
  return { value: between, low: at(low), high: at(high) };
}
