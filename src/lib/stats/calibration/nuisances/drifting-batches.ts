import { binomialSample } from '../../random/binomial-sample';
import type { Nuisance } from '../nuisance';
import { shiftForExcess } from '../shift-for-excess';
import { equalAt } from './equal-at';

const SITES = 40;
const P = 0.15;
const BATCHES = 10;
/** p rises by this share of itself from the first batch to the last. */
const RISE = 0.4;

/** Batches whose p drifts: the tests of all shots see that, those within batches must not. */
export const driftingBatches: Nuisance = {
  id: 'drifting-batches',
  about: `${BATCHES} batches of ${SITES} sites, p rising by ${100 * RISE} % about ${P}`,
  trials: SITES,
  options: {},
  judges: ['within-batches'],
  sees: 'within-batches',
  draw: (random, count, strength) => {
    const { at, ceiling } = equalAt(SITES);
    const shift = shiftForExcess(at, ceiling, { p: P, trials: SITES, shots: count, strength });
    const batches = Array.from({ length: count }, (_, i) => Math.floor((i * BATCHES) / count));
    const shots = batches.map((batch) => {
      const mean = P * (1 + RISE * (batch / (BATCHES - 1) - 0.5));
      return binomialSample(random, SITES, random.next() < 0.5 ? mean - shift : mean + shift);
    });
    return { kind: 'shots', shots, batches: batches.map(String) };
  }
};
