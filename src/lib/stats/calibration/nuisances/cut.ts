import { binomialSample } from '../../random/binomial-sample';
import { keptEqual } from '../../truncation/kept-equal';
import { keptShape } from '../../truncation/kept-shape';
import { windowMoments } from '../../truncation/window-moments';
import type { Histogram } from '../../types';
import { everyTest, type Nuisance } from '../nuisance';
import { shiftForExcess, type MeanAndVariance } from '../shift-for-excess';
import { shotsOf } from '../shots-of';

/**
 * Equal trials of which only counts from `from` to `to` were kept, as stated.
 *
 * @param to null: nothing was cut above
 */
export function cut(id: string, trials: number, p: number, from: number, to: number | null): Nuisance {
  const kept = { from, to: to ?? Infinity };
  const inside = (n: number) => n >= kept.from && n <= kept.to;
  return {
    id,
    about: `${trials} trials, p = ${p}, only counts ${from} to ${to ?? trials} kept`,
    trials,
    options: { kept: { from, to } },
    judges: everyTest,
    sees: 'ceiling',
    draw: (random, shots, strength): Histogram => {
      const shift = shiftForExcess(
        (at) => cutMoments(trials, at, inside),
        (mean) => windowMoments(keptEqual(trials, kept, mean)).variance,
        { p, trials, shots, strength, shape: (mean) => keptShape(keptEqual(trials, kept, mean)) }
      );
      return shotsOf(shots, () => {
        const at = random.next() < 0.5 ? p - shift : p + shift;
        let count = binomialSample(random, trials, at);
        while (!inside(count)) count = binomialSample(random, trials, at);
        return count;
      });
    }
  };
}

/** Moments of equal trials of which a cut is kept, term by term. */
function cutMoments(trials: number, p: number, inside: (n: number) => boolean): MeanAndVariance {
  let f = (1 - p) ** trials;
  let [all, first, second] = [0, 0, 0];
  for (let n = 0; n <= trials; n++) {
    if (inside(n)) {
      all += f;
      first += n * f;
      second += n * n * f;
    }
    f *= ((trials - n) * p) / ((n + 1) * (1 - p));
  }
  const mean = first / all;
  return { mean, variance: second / all - mean ** 2 };
}
