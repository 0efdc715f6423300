import { chainCount } from '../../demo/chain-count';
import { shotsOf } from '../shots-of';
import type { Violation } from '../violation';

const SITES = 48;
const P = 0.1;

/** Neighbouring sites attract each other: a two-state Markov chain along the line. */
export const neighbours: Violation = {
  id: 'neighbours',
  about:
    'Markov chain, N = 48, p = 0.1; strength: correlation c of neighbours, variance near (1 + c)/(1 − c)',
  trials: SITES,
  strengths: [0.02, 0.06, 0.15],
  draw: (random, shots, correlation) => shotsOf(shots, () => chainCount(random, SITES, P, correlation))
};
