import { binomialSample } from '../../random/binomial-sample';
import { shotsOf } from '../shots-of';
import type { Violation } from '../violation';

const SITES = 40;
const P = 0.12;

/** Shots in which the preparation failed and the count is 0; independent trials give 0.6 % of these. */
export const deadShots: Violation = {
  id: 'dead-shots',
  about: 'N = 40, p = 0.12, some shots dead; strength: share of dead shots',
  trials: SITES,
  strengths: [0.003, 0.01, 0.03],
  draw: (random, shots, share) =>
    shotsOf(shots, () => (random.next() < share ? 0 : binomialSample(random, SITES, P)))
};
