/**
 * Number of trials N* at which the variance ceiling equals the variance: N* = μ²/(μ − s²).
 *
 * @param mean μ > 0
 * @param variance s² ≥ 0
 * @returns a real number, at least μ: fewer trials than N* break the ceiling, N* or more keep it. null when
 *   s² ≥ μ, which no number of trials can explain, and for input out of range.
 */
export function criticalTrials(mean: number, variance: number): number | null {
  if (!(mean > 0 && variance >= 0 && variance < mean)) return null;
  return (mean * mean) / (mean - variance);
}
