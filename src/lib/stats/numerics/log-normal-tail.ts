import { logGammaTail } from './log-gamma-tail';

/**
 * ln P(Z ≥ x) for a standard normal Z; negate x for the lower tail.
 *
 * @returns relative error of the probability about 1e-13 down to 1e-300; below that the log has one of 1e-15.
 *
 * Z² is chi-square with one degree of freedom, so P(Z ≥ x) = ½ Q(½, x²/2) for x ≥ 0.
 */
export function logNormalTail(x: number): number {
  const half = logGammaTail('upper', 0.5, (x * x) / 2) - Math.LN2;
  return x >= 0 ? half : Math.log1p(-Math.exp(half));
}
