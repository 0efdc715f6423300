import type { FitData } from '../fit/fit-data';

/**
 * KL(p̂ ‖ law) in nats a shot, from the log-likelihood of the law: (Σ h ln(h/S) − L)/S. Never below 0.
 *
 * Shots set aside do not enter; a lump at either end is one cell.
 */
export function divergence(data: FitData, logLikelihood: number): number {
  return Math.max(0, (saturated(data) - logLikelihood) / data.total);
}

/** Σ h_n ln(h_n/S): the log-likelihood of the histogram under itself. */
export function saturated(data: FitData): number {
  let sum = data.lump && data.lump.shots > 0 ? data.lump.shots * Math.log(data.lump.shots / data.total) : 0;
  if (data.below && data.below.shots > 0) sum += data.below.shots * Math.log(data.below.shots / data.total);
  for (const shots of data.shots) if (shots > 0) sum += shots * Math.log(shots / data.total);
  return sum;
}
