import { deviancePart } from './deviance-part';
import { productDifference } from './product-difference';
import { stirlingError } from './stirling-error';

/**
 * ln P(X = k) for X ~ Binomial(n, p).
 *
 * @param k count; −Infinity unless a whole number 0 … n
 * @param n trials, a whole number ≥ 0 (exact up to 2^53)
 * @param p probability, 0 ≤ p ≤ 1
 * @returns absolute error about 1e-15 (1 + |ln P|) at every n; NaN when n or p is out of range.
 *
 * ln P = ½ ln(n / 2πk(n−k)) + δ(n) − δ(k) − δ(n−k) − D(k; np) − D(n−k; nq).
 * Source: Loader 2000.
 */
export function logBinomialPmf(k: number, n: number, p: number): number {
  if (!(p >= 0 && p <= 1) || !(n >= 0) || !Number.isInteger(n)) return NaN;
  if (!Number.isInteger(k) || k < 0 || k > n) return Number.isNaN(k) ? NaN : -Infinity;
  if (p === 0) return k === 0 ? 0 : -Infinity;
  if (p === 1) return k === n ? 0 : -Infinity;
  if (k === 0) return n * Math.log1p(-p);
  const rest = n - k;
  // ln p is well conditioned near 1 only by way of 1 − p, which is exact there.
  if (rest === 0) return n * (p > 0.5 ? Math.log1p(p - 1) : Math.log(p));
  const difference = productDifference(k, n, p);
  const deviance = deviancePart(k, n * p, difference) + deviancePart(rest, n * (1 - p), -difference);
  const stirling = stirlingError(n) - stirlingError(k) - stirlingError(rest);
  return stirling - deviance - 0.5 * Math.log(2 * Math.PI * k * (rest / n));
}
