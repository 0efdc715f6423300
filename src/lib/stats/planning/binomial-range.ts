import { logBinomialTail } from '../numerics/log-binomial-tail';

/**
 * The shortest run of counts low … high with P(X < low) and P(X > high) at most (1 − level)/2 each, X ~ Bin(n, p).
 *
 * @param n a whole number ≥ 0
 */
export function binomialRange(n: number, p: number, level: number): { low: number; high: number } {
  const tail = Math.log((1 - level) / 2);
  let low = 0;
  let step = Math.max(1, Math.ceil(n * p));
  // P(X ≤ low) grows with low: the least one that is over the tail.
  while (step >= 1) {
    if (low + step - 1 < n && logBinomialTail('low', low + step - 1, n, p) <= tail) low += step;
    else step = Math.floor(step / 2);
  }
  let high = low;
  while (high < n && logBinomialTail('high', high + 1, n, p) > tail) high++;
  return { low, high };
}
