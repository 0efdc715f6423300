import { logHoeffdingTail } from '../bounds/log-hoeffding-tail';

/** What is known of the mean number of true kinks: between `low` and `high`. */
export interface KinkMean {
  low: number;
  high: number;
}

/** Bound of a tail for trials of a given mean; logHoeffdingTail unless another is asked for. */
type TailBound = (side: 'high' | 'low', count: number, mean: number, trials: number) => number;

/**
 * Natural logarithm of a bound for the tail of the count read, whatever the probabilities of the independent kinks.
 *
 * Given which T = t bonds the misreads toggle, the count is a sum of N independent trials. Its mean lies between
 * |κ − t| and κ + t − 2·max(0, κ − (N − t)) for κ kinks on the mean: toggled bonds hold between max(0, κ − (N − t)) and
 * min(t, κ) of them, and give 1 − p in place of p. So P(X ≥ n) ≤ Σ_t P(T = t)·H(largest mean, n), H Hoeffding's bound,
 * and P(X ≤ n) likewise with the smallest mean; T depends on ε alone.
 *
 * @param toggled P(T = t) at index t, see toggledLaw
 * @param kinks limits of the mean number of true kinks; the bound holds for every mean within
 * @param bound another bound for independent trials that grows toward the tail with the mean
 */
export function logMisreadTail(
  side: 'high' | 'low',
  count: number,
  kinks: KinkMean,
  toggled: Float64Array,
  bound: TailBound = logHoeffdingTail
): number {
  const bonds = toggled.length - 1;
  let sum = 0;
  for (let t = bonds; t >= 0; t--) {
    // Under 1e-300 a term adds nothing to a bound that is looked at; kept whole, at 1, it is on the safe side.
    if (toggled[t] < 1e-300) sum += toggled[t];
    else sum += toggled[t] * Math.exp(bound(side, count, extremeMean(side, kinks, t, bonds), bonds));
  }
  return Math.log(Math.min(1, sum));
}

function extremeMean(side: 'high' | 'low', { low, high }: KinkMean, t: number, bonds: number): number {
  if (side === 'low') return Math.max(0, low - t, t - high);
  // Rises with κ up to N − t, then falls.
  const kinks = Math.min(high, Math.max(low, bonds - t));
  return Math.min(bonds, kinks + t - 2 * Math.max(0, kinks - (bonds - t)));
}
