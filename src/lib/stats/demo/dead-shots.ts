import { binomialSample } from '../random/binomial-sample';
import type { DemoFile } from './demo-file';
import { histogramRows } from './histogram-rows';

const SITES = 40;
const P = 0.12;
const DEAD = 0.03;

/** Independent sites, and now and then a shot in which nothing was prepared: too many empty shots. */
export const deadShots: DemoFile = {
  slug: 'dead-shots',
  title: 'Dead shots',
  about: 'Wrackline Bay chain laboratory, device Samphire, short line: flipped sites of 40, read one by one.',
  cause: `${SITES} independent sites with probability ${P}, but in ${DEAD * 100} % of the shots the preparation failed and the count is 0.`,
  trials: SITES,
  unit: 'defect',
  geometry: 'sites',
  seed: 6405,
  rows: (stream) => {
    const random = stream(0);
    return histogramRows(
      Array.from({ length: 6000 }, () => (random.next() < DEAD ? 0 : binomialSample(random, SITES, P)))
    );
  }
};
