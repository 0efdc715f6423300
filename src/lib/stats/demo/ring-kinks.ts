import { poissonBinomialShots } from '../random/poisson-binomial-shots';
import type { DemoFile } from './demo-file';
import { histogramRows } from './histogram-rows';
import { landauZenerLevels } from './landau-zener-levels';

const SPINS = 40;

/** Kinks on a ring come in pairs: every count is even, and the pair is what can be independent. */
export const ringKinks: DemoFile = {
  slug: 'ring-kinks',
  title: 'Kinks on a ring',
  about: 'Wrackline Bay chain laboratory, device Thrift closed to a ring of 40 spins: kinks after one ramp.',
  cause: '20 independent modes (Landau–Zener, a = 2), each of which is a pair of kinks; all counts are even.',
  trials: SPINS,
  unit: 'pair',
  geometry: 'ring-bonds',
  seed: 6406,
  rows: (stream) => {
    const law = { levels: landauZenerLevels(SPINS, 2), poissonPart: 0 };
    return histogramRows([...poissonBinomialShots(stream(0), law, 5000)].map((pairs) => 2 * pairs));
  }
};
