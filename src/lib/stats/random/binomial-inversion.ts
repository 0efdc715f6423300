import type { Generator } from './generator';

/**
 * One draw from Bin(n, p) by inversion: walk up from 0, subtracting f_k from a uniform number. About n·p + 1
 * steps, so for n·p up to about 30 (where it still takes no longer than rejection).
 *
 * f_0 = exp(n·log1p(−p)), f_{k+1} = f_k (n − k)/(k + 1) · p/(1 − p).
 *
 * @param n number of trials, an integer ≥ 0
 * @param p probability, 0 … ½
 * @param logMissed log1p(−p), which callers with a fixed p keep; the logarithm of 1 − p would lose a small p
 * @returns an integer 0 … n; input is not checked
 *
 * Source: Devroye 1986, Non-Uniform Random Variate Generation, ch. X.4 (m).
 */
export function binomialInversion(generator: Generator, n: number, p: number, logMissed: number): number {
  if (n === 0 || p === 0) return 0;
  const odds = p / (1 - p);
  const empty = Math.exp(n * logMissed);
  for (;;) {
    let left = generator.next();
    let probability = empty;
    // P(X > 150) < 1e-50 for n·p ≤ 30: getting there means that rounding left a crumb of the uniform number.
    const top = n < 150 ? n : 150;
    for (let k = 0; k <= top; k++) {
      if (left <= probability) return k;
      left -= probability;
      probability *= (odds * (n - k)) / (k + 1);
    }
  }
}
