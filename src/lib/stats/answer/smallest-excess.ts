/** 1.645 + 0.842: a one-sided test at 5 % with 80 % power. Common practice. */
const reach = 2.49;

/**
 * Smallest excess of the variance over the ceiling that S shots see with 80 % power at 5 %, as a fraction of the
 * ceiling: 2.49·√((2 + κ4/κ2²)/S), from the sampling error of a variance, with κ4/κ2² of equal trials.
 *
 * @param mean mean count, 0 < mean < N
 * @param shape S times the relative variance of the statistic, where it is not that of a plain variance (keptShape)
 * @returns null when the ceiling is 0
 */
export function smallestExcess(
  mean: number,
  trials: number | null,
  shots: number,
  shape = varianceShape(mean, trials)
): number | null {
  return shape === null ? null : reach * Math.sqrt(shape / shots);
}

/** Shots for a smallest excess of `excess`; the inverse of the above. */
export function shotsForExcess(mean: number, trials: number | null, excess: number): number | null {
  const shape = varianceShape(mean, trials);
  return shape === null ? null : Math.ceil(shape * (reach / excess) ** 2);
}

/** 2 + κ4/κ2² of equal trials: S times the relative variance of a sample variance. */
export function varianceShape(mean: number, trials: number | null): number | null {
  const spread = trials === null ? mean : mean * (1 - mean / trials);
  if (!(spread > 0)) return null;
  const p = trials === null ? 0 : mean / trials;
  return 2 + (1 - 6 * p * (1 - p)) / spread;
}
