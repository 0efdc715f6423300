import { binomialSample } from '../../random/binomial-sample';
import { shotsOf } from '../shots-of';
import type { Violation } from '../violation';

const SITES = 64;
const P = 0.1;
/** Share of the sites that a burst hits. */
const HIT = 0.3;

/** Rare shots in which an outside event flips another 30 % of the sites. */
export const bursts: Violation = {
  id: 'bursts',
  about: 'N = 64, p = 0.1, now and then three in ten of the other sites too; strength: share of such shots',
  trials: SITES,
  strengths: [0.0005, 0.002, 0.008],
  draw: (random, shots, share) =>
    shotsOf(shots, () => {
      const count = binomialSample(random, SITES, P);
      return random.next() < share ? count + binomialSample(random, SITES - count, HIT) : count;
    })
};
