import { binomialSample } from '../../random/binomial-sample';
import { shotsOf } from '../shots-of';
import type { Violation } from '../violation';

const SITES = 20;
const P = 0.15;

/**
 * Defects meet and vanish in pairs after they formed: n₀ ~ Bin(N, p), then Bin(⌊n₀/2⌋, a) pairs go. The parity
 * of n₀ stays while the mean falls.
 */
export const pairLoss: Violation = {
  id: 'pair-loss',
  about: 'N = 20, p = 0.15, pairs vanish; strength: probability that a pair vanishes',
  trials: SITES,
  strengths: [0.2, 0.5, 0.8],
  draw: (random, shots, loss) =>
    shotsOf(shots, () => {
      const formed = binomialSample(random, SITES, P);
      return formed - 2 * binomialSample(random, formed >> 1, loss);
    })
};
