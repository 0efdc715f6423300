import type { Law } from '../types';
import { binomialSample } from './binomial-sample';
import type { Generator } from './generator';
import { poissonSample } from './poisson-sample';

/**
 * Shots from a Poisson-binomial law in the order taken: each is a sum over levels of Bin(trials, p), plus a
 * Poisson part. No pmf is built, so this is an independent check on anything that builds one. Time is shots ×
 * levels × about 0.1 µs; for more than a million shots give the pmf to `histogramSampler` instead.
 *
 * @param law levels (trials an integer ≥ 0, p 0 … 1) and the mean of the Poisson part, 0 when there is none
 * @param shots number of shots, an integer ≥ 0
 * @returns one count a shot
 * @throws RangeError for levels or a Poisson part that are none, and when a count could pass 2^32 − 1
 */
export function poissonBinomialShots(generator: Generator, law: Law, shots: number): Uint32Array {
  const largest = law.levels.reduce((sum, level) => sum + level.trials, 0);
  if (!(largest <= 0xffffffff) || law.poissonPart > 2147483648) {
    throw new RangeError('counts of this law could pass 2^32 − 1');
  }
  const taken = new Uint32Array(shots);
  for (let i = 0; i < shots; i++) {
    let count = law.poissonPart === 0 ? 0 : poissonSample(generator, law.poissonPart);
    for (const level of law.levels) count += binomialSample(generator, level.trials, level.p);
    taken[i] = count;
  }
  return taken;
}
