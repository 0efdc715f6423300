import { momentLimits } from './moment-limits';

/**
 * Limits that the cumulants of independent trials obey, each cumulant's given the ones before it: the power sums
 * s_r = Σp^r are moments of a measure of mass N on [0, 1].
 *
 * @param trials N, or null when unknown or unbounded
 * @param cumulants κ1, κ2, … as far as they are known, one to four of them
 * @returns limits of κ1, κ2, κ3, κ4 in this order; those after an impossible one are NaN or ±Infinity
 *
 * κ2 = s1 − s2, κ3 = s1 − 3s2 + 2s3, κ4 = s1 − 7s2 + 12s3 − 6s4. Necessary for every N; the measure need not be of
 * whole trials, so trials may stop short of an edge, never pass it.
 */
export function trialLimits(trials: number | null, cumulants: number[]): { low: number; high: number }[] {
  const [k1, k2, k3 = 0, k4 = 0] = cumulants;
  const s2 = k1 - k2;
  const s3 = (k3 - k1 + 3 * s2) / 2;
  const s4 = (k1 - 7 * s2 + 12 * s3 - k4) / 6;
  const sums = [trials ?? Infinity, k1, s2, s3, s4].slice(0, cumulants.length + 1);
  const bases = [
    (s: number) => s,
    (s: number) => k1 - s,
    (s: number) => k1 - 3 * s2 + 2 * s,
    (s: number) => k1 - 7 * s2 + 12 * s3 - 6 * s
  ];
  return momentLimits(sums, 1).map(({ low, high }, order) => {
    const ends = [bases[order](low), bases[order](high)];
    return { low: Math.min(...ends), high: Math.max(...ends) };
  });
}
