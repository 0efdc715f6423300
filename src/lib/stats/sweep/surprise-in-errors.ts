import { logGammaTail } from '../numerics/log-gamma-tail';

/**
 * z ≥ 0 with P(|normal| ≥ z) = p, from ln p, so that p may lie far below what a number can hold.
 *
 * @param logP ln p ≤ 0
 * @returns to about 1e-12; by halving, between 0 and √(−2 ln p), which the tail never reaches past
 */
export function surpriseInErrors(logP: number): number {
  let [low, high] = [0, Math.sqrt(-2 * logP)];
  for (let step = 0; step < 80; step++) {
    const middle = (low + high) / 2;
    // The square of a normal error is χ² with one degree of freedom.
    if (logGammaTail('upper', 0.5, (middle * middle) / 2) > logP) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
