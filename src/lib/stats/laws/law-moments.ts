import type { Law } from '../types';

/** The first four cumulants of a count. */
export interface Cumulants {
  mean: number;
  variance: number;
  third: number;
  fourth: number;
}

/**
 * Cumulants of a Poisson-binomial law: κ1 = Σp, κ2 = Σp(1−p), κ3 = Σp(1−p)(1−2p),
 * κ4 = Σp(1−p)(1−6p(1−p)); a Poisson part adds its mean to each.
 */
export function lawMoments(law: Law): Cumulants {
  const sum = {
    mean: law.poissonPart,
    variance: law.poissonPart,
    third: law.poissonPart,
    fourth: law.poissonPart
  };
  for (const { p, trials } of law.levels) {
    const spread = p * (1 - p);
    sum.mean += trials * p;
    sum.variance += trials * spread;
    sum.third += trials * spread * (1 - 2 * p);
    sum.fourth += trials * spread * (1 - 6 * spread);
  }
  return sum;
}
