import { findRoot } from '../numerics/find-root';
import { logGammaTail } from '../numerics/log-gamma-tail';
import { logNormalTail } from '../numerics/log-normal-tail';
import { unbroken, type Pace } from '../resampling/pace';
import { autocorrelations } from './autocorrelations';
import { ljungBox } from './ljung-box';
import { LONGEST_PERMUTED, SMALLEST_LIMIT_P, type OrderOptions, type OrderOutcome } from './order-outcome';
import { permute } from './permute';
import { runsCount } from './runs-count';
import { runsCut } from './runs-cut';
import { runsMoments } from './runs-moments';

/** The two parts of the test. */
export interface OrderDetails {
  /** Ljung–Box over lags 1 … `lags`, and its p-value by chi-square. */
  ljungBox: number;
  lags: number;
  ljungBoxP: number;
  /** Runs about the most even cut, how many are expected, and the two-sided p-value by the normal law. */
  runs: number;
  runsExpected: number;
  runsP: number;
}

/**
 * Does the order of the shots mean anything? Ljung–Box over lags 1 … min(10, S/5), and runs about the most even cut,
 * two-sided; each turned to a p-value by its limit law, and the smaller of the two is the statistic (as −ln p, so
 * larger is worse; Tippett 1931). One p-value then, from permutations of the shots, which needs neither the limit
 * laws to hold nor the two parts to be independent. Turning by ranks among the permutations instead would do the
 * same, but no permutation could be judged before all are drawn, and the sequential rule needs that.
 *
 * Permutations up to 20 000 shots, with the sequential rule of `SequentialP`. Above, where many neighbours differ,
 * p = 1 − (1 − p_min)² (Šidák): at 20 001 and 50 000 shots of means 0.3 to 20 it calls 0.047 to 0.052 of permutations
 * at 5 %, 0.009 to 0.012 at 1 % and 0.001 at 0.1 % (3000 to 10 000 permutations each).
 *
 * @param pace told how far the permutations are, and called for each
 * @returns not run, with a reason, for fewer than 5 shots or shots all alike
 *
 * Source: Ljung & Box 1978, Biometrika 65:297; Wald & Wolfowitz 1940, Ann. Math. Statist. 11:147; Tippett 1931,
 * The Methods of Statistics (m); Besag & Clifford 1991, Biometrika 78:301.
 */
export async function orderTest(
  shots: ArrayLike<number>,
  options: OrderOptions,
  pace: Pace = unbroken
): Promise<OrderOutcome<OrderDetails>> {
  const series = Float64Array.from(shots);
  const { length } = series;
  const lags = Math.min(10, Math.floor(length / 5));
  if (lags < 1) return { ok: false, reason: 'Fewer than 5 shots.' };
  const cut = runsCut(series);
  if (cut === null) return { ok: false, reason: 'All shots have the same count.' };

  const above = series.reduce((sum, n) => sum + (n > cut ? 1 : 0), 0);
  const moments = runsMoments(above, length - above);
  const deviation = Math.sqrt(moments.variance);
  const serial = (order: Float64Array) => ljungBox(length, autocorrelations(order, lags));
  const offRuns = (order: Float64Array) => Math.abs(runsCount(order, cut) - moments.mean) / deviation;

  const q = serial(series);
  const z = offRuns(series);
  const logSerialP = logSerial(q, lags);
  const logRunsP = logRuns(z);
  const logP = Math.min(logSerialP, logRunsP);
  const details = {
    ok: true,
    statistic: -logP,
    ljungBox: q,
    lags,
    ljungBoxP: Math.exp(logSerialP),
    runs: runsCount(series, cut),
    runsExpected: moments.mean,
    runsP: Math.exp(logRunsP)
  } as const;
  if (length > LONGEST_PERMUTED && limitHolds(series, above)) {
    // 1 − (1 − p)², without losing a small p.
    const p = Math.max(SMALLEST_LIMIT_P, Math.exp(logP) * (2 - Math.exp(logP)));
    return { ...details, p, smallestP: SMALLEST_LIMIT_P, resamples: 0, stoppedEarly: false, source: 'limit' };
  }
  // What either statistic must reach to be as extreme, so that no tail is computed for each permutation.
  const qReached = logP === logSerialP ? q : findRoot((x) => logSerial(x, lags) - logP, 0, 100 - 10 * logP);
  const zReached = logP === logRunsP ? z : findRoot((x) => logRuns(x) - logP, 0, 10 - logP);
  const reaches = (order: Float64Array) =>
    offRuns(order) >= zReached * (1 - 1e-12) || serial(order) >= qReached * (1 - 1e-12);
  return { ...details, ...(await permute(series, reaches, options, pace)) };
}

/** ln P(χ² ≥ q). */
function logSerial(q: number, lags: number): number {
  return logGammaTail('upper', lags / 2, q / 2);
}

/** ln P(|Z| ≥ z); 0 rather than a rounding error above it. */
function logRuns(z: number): number {
  return Math.min(0, Math.LN2 + logNormalTail(z));
}

/**
 * Whether both statistics are near enough to their limit laws: products of neighbouring shots, and neighbours that
 * are both in the smaller half, must be many. Both are scarce when counts are mostly alike.
 */
function limitHolds(series: Float64Array, above: number): boolean {
  const { length } = series;
  const mean = series.reduce((sum, n) => sum + n, 0) / length;
  let square = 0;
  let fourth = 0;
  for (const n of series) {
    square += (n - mean) ** 2;
    fourth += (n - mean) ** 4;
  }
  const kurtosis = (length * fourth) / (square * square);
  const smaller = Math.min(above, length - above);
  return (kurtosis * kurtosis) / length <= 0.01 && length / (smaller * smaller) <= 0.01;
}
