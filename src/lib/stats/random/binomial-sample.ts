import { binomialInversion } from './binomial-inversion';
import { binomialRejection } from './binomial-rejection';
import type { Generator } from './generator';

/**
 * One draw from the binomial law Bin(n, p), exact in law; about the same time whatever n is.
 *
 * For min(p, 1 − p)·n < 10 the distribution function is inverted, else transformed rejection is used (Hörmann
 * 1993). Both hold for n up to 2^53: the only departure from the law is that n·p is rounded to a double, which
 * is the same as a relative change of p by 1e-16.
 *
 * @param n number of trials, an integer 0 … 2^53 − 1
 * @param p probability, 0 … 1
 * @returns an integer 0 … n
 * @throws RangeError for anything else, NaN included
 */
export function binomialSample(generator: Generator, n: number, p: number): number {
  if (!(n >= 0 && n <= Number.MAX_SAFE_INTEGER && Math.floor(n) === n)) {
    throw new RangeError(`n must be an integer 0 … 2^53 − 1, not ${n}`);
  }
  if (!(p >= 0 && p <= 1)) throw new RangeError(`p must lie in 0 … 1, not ${p}`);
  // 1 − p is exact for p ≥ ½, so the mirror image costs nothing.
  if (p > 0.5) return n - lowerHalf(generator, n, 1 - p);
  return lowerHalf(generator, n, p);
}

function lowerHalf(generator: Generator, n: number, p: number): number {
  if (n * p >= 10) return binomialRejection(generator, n, p);
  return binomialInversion(generator, n, p, Math.log1p(-p));
}
