import { normalCdf } from '../numerics/normal-cdf';
import { normalQuantile } from '../numerics/normal-quantile';
import type { DispersionSpread } from './dispersion-spread';

/**
 * Chance that the ceiling test with S shots sees an effect.
 *
 * Variance over ceiling is taken as a shifted gamma variable of the mean, variance and third cumulant that its spread
 * asks for, and that as the cube of a normal one: Z = (2/γ)[(1 + γz/6 − γ²/36)³ − 1]. With many shots it is the plain
 * normal formula; with a hundred, and at low means, the lean decides.
 *
 * @param none spread under equal trials of the same mean, @param some under the effect
 * @param alpha level of the one-sided test, 0 < α < 0.5
 * Source: Wilson & Hilferty 1931, PNAS 17:684 (m), for the cube root.
 */
export function powerOfShots(
  none: DispersionSpread,
  some: DispersionSpread,
  shots: number,
  alpha: number
): number {
  const lean = leanOf(none, shots);
  const z = -normalQuantile(alpha);
  const atCut = Math.abs(lean) < tiny ? z : (2 / lean) * ((1 + (lean * z) / 6 - (lean * lean) / 36) ** 3 - 1);
  const cut = none.ratio + none.bias / shots + atCut * Math.sqrt(none.spread / shots);
  const from = (cut - some.ratio - some.bias / shots) / Math.sqrt(some.spread / shots);
  const other = leanOf(some, shots);
  const score =
    Math.abs(other) < tiny ? from : (6 / other) * (Math.cbrt((other * from) / 2 + 1) - 1) + other / 6;
  return normalCdf(-score);
}

/** Skewness of the ratio of `shots` shots. */
const leanOf = ({ lean, spread }: DispersionSpread, shots: number): number =>
  lean / Math.sqrt(spread ** 3 * shots);

/** Below this the cube loses its digits, and is the normal law. */
const tiny = 1e-6;
