import { chainMoments } from '../../misread/chain-moments';
import { misreadCeiling } from '../../misread/misread-ceiling';
import { normalSample } from '../../random/normal-sample';
import type { Generator } from '../../random/generator';
import { everyTest, type Nuisance } from '../nuisance';
import { shiftForExcess } from '../shift-for-excess';
import { shotsOf } from '../shots-of';

const BONDS = 40;
const P = 0.06;
const RATE = 0.01;

/**
 * Kinks along an open chain, read with misread sites.
 *
 * @param uncertainty standard uncertainty of the rate: each histogram then has its own true rate, normal about the one
 *   stated and never below 0; 0 where it is exact
 */
export function misreadBonds(id: string, uncertainty: number): Nuisance {
  return {
    id,
    about: `${BONDS} open bonds, p = ${P}, a site misread with ${RATE}${uncertainty > 0 ? `, give or take ${uncertainty}` : ''}`,
    trials: BONDS,
    options: {
      geometry: 'open-bonds',
      misread: RATE,
      ...(uncertainty > 0 && { misreadUncertainty: uncertainty })
    },
    judges: everyTest,
    sees: 'ceiling',
    draw: (random, shots, strength) => {
      const rate = uncertainty > 0 ? Math.max(0, RATE + uncertainty * normalSample(random)) : RATE;
      const ceilingAt = misreadCeiling(BONDS, rate);
      const shift = shiftForExcess(
        (p) => chainMoments([{ p, trials: BONDS }], rate),
        (mean) => ceilingAt(mean).variance,
        { p: P, trials: BONDS, shots, strength }
      );
      return shotsOf(shots, () => readChain(random, random.next() < 0.5 ? P - shift : P + shift, rate));
    }
  };
}

/** One shot, spin by spin: nothing of the law is used. */
function readChain(random: Generator, p: number, rate: number): number {
  let spin = false;
  let read = random.next() < rate;
  let count = 0;
  for (let bond = 0; bond < BONDS; bond++) {
    if (random.next() < p) spin = !spin;
    const next = random.next() < rate ? !spin : spin;
    if (next !== read) count++;
    read = next;
  }
  return count;
}
