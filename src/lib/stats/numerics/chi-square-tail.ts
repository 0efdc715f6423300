import { logGammaTail } from './log-gamma-tail';

/**
 * Upper tail of the chi-square distribution, P(χ² ≥ x) = Q(df/2, x/2).
 *
 * @param x statistic; the tail is 1 at and below 0
 * @param df degrees of freedom > 0, whole or not
 * @returns relative error about 1e-13 down to 1e-300; NaN unless df > 0.
 */
export function chiSquareTail(x: number, df: number): number {
  if (!(df > 0) || Number.isNaN(x)) return NaN;
  return x <= 0 ? 1 : Math.exp(logGammaTail('upper', df / 2, x / 2));
}
