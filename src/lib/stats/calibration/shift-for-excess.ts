import { smallestExcess } from '../answer/smallest-excess';

/** Mean and variance of a count. */
export interface MeanAndVariance {
  mean: number;
  variance: number;
}

/**
 * Shift δ of a probability p so that shots at p − δ and p + δ, half each, have the excess asked for over the ceiling at
 * their mean; found by bisection.
 *
 * @param at mean and variance of the count at one probability
 * @param ceiling largest variance at a mean
 * @param shape how variance over ceiling scatters, where it is not that of plain trials, as the diagnosis has it: keptShape
 *   of the counts kept at a mean, for a declared cut
 * @param strength excess in units of the smallest that so many shots see; 0 gives 0
 * @throws RangeError where no shift below min(p, 1 − p) gives so much
 */
export function shiftForExcess(
  at: (p: number) => MeanAndVariance,
  ceiling: (mean: number) => number,
  {
    p,
    trials,
    shots,
    strength,
    shape
  }: {
    p: number;
    trials: number;
    shots: number;
    strength: number;
    shape?: (mean: number) => number | null;
  }
): number {
  if (strength === 0) return 0;
  const excess = (shift: number) => {
    const [low, high] = [at(p - shift), at(p + shift)];
    const mean = (low.mean + high.mean) / 2;
    const variance = (low.variance + high.variance) / 2 + ((high.mean - low.mean) / 2) ** 2;
    return (
      variance / ceiling(mean) -
      1 -
      strength * smallestExcess(mean, trials, shots, shape?.(mean) ?? undefined)!
    );
  };
  let low = 0;
  let high = Math.min(p, 1 - p);
  if (excess(high) < 0) throw new RangeError('No shift gives that excess.');
  for (let step = 0; step < 50; step++) {
    const middle = (low + high) / 2;
    if (excess(middle) < 0) low = middle;
    else high = middle;
  }
  return high;
}
