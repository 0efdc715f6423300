import { momentValues } from '../moments/moment-values';
import { logNormalTail } from '../numerics/log-normal-tail';
import type { Histogram } from '../types';

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
 * The relative error e/D is taken as no less than that of equal trials, √(2(1 − 1/N)/S): few shots at a low mean often
 * show none of the rare counts that make the error, and a reference of 200 shots at a mean of 0.3 would raise 11 % of
 * false alarms at 5 %.
 *
 * @returns null where a version has fewer than two different counts, or no trials to vary: nothing to compare
 */
export function dispersionRise(version: VersionCounts, reference: VersionCounts): DispersionRise | null {
  const [d, error] = logDispersion(version);
  const [d0, error0] = logDispersion(reference);
  const z = (d - d0) / Math.hypot(error, error0);
  if (!Number.isFinite(z)) return null;
  return { factor: Math.exp(d - d0), z, p: Math.min(1, Math.exp(logNormalTail(z))) };
}

function logDispersion({ counts, trials }: VersionCounts): [number, number] {
  const n = Float64Array.from(counts, ([count]) => count);
  const shots = Float64Array.from(counts, ([, seen]) => seen);
  const values = new Float64Array(12);
  const total = shots.reduce((sum, h) => sum + h, 0);
  momentValues(n, shots, total, trials, values);
  const even = Math.sqrt((2 * (1 - (trials === null ? 0 : 1 / trials))) / total);
  return [Math.log(values[5]), Math.max(even, values[11] / values[5])];
}
