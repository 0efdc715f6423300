/**
 * G² that a law of this log-likelihood leaves, 2(saturated − logLikelihood), enlarged by what sums over `total` shots
 * may be rounded: a bound for every law at least as likely.
 *
 * @param saturated log-likelihood of the histogram under itself, nats
 */
export function gSquaredLeft(saturated: number, logLikelihood: number, total: number): number {
  const gSquared = 2 * Math.max(0, saturated - logLikelihood);
  return gSquared * (1 + 1e-9) + 1e-6 + 1e-12 * total;
}
