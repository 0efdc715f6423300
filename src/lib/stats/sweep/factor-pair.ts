import type { CumulantErrors } from './cumulant-errors';

/**
 * F1² and F2 of one histogram with their variances and covariance: F1 = κ1 and F2 = κ2 − κ1 are factorial cumulants. The
 * square of the mean is taken as k1² − k2/S, which is unbiased; errors by the delta method.
 */
export function factorPair({ shots, cumulants: [mean, variance], covariance: v }: CumulantErrors) {
  return {
    x: mean * mean - variance / shots,
    y: variance - mean,
    varX: 4 * mean * mean * v[0],
    varY: v[4] - 2 * v[1] + v[0],
    covariance: 2 * mean * (v[1] - v[0]),
    // The error of F2 grows as the mean over √S, F1² as its square.
    weight: shots
  };
}
