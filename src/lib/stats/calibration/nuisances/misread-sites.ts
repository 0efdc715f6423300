import { binomialSample } from '../../random/binomial-sample';
import { everyTest, type Nuisance } from '../nuisance';
import { shiftForExcess } from '../shift-for-excess';
import { shotsOf } from '../shots-of';
import { equalAt } from './equal-at';

const SITES = 40;
const P = 0.15;
const RATE = 0.02;

/** Defects on sites that are misread one by one: some are missed, some seen where there is none. */
export const misreadSites: Nuisance = {
  id: 'misread-sites',
  about: `${SITES} sites, p = ${P}, a site misread with ${RATE}`,
  trials: SITES,
  options: { geometry: 'sites', misread: RATE },
  judges: everyTest,
  sees: 'ceiling',
  draw: (random, shots, strength) => {
    const { at, ceiling } = equalAt(SITES);
    const asked = { p: P, trials: SITES, shots, strength };
    const shift = shiftForExcess((p) => at(p * (1 - 2 * RATE) + RATE), ceiling, asked);
    return shotsOf(shots, () => {
      const there = binomialSample(random, SITES, random.next() < 0.5 ? P - shift : P + shift);
      return binomialSample(random, there, 1 - RATE) + binomialSample(random, SITES - there, RATE);
    });
  }
};
