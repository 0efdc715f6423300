import { betaSample } from '../random/beta-sample';
import { binomialSample } from '../random/binomial-sample';
import type { DemoFile } from './demo-file';
import { histogramRows } from './histogram-rows';

const SITES = 64;
const MEAN = 0.15;
/** Correlation of any two sites. A beta law with a + b = 1/ρ − 1 gives it. */
const CORRELATION = 0.01;

/** A cause shared by all sites of a shot: beta-binomial counts, too many in both tails. */
export const bunched: DemoFile = {
  slug: 'bunched-sites',
  title: 'Bunched sites',
  about: 'Wrackline Bay chain laboratory, device Marram: empty sites in a line of 64 traps, read one by one.',
  cause: `beta-binomial: the probability is drawn anew for each shot around ${MEAN}, so any two sites are correlated by ${CORRELATION}.`,
  trials: SITES,
  unit: 'defect',
  geometry: 'sites',
  seed: 6402,
  rows: (stream) => {
    const random = stream(0);
    const weight = 1 / CORRELATION - 1;
    const shots = Array.from({ length: 5000 }, () => {
      const p = betaSample(random, weight * MEAN, weight * (1 - MEAN));
      return binomialSample(random, SITES, p);
    });
    return histogramRows(shots);
  }
};
