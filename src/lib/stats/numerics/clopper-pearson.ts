import { logBinomialPmf } from './log-binomial-pmf';
import { logBinomialTail } from './log-binomial-tail';
import { newtonOnTail } from './newton-on-tail';
import { normalQuantile } from './normal-quantile';

/**
 * Exact (Clopper–Pearson) interval for a probability from k successes in n trials.
 *
 * @param k successes, a whole number 0 … n
 * @param n trials, a whole number ≥ 0 (exact up to 2^53, to rounding above)
 * @param level confidence of the interval, 0 < level < 1
 * @returns `low` with P(X ≥ k) = (1 − level)/2 and `high` with P(X ≤ k) = (1 − level)/2, relative error about
 *   1e-14; 0 … 1 at k = 0, k = n and without trials; NaN for bad input.
 *
 * Newton's steps on the logarithm of the tail, in ln p for the lower and ln(1 − p) for the upper limit: it is
 * concave in these, so the steps settle from any start.
 * Source: Clopper & Pearson 1934, Biometrika 26:404.
 */
export function clopperPearson(k: number, n: number, level = 0.95): { low: number; high: number } {
  if (!(k >= 0 && k <= n && level > 0 && level < 1)) return { low: NaN, high: NaN };
  if (!Number.isInteger(k) || !Number.isInteger(n)) return { low: NaN, high: NaN };
  const tail = (1 - level) / 2;
  const logTail = Math.log(tail);
  const z = -normalQuantile(tail);
  const inside = (p: number) => Math.min(p, 1 - Number.EPSILON / 2);
  const fromHits = (p: number): [number, number] => {
    const value = logBinomialTail('high', k, n, inside(p));
    return [value - logTail, k * Math.exp(logBinomialPmf(k, n, inside(p)) - value)];
  };
  const low = k === 0 ? 0 : inside(newtonOnTail(score(k - 0.5, n, -z), fromHits, 'log'));
  // w = −ln(1 − p), so that a limit near 0 keeps its digits.
  const fromMisses = (w: number): [number, number] => {
    const p = inside(-Math.expm1(-w));
    const value = logBinomialTail('low', k, n, p);
    return [value - logTail, (k - n) * Math.exp(logBinomialPmf(k, n, p) - value)];
  };
  const high = k === n ? 1 : -Math.expm1(-newtonOnTail(-Math.log1p(-score(k + 0.5, n, z)), fromMisses));
  return { low, high };
}

/** Wilson's score limit, the start: within a few parts in a hundred of the exact one unless k is small. */
function score(k: number, n: number, z: number): number {
  const square = z * z;
  const share = (k + square / 2 + z * Math.sqrt(k * (1 - k / n) + square / 4)) / (n + square);
  return Math.min(Math.max(share, 1e-300), 1 - 1e-9);
}
