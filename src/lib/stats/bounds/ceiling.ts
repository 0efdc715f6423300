/**
 * Largest variance a sum of independent trials with this mean can have: μ(1 − μ/N), reached by equal trials.
 *
 * @param mean μ, 0 ≤ μ ≤ N
 * @param trials N, or null when unknown or unbounded: then μ, reached by a Poisson count
 * @returns counts squared; NaN for a mean out of range
 *
 * κ2 = Σp − Σp², and Σp² ≥ μ²/N by Cauchy–Schwarz.
 */
export function ceiling(mean: number, trials: number | null): number {
  if (!(mean >= 0) || (trials !== null && !(mean <= trials))) return NaN;
  return trials === null ? mean : mean * ((trials - mean) / trials || 0);
}
