import { logBinomialTail } from '../numerics/log-binomial-tail';

/** Largest expected number of shots beyond a threshold that still ends the search outward. */
const logNegligible = Math.log(1e-9);

export interface TailSearch {
  side: 'high' | 'low';
  /** Threshold nearest the mean, and the last one that may be tried (Infinity if there is none). */
  first: number;
  last: number;
  /** ln of the largest probability B_n that independent trials allow beyond n; falls outward. */
  logBound: (count: number) => number;
  /** `[count, shots]`, counts ascending; a lump stands at its `from`. */
  counts: [number, number][];
  shots: number;
}

export interface TailFinding {
  side: 'high' | 'low';
  /** Number of thresholds, from `first` outward up to and including the first with S·B_n < 1e-9. */
  thresholds: number;
  /** Most telling threshold; the one nearest the mean where several are equal. */
  count: number;
  /** ln P(Bin(S, B_n) ≥ T_n) there. */
  logP: number;
  logBound: number;
  /** Shots T_n beyond it. */
  tail: number;
}

/**
 * The threshold of one tail at which independent trials are least able to explain the shots beyond it.
 *
 * @returns null when there is no threshold on this side
 *
 * Between two observed counts T_n stays while B_n falls outward, so that only observed counts, and the first and
 * the last threshold, can be the most telling: a mean of 1e12 has millions of thresholds.
 */
export function tailThresholds(search: TailSearch): TailFinding | null {
  const { side, first, logBound, shots } = search;
  const outward = side === 'high' ? 1 : -1;
  if ((search.last - first) * outward < 0) return null;
  const end = lastThreshold(search, outward);
  const rows = outward > 0 ? search.counts : search.counts.toReversed();
  const before = (n: number, count: number) => (count - n) * outward > 0;
  const observed = rows.filter(([n, h]) => h > 0 && before(first, n) && before(n, end)).map(([n]) => n);
  let row = 0;
  let tail = rows.reduce((sum, [, h]) => sum + h, 0);
  let best: TailFinding | null = null;
  for (const count of [first, ...observed, end]) {
    while (row < rows.length && before(rows[row][0], count)) tail -= rows[row++][1];
    const bound = logBound(count);
    const logP = logBinomialTail('high', tail, shots, Math.exp(bound));
    if (best === null || logP < best.logP) {
      const thresholds = Math.abs(end - first) + 1;
      best = { side, thresholds, count, logP, logBound: bound, tail };
    }
  }
  return best;
}

/** Gallops outward to the first negligible threshold, then halves the last stride. */
function lastThreshold({ first, last, logBound, shots }: TailSearch, outward: number): number {
  const furthest = Math.abs(last - first);
  const negligible = (steps: number) => logBound(first + outward * steps) + Math.log(shots) < logNegligible;
  let high = 0;
  let low = -1;
  while (!negligible(high)) {
    if (high >= furthest) return last;
    low = high;
    high = Math.min(furthest, Math.max(1, 2 * high));
  }
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (negligible(middle)) high = middle;
    else low = middle;
  }
  return first + outward * high;
}
