import type { Cumulants } from '../laws/law-moments';

/** Power sums s_r = Σ p_k^r of the trials' probabilities; s1 takes in a Poisson part. */
export interface PowerSums {
  s1: number;
  s2: number;
  s3: number;
  s4: number;
}

/**
 * Power sums from the first four cumulants of a sum of independent trials.
 *
 * s1 = κ1, s2 = κ1 − κ2, s3 = (κ3 − s1 + 3s2)/2, s4 = (s1 − 7s2 + 12s3 − κ4)/6.
 *
 * @returns what the formulas give, whether or not any trials can have these power sums: see `momentBody`
 */
export function powerSums({ mean, variance, third, fourth }: Cumulants): PowerSums {
  const s2 = mean - variance;
  const s3 = (third - mean + 3 * s2) / 2;
  return { s1: mean, s2, s3, s4: (mean - 7 * s2 + 12 * s3 - fourth) / 6 };
}
