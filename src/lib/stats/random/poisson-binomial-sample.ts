import type { Law } from '../types';
import type { Generator } from './generator';
import { poissonBinomialShots } from './poisson-binomial-shots';

/**
 * Histogram of shots from a Poisson-binomial law, as `[count, shots]` with counts ascending and shots ≥ 1: the
 * tally of `poissonBinomialShots`, for demonstration data and calibration.
 *
 * @throws RangeError as `poissonBinomialShots`
 */
export function poissonBinomialSample(generator: Generator, law: Law, shots: number): [number, number][] {
  const tally = new Map<number, number>();
  for (const count of poissonBinomialShots(generator, law, shots))
    tally.set(count, (tally.get(count) ?? 0) + 1);
  return [...tally].sort((a, b) => a[0] - b[0]);
}
