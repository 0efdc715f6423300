import type { Generator } from './generator';
import { logGammaSample } from './log-gamma-sample';

/**
 * One draw from the gamma law with density x^{a−1} e^{−x} / Γ(a): mean and variance both a.
 *
 * @param shape a > 0, finite; draws for shapes below 1e-2 may underflow to 0, where `logGammaSample` does not
 * @throws RangeError for any other shape
 */
export function gammaSample(generator: Generator, shape: number): number {
  return Math.exp(logGammaSample(generator, shape));
}
