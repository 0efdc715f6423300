import { findRoot } from '../numerics/find-root';
import type { KinkMean } from './log-misread-tail';

/**
 * Limits of the mean number of true kinks, from the mean count read over S shots, each missed with probability at most
 * miss/2, whatever the kink probabilities.
 *
 * Bernstein's inequality, P(|mean of S shots − μ| beyond t) ≤ exp(−S t²/(2(v + b t/3))) on either side, with b the
 * largest step from the mean on that side (μ below, N − μ above) and v at most ¼[N − (3 − 2/u²)(N − 2μ)²/N], the
 * misread ceiling without its last digits (see misreadCeiling; Σm² ≥ (Σm)²/N). Solved for μ. The mean of the true
 * kinks follows from μ = κ(1 − 2q) + Nq, q = 2ε(1 − ε), which is exact.
 *
 * @param mean mean count read
 * On a ring half the count is a sum of independent trials once the flips are known (see misreadCertificate), and a
 * mean over flips varies by at most N/4·(1 − u²)(1 + 3u²), N times the largest eigenvalue of the toggles' covariance:
 * v = 2μ(1 − μ/N) + that.
 *
 * @param rate ε with (1 − 2ε)² ≥ 2/3
 * @returns limits within 0 … N
 * Source: Bernstein 1924; Boucheron, Lugosi & Massart 2013, Concentration Inequalities, corollary 2.11 (m).
 */
export function kinkMeanLimits(
  mean: number,
  shots: number,
  bonds: number,
  rate: number,
  miss: number,
  ring = false
): KinkMean {
  const lost = 4 * rate * (1 - rate);
  const weight = 3 - 2 / (1 - lost);
  const budget = Math.log(2 / miss) / shots;
  const square = 1 - lost;
  const variance = (mu: number) =>
    ring
      ? 2 * mu * (1 - mu / bonds) + (bonds * lost * (1 + 3 * square)) / 4
      : (bonds - (weight * (bonds - 2 * mu) ** 2) / bonds) / 4;
  // Positive where a true mean μ is too far from the one read to be believed.
  const far = (mu: number) => {
    const t = Math.abs(mu - mean);
    const reach = mu > mean ? mu : bonds - mu;
    return t * t - 2 * budget * (variance(mu) + (reach * t) / 3);
  };
  const high = far(bonds) > 0 ? findRoot(far, mean, bonds) : bonds;
  const low = far(0) > 0 ? findRoot(far, mean, 0) : 0;
  const kinks = (mu: number) => Math.min(bonds, Math.max(0, (mu - (bonds * lost) / 2) / (1 - lost)));
  return { low: kinks(low), high: kinks(high) };
}
