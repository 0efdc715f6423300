/** Variance, variance/mean and variance/ceiling. */
export interface Scatter {
  variance: number;
  fano: number;
  dispersion: number;
}

/**
 * Least and largest variance, variance/mean and variance/ceiling when one count that no shot had takes the largest
 * share that could have stayed unseen: e = 1 − tail^{1/S} (3.7/S for a tail of 2.5 %), P(no such shot) = tail.
 *
 * Resampling a histogram never shows a count that it lacks. Where shots with defects are few this is the whole
 * uncertainty: 3 single defects in 1000 shots resample to variance/mean between 0.99 and 1, while one shot in 300
 * might hold two, which makes it 1.7. The counts asked about are the empty neighbours of the counts seen, and the
 * empty counts next to the mean. Rare shots far beyond the largest count stay out of reach of any data.
 *
 * mean' = (1 − e) mean + e n, variance' = (1 − e)(variance + e (n − mean)²).
 *
 * @param counts `[count, shots]` with shots ≥ 1
 * @param trials N, or null when unknown (ceiling = mean)
 * @param tail probability, 0 < tail < 1
 * @returns infinite and −infinite ends when no count could have stayed unseen (all of 0 … N were seen)
 */
export function unseenRange(
  counts: readonly (readonly [number, number])[],
  mean: number,
  variance: number,
  trials: number | null,
  tail: number
): { least: Scatter; largest: Scatter } {
  const shots = counts.reduce((sum, [, h]) => sum + h, 0);
  // expm1, since for many shots the share is far below 1e-16 of 1.
  const share = -Math.expm1(Math.log(tail) / shots);
  const seen = new Set(counts.map(([n]) => n));
  const near = counts.flatMap(([n]) => [n - 1, n + 1]).concat(Math.floor(mean), Math.ceil(mean));
  const least = { variance: Infinity, fano: Infinity, dispersion: Infinity };
  const largest = { variance: -Infinity, fano: -Infinity, dispersion: -Infinity };
  for (const n of near) {
    if (seen.has(n) || n < 0 || (trials !== null && n > trials)) continue;
    const distance = n - mean;
    const moved = mean + share * distance;
    const spread = (1 - share) * (variance + share * distance * distance);
    const ceiling = trials === null ? moved : moved * (1 - moved / trials);
    const scatter = { variance: spread, fano: spread / moved, dispersion: spread / ceiling };
    for (const key of ['variance', 'fano', 'dispersion'] as const) {
      least[key] = Math.min(least[key], scatter[key]);
      largest[key] = Math.max(largest[key], scatter[key]);
    }
  }
  return { least, largest };
}
