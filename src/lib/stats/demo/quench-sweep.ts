import { poissonBinomialShots } from '../random/poisson-binomial-shots';
import type { DemoFile } from './demo-file';
import { landauZenerLevels } from './landau-zener-levels';
import { tally } from './tally';

const SPINS = 200;
const TIMES = [1, 2, 4, 8, 16, 32];

/** Six ramps of different speed on one ring: the density of kinks falls as the square root of the time. */
export const quenchSweep: DemoFile = {
  slug: 'quench-sweep',
  title: 'A quench sweep',
  about: 'Wrackline Bay chain laboratory, device Kelp closed to a ring of 200 spins: kinks after six ramps.',
  cause: 'independent modes (Landau–Zener), a = quench time in microseconds; each mode is a pair of kinks.',
  trials: SPINS,
  unit: 'pair',
  geometry: 'ring-bonds',
  seed: 6407,
  rows: (stream) => [
    'device,quench_time_us,count,shots',
    ...TIMES.flatMap((time, index) => {
      const law = { levels: landauZenerLevels(SPINS, time), poissonPart: 0 };
      return tally(poissonBinomialShots(stream(index), law, 2000)).map(
        ([pairs, shots]) => `Kelp,${time},${2 * pairs},${shots}`
      );
    })
  ]
};
