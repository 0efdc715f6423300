import { stirlingError } from './stirling-error';

/**
 * ln C(n, k), the logarithm of the number of ways to choose k of n.
 *
 * @param n whole number ≥ 0 (exact up to 2^53)
 * @param k whole number; −Infinity outside 0 … n
 * @returns relative error about 1e-15; NaN unless both are whole and n ≥ 0.
 *
 * k ln(n/k) − (n−k) ln(1 − k/n) − ½ ln(2πk(n−k)/n) + δ(n) − δ(k) − δ(n−k) with k ≤ n/2:
 * the leading terms are positive, where ln n! − ln k! − ln (n−k)! would lose all digits at n = 2^53.
 */
export function logChoose(n: number, k: number): number {
  if (!(n >= 0) || !Number.isInteger(n) || !Number.isInteger(k)) return NaN;
  if (k < 0 || k > n) return -Infinity;
  const few = Math.min(k, n - k);
  if (few === 0) return 0;
  if (few === 1) return Math.log(n);
  const rest = n - few;
  const stirling = stirlingError(n) - stirlingError(few) - stirlingError(rest);
  const entropy = few * Math.log(n / few) - rest * Math.log1p(-few / n);
  return entropy - 0.5 * Math.log(2 * Math.PI * few * (rest / n)) + stirling;
}
