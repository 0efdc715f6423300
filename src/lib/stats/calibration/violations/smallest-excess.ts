import { smallestExcess as formula } from '../../answer/smallest-excess';
import type { Violation } from '../violation';
import { betaBinomial } from './common-cause';

const SITES = 64;
const MEAN = 0.15;

/**
 * Equal trials with a common cause just strong enough for the smallest excess that the diagnosis says it could
 * see with 80 % power at 5 %, at this number of shots. The ceiling test must then hold that promise.
 */
export const smallestExcess: Violation = {
  id: 'smallest-excess',
  about: 'beta-binomial, N = 64, p = 0.15; strength: excess over the ceiling in units of the smallest seen',
  trials: SITES,
  strengths: [1, 1.5],
  draw: (random, shots, strength) => {
    const excess = strength * formula(SITES * MEAN, SITES, shots)!;
    return betaBinomial(random, shots, SITES, MEAN, excess / (SITES - 1));
  }
};
