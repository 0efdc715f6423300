/** 1.645 + 0.842: a one-sided test at 5 % with 80 % power. Common practice. */
const reach = 2.49;

/**
 * Smallest excess of the variance over the ceiling that S shots see with 80 % power at 5 %, as a fraction of the
 * ceiling: 2.49·√(2(1 − 1/N)/S), from the sampling error of variance over ceiling under equal trials.
 *
 * A formula of normal numbers: of 1500 repeats 79 % see it at a mean of 1 and 8000 shots, 74 % at 0.3 and 4000.
 *
 * @param mean mean count, 0 < mean < N
 * @param shape S times the relative variance of the statistic, where it is not that of equal trials (keptShape)
 * @returns null when the ceiling is 0
 */
export function smallestExcess(
  mean: number,
  trials: number | null,
  shots: number,
  shape = dispersionShape(mean, trials)
): number | null {
  return shape === null ? null : reach * Math.sqrt(shape / shots);
}

/**
 * S times the relative variance of variance over ceiling under equal trials, both from the same shots: 2(1 − 1/N), and 2
 * for a Poisson law, whatever the mean. A variance alone has 2 + κ4/κ2², but the ceiling C follows the mean along
 * C′ = κ3/κ2, which takes κ3²/κ2³ off (see keptShape, dispersionSpread): at a mean of 0.1 that leaves 2 of 12.
 *
 * @returns null where nothing can vary about the ceiling: mean 0 or N, or a single trial
 */
export function dispersionShape(mean: number, trials: number | null): number | null {
  if (!(mean > 0) || (trials !== null && (mean >= trials || trials < 2))) return null;
  return trials === null ? 2 : 2 * (1 - 1 / trials);
}
