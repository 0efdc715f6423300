import { poissonBinomialShots } from '../random/poisson-binomial-shots';
import type { DemoFile } from './demo-file';
import { histogramRows } from './histogram-rows';

const SITES = 20;

/**
 * Particles that never sit next to each other, on an open line at fugacity 1. The zeros of the independence
 * polynomial are real, so the counts are exactly those of independent trials with p_k = s/(1 + s),
 * s = 4cos²(πk/22), k = 1 … 10, and drawing these trials draws from the interacting system.
 */
export const hardCoreGas: DemoFile = {
  slug: 'hard-core-gas',
  title: 'Neighbours that exclude each other',
  about:
    'Wrackline Bay chain laboratory, device Thrift under blockade: excited sites of 20, read one by one.',
  cause:
    'a hard-core gas: no two neighbours at once. It interacts, and yet its counts are exactly those of independent trials.',
  trials: SITES,
  unit: 'defect',
  geometry: 'sites',
  seed: 6409,
  rows: (stream) => {
    const levels = Array.from({ length: SITES / 2 }, (_, i) => {
      const s = 4 * Math.cos((Math.PI * (i + 1)) / (SITES + 2)) ** 2;
      return { p: s / (1 + s), trials: 1 };
    });
    return histogramRows(poissonBinomialShots(stream(0), { levels, poissonPart: 0 }, 8000));
  }
};
