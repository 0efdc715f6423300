import type { Generator } from './generator';
import { normalSample } from './normal-sample';

/**
 * Logarithm of one draw from the gamma law of the given shape a, density of the draw x^{a−1} e^{−x} / Γ(a).
 * The logarithm, since for a below about 0.01 the draw itself is often under the smallest double.
 *
 * For a ≥ 1: X = d·v, d = a − 1/3, v = (1 + z/√(9d))³, z normal, accepted when ln u < z²/2 + d − dv + d ln v
 * (95 to 99.9 % of tries). For a < 1: the draw for a + 1 times u^{1/a}.
 *
 * @param shape a > 0, finite
 * @throws RangeError for any other shape
 *
 * Source: Marsaglia & Tsang 2000, ACM Trans. Math. Softw. 26:363.
 */
export function logGammaSample(generator: Generator, shape: number): number {
  if (!(shape > 0 && shape < Infinity))
    throw new RangeError(`shape must be positive and finite, not ${shape}`);
  if (shape < 1) return logGammaSample(generator, shape + 1) + Math.log(generator.next()) / shape;
  const d = shape - 1 / 3;
  const c = 1 / Math.sqrt(9 * d);
  for (;;) {
    const z = normalSample(generator);
    const root = 1 + c * z;
    if (root <= 0) continue;
    const v = root * root * root;
    const logV = Math.log(v);
    if (Math.log(generator.next()) < 0.5 * z * z + d * (1 - v + logV)) return Math.log(d) + logV;
  }
}
