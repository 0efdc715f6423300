import { binomialSample } from '../random/binomial-sample';
import type { DemoFile } from './demo-file';

/** An ordinary afternoon: too few shots to say anything. One count a line, in the order taken. */
export const fortyShots: DemoFile = {
  slug: 'forty-shots',
  title: 'Forty shots',
  about:
    'Wrackline Bay chain laboratory, device Samphire: empty sites of 64 in 40 shots, in the order taken.',
  cause: '64 independent sites with probability 0.12, but only 40 shots.',
  trials: 64,
  unit: 'defect',
  geometry: 'sites',
  seed: 6410,
  rows: (stream) => {
    const random = stream(0);
    return ['count', ...Array.from({ length: 40 }, () => String(binomialSample(random, 64, 0.12)))];
  }
};
