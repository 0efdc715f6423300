import { logPoissonPmf } from './log-poisson-pmf';
import { logPoissonTail } from './log-poisson-tail';
import { newtonOnTail } from './newton-on-tail';
import { normalQuantile } from './normal-quantile';

/**
 * Exact interval for the mean of a Poisson count.
 *
 * @param k the count, a whole number ≥ 0
 * @param level confidence of the interval, 0 < level < 1
 * @returns `low` with P(X ≥ k) = (1 − level)/2 (0 at k = 0) and `high` with P(X ≤ k) = (1 − level)/2, relative
 *   error about 1e-14; NaN for bad input.
 *
 * Source: Garwood 1936, Biometrika 28:437. Newton's steps as in `clopperPearson`, in ln m below and in m above.
 */
export function poissonInterval(k: number, level = 0.95): { low: number; high: number } {
  if (!(k >= 0 && level > 0 && level < 1) || !Number.isInteger(k)) return { low: NaN, high: NaN };
  const tail = (1 - level) / 2;
  const logTail = Math.log(tail);
  const z = -normalQuantile(tail);
  const fromAbove = (mean: number): [number, number] => {
    const value = logPoissonTail('high', k, mean);
    return [value - logTail, k * Math.exp(logPoissonPmf(k, mean) - value)];
  };
  const fromBelow = (mean: number): [number, number] => {
    const value = logPoissonTail('low', k, mean);
    return [value - logTail, -Math.exp(logPoissonPmf(k, mean) - value)];
  };
  const low = k === 0 ? 0 : newtonOnTail(score(k - 0.5, -z), fromAbove, 'log');
  const high = newtonOnTail(score(k + 0.5, z), fromBelow);
  return { low, high };
}

/** Mean at which k lies z standard deviations away, the start. */
function score(k: number, z: number): number {
  return Math.max(k + (z * z) / 2 + z * Math.sqrt(k + (z * z) / 4), 1e-300);
}
