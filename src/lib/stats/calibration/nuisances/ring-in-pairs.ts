import { binomialSample } from '../../random/binomial-sample';
import { everyTest, type Nuisance } from '../nuisance';
import { shiftForExcess } from '../shift-for-excess';
import { shotsOf } from '../shots-of';
import { equalAt } from './equal-at';

const PAIRS = 20;
const P = 0.15;

/** Independent pairs on a ring: every count is even, and pairs are said to be counted. */
export const ringInPairs: Nuisance = {
  id: 'ring-in-pairs',
  about: `${PAIRS} pairs round a ring of ${2 * PAIRS} bonds, p = ${P} a pair`,
  trials: 2 * PAIRS,
  options: { geometry: 'ring-bonds', unit: 'pair' },
  judges: everyTest,
  sees: 'ceiling',
  draw: (random, shots, strength) => {
    const { at, ceiling } = equalAt(PAIRS);
    const shift = shiftForExcess(at, ceiling, { p: P, trials: PAIRS, shots, strength });
    return shotsOf(
      shots,
      () => 2 * binomialSample(random, PAIRS, random.next() < 0.5 ? P - shift : P + shift)
    );
  }
};
