import { betaSample } from '../../random/beta-sample';
import { binomialSample } from '../../random/binomial-sample';
import type { Generator } from '../../random/generator';
import { shotsOf } from '../shots-of';
import type { Violation } from '../violation';

const SITES = 64;
const MEAN = 0.15;

/** Beta-binomial counts: any two sites are correlated by ρ, and the variance is 1 + (N − 1)ρ ceilings. */
export const commonCause: Violation = {
  id: 'common-cause',
  about: 'beta-binomial, N = 64, p = 0.15; strength ρ, variance 1 + 63ρ ceilings',
  trials: SITES,
  strengths: [0.001, 0.004, 0.016],
  draw: (random, shots, correlation) => betaBinomial(random, shots, SITES, MEAN, correlation)
};

/** Histogram of beta-binomial shots; correlation 0 < ρ < 1. */
export function betaBinomial(
  random: Generator,
  shots: number,
  sites: number,
  mean: number,
  correlation: number
) {
  const weight = 1 / correlation - 1;
  return shotsOf(shots, () =>
    binomialSample(random, sites, betaSample(random, weight * mean, weight * (1 - mean)))
  );
}
