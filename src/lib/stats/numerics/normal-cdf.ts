import { logNormalTail } from './log-normal-tail';

/**
 * Standard normal distribution function, P(Z ≤ x); for the upper tail take `normalCdf(-x)`.
 *
 * @returns relative error about 1e-13 down to 1e-300; 0 and 1 at ∓Infinity, NaN for NaN.
 */
export function normalCdf(x: number): number {
  return Math.exp(logNormalTail(-x));
}
