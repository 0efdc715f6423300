import { binomialSample } from '../../random/binomial-sample';
import type { Nuisance } from '../nuisance';
import { shiftForExcess } from '../shift-for-excess';
import { shotsOf } from '../shots-of';
import { equalAt } from './equal-at';

const SITES = 40;
const P = 0.12;
const DEAD = 0.06;

/** Dead shots among independent trials: with the empty shots set aside, the rest must not look broken. */
export const deadSetAside: Nuisance = {
  id: 'dead-set-aside',
  about: `${SITES} sites, p = ${P}, ${100 * DEAD} % of the shots dead`,
  trials: SITES,
  options: {},
  judges: ['empty-aside'],
  sees: 'empty-aside',
  draw: (random, shots, strength) => {
    const { at, ceiling } = equalAt(SITES);
    const shift = shiftForExcess(at, ceiling, { p: P, trials: SITES, shots, strength });
    return shotsOf(shots, () =>
      random.next() < DEAD ? 0 : binomialSample(random, SITES, random.next() < 0.5 ? P - shift : P + shift)
    );
  }
};
