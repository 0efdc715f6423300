import { binomialSample } from '../random/binomial-sample';
import type { DemoFile } from './demo-file';

const SITES = 100;
const BATCHES = 10;
const SHOTS_A_BATCH = 300;
const FIRST = 0.08;
const LAST = 0.12;

/** A shot list in the order taken, in which the probability creeps up from batch to batch. */
export const driftingShots: DemoFile = {
  slug: 'drifting-shots',
  title: 'A drifting day',
  about:
    'Wrackline Bay chain laboratory, device Kelp: empty sites of 100, shot by shot, in ten batches of one day.',
  cause: `independent sites, but their common probability rises from ${FIRST} in the first batch to ${LAST} in the last.`,
  trials: SITES,
  unit: 'defect',
  geometry: 'sites',
  seed: 6404,
  rows: (stream) => {
    const random = stream(0);
    const rows = ['shot,batch,count'];
    for (let batch = 0; batch < BATCHES; batch++) {
      const p = FIRST + ((LAST - FIRST) * batch) / (BATCHES - 1);
      for (let i = 1; i <= SHOTS_A_BATCH; i++) {
        rows.push(`${batch * SHOTS_A_BATCH + i},${batch + 1},${binomialSample(random, SITES, p)}`);
      }
    }
    return rows;
  }
};
