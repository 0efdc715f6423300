import { deviancePart } from '../numerics/deviance-part';

/**
 * Relative entropy of two coins, D(a‖b) = a ln(a/b) + (1−a) ln((1−a)/(1−b)), in nats.
 *
 * @param a, b probabilities
 * @returns ≥ 0, relative error about 1e-15 also where a is near b; Infinity when b rules out what a allows; NaN
 *   outside 0 … 1
 *
 * Summed as two deviance parts, both ≥ 0: written as above the terms cancel to their last digits at a ≈ b.
 */
export function relativeEntropy(a: number, b: number): number {
  if (!(a <= 1 && b <= 1)) return NaN;
  return deviancePart(a, b, a - b) + deviancePart(1 - a, 1 - b, b - a);
}
