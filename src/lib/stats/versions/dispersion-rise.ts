import { logNormalTail } from '../numerics/log-normal-tail';
import type { Histogram } from '../types';
import { logDispersion } from './log-dispersion';

/** Shots of one version and group, with N (null when unknown). */
export interface VersionCounts {
  counts: Histogram['counts'];
  trials: number | null;
}

/** Variance/ceiling of the version over that of the reference, and a one-sided test that it is above 1. */
export interface DispersionRise {
  /** D of the version over D of the reference. */
  factor: number;
  z: number;
  p: number;
}

/**
 * Does one version scatter more about its ceiling than another? z = (ln D − ln D₀)/√(e²/D² + e₀²/D₀²), D unbiased
 * variance over ceiling, e its standard error by the influence function (momentValues); p = P(Z ≥ z). Each version is held
 * against its own ceiling with the shape its own counts have, so means and shapes may differ; a shuffle of shots would
 * take any difference, of means too, for a rise.
 *
 * The errors are those of logDispersion, which has a floor for few shots at a low mean.
 *
 * @returns null where a version has fewer than two different counts, or no trials to vary: nothing to compare
 */
export function dispersionRise(version: VersionCounts, reference: VersionCounts): DispersionRise | null {
  const { log: d, error } = logDispersion(version);
  const { log: d0, error: error0 } = logDispersion(reference);
  const z = (d - d0) / Math.hypot(error, error0);
  if (!Number.isFinite(z)) return null;
  return { factor: Math.exp(d - d0), z, p: Math.min(1, Math.exp(logNormalTail(z))) };
}
