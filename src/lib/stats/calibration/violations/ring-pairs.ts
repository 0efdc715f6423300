import { binomialSample } from '../../random/binomial-sample';
import { shotsOf } from '../shots-of';
import type { Violation } from '../violation';

const PAIRS = 20;
const P = 0.2;

/** Kinks on a ring, told as single defects: pairs of kinks, of which one kink is now and then not seen. */
export const ringPairs: Violation = {
  id: 'ring-pairs',
  about: 'N = 40 kinks in pairs, p = 0.2 a pair; strength: share of shots that show no odd count by misreads',
  trials: 2 * PAIRS,
  strengths: [0.1, 0.3, 1],
  draw: (random, shots, clean) =>
    shotsOf(shots, () => {
      const kinks = 2 * binomialSample(random, PAIRS, P);
      // The other shots lose a kink with odds ½, so that their parity says nothing.
      return kinks > 0 && random.next() >= clean && random.next() < 0.5 ? kinks - 1 : kinks;
    })
};
