import type { Generator } from './generator';
import { logGammaSample } from './log-gamma-sample';

/**
 * One draw from the beta law with density x^{a−1} (1−x)^{b−1} / B(a, b): X/(X + Y) with X, Y gamma of shapes a, b,
 * taken through logarithms, so tiny shapes give draws near 0 or 1 and never 0/0.
 *
 * @param a, b shapes, positive and finite
 * @returns a number 0 … 1; 0 and 1 themselves where the draw rounds there
 * @throws RangeError for other shapes
 */
export function betaSample(generator: Generator, a: number, b: number): number {
  const x = logGammaSample(generator, a);
  const y = logGammaSample(generator, b);
  return 1 / (1 + Math.exp(y - x));
}
