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
  if (n === 0) return { low: 0, high: 1 };
  const tail = (1 - level) / 2;
  const z = -normalQuantile(tail);
  // A limit near 1 is found as the distance of the mirrored one from 0: doubles are 1e-16 apart up there.
  const lowStart = score(k - 0.5, n, -z);
  const highStart = score(k + 0.5, n, z);
  return {
    low: lowStart < 0.9 ? lower(k, n, tail, lowStart) : 1 - upper(n - k, n, tail, 1 - lowStart),
    high: highStart < 0.9 ? upper(k, n, tail, highStart) : 1 - lower(n - k, n, tail, 1 - highStart)
  };
}

/** p with P(X ≥ k) = tail, in ln p. */
function lower(k: number, n: number, tail: number, start: number): number {
  if (k === 0) return 0;
  return newtonOnTail(
    start,
    (p) => {
      const value = logBinomialTail('high', k, n, inside(p));
      return [value - Math.log(tail), k * Math.exp(logBinomialPmf(k, n, inside(p)) - value)];
    },
    'log'
  );
}

/** p with P(X ≤ k) = tail, in w = −ln(1 − p), so that a limit near 0 keeps its digits. */
function upper(k: number, n: number, tail: number, start: number): number {
  if (k === n) return 1;
  const w = newtonOnTail(-Math.log1p(-start), (x) => {
    const p = inside(-Math.expm1(-x));
    const value = logBinomialTail('low', k, n, p);
    return [value - Math.log(tail), (k - n) * Math.exp(logBinomialPmf(k, n, p) - value)];
  });
  return -Math.expm1(-w);
}

/** Keeps a step of Newton's below 1, where the tail would have no logarithm. */
function inside(p: number): number {
  return Math.min(p, 1 - Number.EPSILON / 2);
}

/** Wilson's score limit, the start: within a few parts in a hundred of the exact one unless k is small. */
function score(k: number, n: number, z: number): number {
  const square = z * z;
  const share = (k + square / 2 + z * Math.sqrt(Math.max(0, k * (1 - k / n)) + square / 4)) / (n + square);
  return Math.min(Math.max(share, 1e-300), 1 - 1e-16);
}
