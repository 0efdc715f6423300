import { momentLimits } from './moment-limits';

/**
 * Limits that the cumulants of any counts at all obey, independent or not: raw moments of a law on 0 … N, and for the
 * variance also that counts are whole, κ2 ≥ f(1 − f) with f the fraction of the mean.
 *
 * @param trials N, or null when unknown or unbounded
 * @param cumulants κ1, κ2, … as far as they are known, one to four of them
 * @returns limits of κ1, κ2, κ3, κ4 in this order, each given the ones before it
 *
 * m2 = κ2 + κ1², m3 = κ3 + 3κ2κ1 + κ1³, m4 = κ4 + 4κ3κ1 + 3κ2² + 6κ2κ1² + κ1⁴. Without an upper end the last says
 * κ4 ≥ κ3²/κ2 − 2κ2² on the side of the counts (Pearson's inequality of kurtosis and skewness, sharpened by n ≥ 0).
 */
export function countLimits(trials: number | null, cumulants: number[]): { low: number; high: number }[] {
  const [k1, k2 = 0, k3 = 0, k4 = 0] = cumulants;
  const shifts = [
    0,
    k1 * k1,
    3 * k2 * k1 + k1 * k1 * k1,
    4 * k3 * k1 + 3 * k2 * k2 + 6 * k2 * k1 * k1 + k1 * k1 * k1 * k1
  ];
  const raw = [1, k1, k2 + shifts[1], k3 + shifts[2], k4 + shifts[3]].slice(0, cumulants.length + 1);
  const limits = momentLimits(raw, trials ?? Infinity).map(({ low, high }, order) => ({
    low: low - shifts[order],
    high: high - shifts[order]
  }));
  const fraction = k1 - Math.floor(k1);
  if (limits.length > 1) limits[1].low = Math.max(limits[1].low, fraction * (1 - fraction));
  return limits;
}
