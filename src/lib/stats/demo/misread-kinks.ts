import type { Generator } from '../random/generator';
import type { DemoFile } from './demo-file';
import { histogramRows } from './histogram-rows';

const BONDS = 50;
const KINK = 0.05;
const MISREAD = 0.01;

/** Independent kinks on an open chain whose sites are sometimes misread: one wrong site toggles two bonds. */
export const misreadKinks: DemoFile = {
  slug: 'misread-kinks',
  title: 'Misread kinks',
  about: 'Wrackline Bay chain laboratory, device Thrift: kinks along an open chain of 51 spins, 50 bonds.',
  cause: `${BONDS} independent bonds with probability ${KINK}; each of the 51 spins is then misread with probability ${MISREAD}.`,
  trials: BONDS,
  unit: 'defect',
  geometry: 'open-bonds',
  seed: 6403,
  rows: (stream) => {
    const random = stream(0);
    const shots = Array.from({ length: 6000 }, () => {
      let spin = random.next() < 0.5;
      let read = readOut(random, spin);
      let kinks = 0;
      for (let bond = 0; bond < BONDS; bond++) {
        if (random.next() < KINK) spin = !spin;
        const next = readOut(random, spin);
        if (next !== read) kinks++;
        read = next;
      }
      return kinks;
    });
    return histogramRows(shots);
  }
};

/** The spin as it is read: wrong with probability MISREAD. */
function readOut(random: Generator, spin: boolean): boolean {
  return random.next() < MISREAD ? !spin : spin;
}
