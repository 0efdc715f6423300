import { centralTail } from './central-tail';
import { continuedFraction } from './continued-fraction';
import { logBinomialPmf } from './log-binomial-pmf';
import { logOneMinusExp } from './log-one-minus-exp';
import { productDifference } from './product-difference';

/**
 * ln P(X ≥ k) (`high`) or ln P(X ≤ k) (`low`) for X ~ Binomial(n, p).
 *
 * @param k count; a fraction is rounded to the next count inside the tail
 * @param n trials, a whole number ≥ 0 (exact up to 2^53, to rounding above)
 * @param p probability, 0 ≤ p ≤ 1
 * @returns ≤ 0; the probability has a relative error of about 1e-13 down to 1e-300, and below that the log
 *   itself has one of 1e-15. −Infinity where the tail is empty, NaN when n or p is out of range.
 *
 * On the tail's own side of the mean: pmf times a continued fraction with positive terms, 170/z² steps at z
 * standard deviations. At z < 1.5 with a variance over 1000: the contour integral of `centralTail`. On the
 * other side: one minus the opposite tail, which is then at most about ½, so no digits are lost.
 * Sources: Loader 2000; Didonato & Morris 1992, ACM TOMS 18:360 (eq. 9); Daniels 1987.
 */
export function logBinomialTail(side: 'high' | 'low', k: number, n: number, p: number): number {
  if (!(p >= 0 && p <= 1) || !(n >= 0) || !Number.isInteger(n) || Number.isNaN(k)) return NaN;
  const count = side === 'high' ? Math.ceil(k) : Math.floor(k);
  if (side === 'high' ? count <= 0 : count >= n) return 0;
  if (side === 'high' ? count > n : count < 0) return -Infinity;
  // Now 1 ≤ k ≤ n (high) or 0 ≤ k ≤ n − 1 (low).
  if (p === 0) return side === 'high' ? -Infinity : 0;
  if (p === 1) return side === 'high' ? 0 : -Infinity;
  const excess = productDifference(count, n, p);
  if (side === 'high') {
    if (excess >= 0) return outerTail('high', count, n, p, excess);
    return logOneMinusExp(outerTail('low', count - 1, n, p, excess - 1));
  }
  if (excess <= 0) return outerTail('low', count, n, p, excess);
  return logOneMinusExp(outerTail('high', count + 1, n, p, excess + 1));
}

/** The tail that starts at k and leads away from the mean; `excess` is k − np. */
function outerTail(side: 'high' | 'low', k: number, n: number, p: number, excess: number): number {
  const q = 1 - p;
  const variance = n * p * q;
  const sign = side === 'high' ? 1 : -1;
  const outward = sign * excess;
  if (variance >= 1000 && outward < 1.5 * Math.sqrt(variance)) {
    return Math.log(centralTail(outward, variance, sign * (q - p), p * q));
  }
  const logPmf = logBinomialPmf(k, n, p);
  // The low tail is the high tail of n − X, with p and q exchanged.
  return side === 'high'
    ? logPmf + Math.log(tailOverPmf(k, n, p, q, outward))
    : logPmf + Math.log(tailOverPmf(n - k, n, q, p, outward));
}

/** P(X ≥ k)/P(X = k), from the continued fraction of the incomplete beta function I_p(k, n−k+1). */
function tailOverPmf(k: number, n: number, p: number, q: number, excess: number): number {
  // λ + 1 of the paper is excess + q here: excess − p + 1 would cancel when p is near 1.
  const first = (k * (excess + q)) / (k + 1);
  const fraction = continuedFraction(first, (j, into) => {
    const middle = k + 2 * j;
    const share = (j * ((n - k + 1 - j) * p)) / (middle - 1);
    into.numerator = (share * (k + j - 1) * ((n + j) * p)) / (middle - 1);
    into.denominator = j + share + ((k + j) * (excess + q + j * (1 + q))) / (middle + 1);
  });
  return k * q * fraction;
}
