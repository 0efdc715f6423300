/** Each family of resamples draws from streams of its own, so that one cannot echo another. */
const families = {
  'equal trials': 1,
  'fitted law': 2,
  'shot order': 3,
  batches: 4,
  intervals: 5,
  explanations: 6,
  'within batches': 7,
  'change of the mean': 8,
  versions: 9
} as const;

/**
 * Stream number of resample b of a family: family·2^20 + b. A resample depends on seed, family and b alone,
 * so the work can be split over threads, or ended early, and gives the same numbers.
 */
export function stream(family: keyof typeof families, b: number): number {
  return families[family] * 2 ** 20 + b;
}
