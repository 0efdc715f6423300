/**
 * Log-likelihood from which on a law leaves less than `gSquared`, with twice the room for rounding that gSquaredLeft
 * takes, so that the two never disagree; Infinity when even a perfect law might leave as much by rounding.
 *
 * @param saturated log-likelihood of the histogram under itself, nats
 */
export function settledAt(saturated: number, gSquared: number, total: number): number {
  const left = gSquared - 2e-6 - 2e-12 * total;
  return left > 0 ? saturated - left / (2 * (1 + 2e-9)) : Infinity;
}
