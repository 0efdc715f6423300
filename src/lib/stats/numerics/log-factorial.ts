import { logGamma } from './log-gamma';

/** ln 0! … ln 170!: products stay below the largest double, and their logarithms are right to 1e-16. */
const table = factorialLogs(170);

/**
 * ln n! for a whole number n ≥ 0.
 *
 * @returns relative error about 1e-15; NaN unless n is a whole number ≥ 0.
 */
export function logFactorial(n: number): number {
  if (!(n >= 0) || !Number.isInteger(n)) return NaN;
  return n < table.length ? table[n] : logGamma(n + 1);
}

function factorialLogs(largest: number): number[] {
  const logs = [0];
  let product = 1;
  for (let n = 1; n <= largest; n++) {
    product *= n;
    logs.push(Math.log(product));
  }
  return logs;
}
