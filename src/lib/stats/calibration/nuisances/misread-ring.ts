import { ringCeiling } from '../../misread/ring-ceiling';
import { ringMoments } from '../../misread/ring-moments';
import type { Generator } from '../../random/generator';
import { everyTest, type Nuisance } from '../nuisance';
import { shiftForExcess } from '../shift-for-excess';
import { shotsOf } from '../shots-of';

const BONDS = 40;
const P = 0.06;
const RATE = 0.01;

/** Kinks round a ring, independent but for their even total, read with misread sites and counted singly. */
export const misreadRing: Nuisance = {
  id: 'misread-ring',
  about: `${BONDS} bonds of a ring, p = ${P}, a site misread with ${RATE}`,
  trials: BONDS,
  options: { geometry: 'ring-bonds', misread: RATE },
  judges: everyTest,
  sees: 'ceiling',
  draw: (random, shots, strength) => {
    const ceilingAt = ringCeiling(BONDS, RATE);
    const shift = shiftForExcess(
      (p) => ringMoments(BONDS, p, RATE),
      (mean) => ceilingAt(mean).variance,
      { p: P, trials: BONDS, shots, strength }
    );
    return shotsOf(shots, () => readRing(random, random.next() < 0.5 ? P - shift : P + shift));
  }
};

/** One shot, spin by spin, drawn anew until the last bond leads back to the first spin: nothing of the law is used. */
function readRing(random: Generator, p: number): number {
  for (;;) {
    let spin = false;
    const first = random.next() < RATE;
    let read = first;
    let count = 0;
    for (let bond = 1; bond < BONDS; bond++) {
      if (random.next() < p) spin = !spin;
      const next = random.next() < RATE ? !spin : spin;
      if (next !== read) count++;
      read = next;
    }
    // The closing bond must hold a kink exactly where the last spin differs from the first.
    if (random.next() < p !== spin) continue;
    return read === first ? count : count + 1;
  }
}
