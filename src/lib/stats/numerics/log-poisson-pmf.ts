import { deviancePart } from './deviance-part';
import { stirlingError } from './stirling-error';

/**
 * ln P(X = k) for X ~ Poisson(mean), k ln m − m − ln Γ(k+1).
 *
 * @param k count ≥ 0; fractions are allowed, for the incomplete gamma function; −Infinity below 0
 * @param mean m ≥ 0
 * @returns absolute error about 1e-15 (1 + |ln P|); NaN for a negative mean.
 *
 * ln P = −½ ln 2πk − δ(k) − D(k; m).
 * Source: Loader 2000.
 */
export function logPoissonPmf(k: number, mean: number): number {
  if (!(mean >= 0) || Number.isNaN(k)) return NaN;
  if (k < 0) return -Infinity;
  if (k === 0) return -mean;
  if (mean === 0) return -Infinity;
  return -stirlingError(k) - deviancePart(k, mean) - 0.5 * Math.log(2 * Math.PI * k);
}
