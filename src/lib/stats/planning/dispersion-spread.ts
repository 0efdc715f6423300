import { ceiling } from '../bounds/ceiling';
import type { Window } from '../laws/window';

/** Variance over ceiling under a law, and how it scatters from one experiment of S shots to the next. */
export interface DispersionSpread {
  /** r = κ2/ceiling(κ1). */
  ratio: number;
  /** S times the bias, S times the variance and S² times the third cumulant of s²/ceiling(mean). */
  bias: number;
  spread: number;
  lean: number;
}

/**
 * Sampling error of variance over ceiling, both from the same S shots, to first order in 1/S.
 *
 * With d = n − μ, C the ceiling, C′ = 1 − 2μ/N its slope and ψ = (d² − κ2 − r C′ d)/C, one shot's pull on the ratio:
 * spread = E ψ², lean = E ψ³, bias = (r C′² κ2 − C′ κ3)/C² + r κ2/(N C).
 *
 * The mean is estimated too, and the ceiling follows it. For equal trials the spread is 2(1 − 1/N), for a Poisson law 2,
 * whatever the mean; without the ceiling's part, 2 + κ4/κ2², it would be three instead of two for a mean of 1. The lean
 * of a Poisson law is 8 + 4/μ: at low means much more than that of a variance of normal numbers, 8.
 */
export function dispersionSpread({ first, values, scale }: Window, trials: number | null): DispersionSpread {
  let total = 0;
  let start = 0;
  values.forEach((value, i) => {
    total += value / scale;
    start += (first + i) * (value / scale);
  });
  const mean = start / total;
  const expected = (of: (d: number) => number) => {
    let sum = 0;
    values.forEach((value, i) => (sum += (value / scale) * of(first + i - mean)));
    return sum / total;
  };
  const variance = expected((d) => d * d);
  const third = expected((d) => d * d * d);
  const top = ceiling(mean, trials);
  const ratio = variance / top;
  const slope = 1 - (trials === null ? 0 : (2 * mean) / trials);
  const pull = (d: number) => (d * d - variance - ratio * slope * d) / top;
  const bent = trials === null ? 0 : (ratio * variance) / (trials * top);
  return {
    ratio,
    bias: (ratio * slope * slope * variance - slope * third) / (top * top) + bent,
    spread: expected((d) => pull(d) ** 2),
    lean: expected((d) => pull(d) ** 3)
  };
}
