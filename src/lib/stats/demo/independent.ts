import { poissonBinomialShots } from '../random/poisson-binomial-shots';
import type { DemoFile } from './demo-file';
import { histogramRows } from './histogram-rows';

/** Independent sites whose probabilities differ: nothing to find. */
export const independent: DemoFile = {
  slug: 'independent-sites',
  title: 'Independent sites',
  about:
    'Wrackline Bay chain laboratory, device Samphire: empty sites in a line of 64 traps, read one by one.',
  cause: '64 independent sites, 40 with probability 0.08 and 24 with probability 0.20.',
  trials: 64,
  unit: 'defect',
  geometry: 'sites',
  seed: 6401,
  rows: (stream) => {
    const levels = [
      { p: 0.08, trials: 40 },
      { p: 0.2, trials: 24 }
    ];
    return histogramRows(poissonBinomialShots(stream(0), { levels, poissonPart: 0 }, 20_000));
  }
};
