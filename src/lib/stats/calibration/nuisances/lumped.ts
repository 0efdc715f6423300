import { binomialWindow } from '../../laws/binomial-window';
import { binomialSample } from '../../random/binomial-sample';
import type { Histogram } from '../../types';
import { everyTest, type Nuisance } from '../nuisance';
import { shiftForExcess, type MeanAndVariance } from '../shift-for-excess';
import { shotsOf } from '../shots-of';

/** Equal trials in a table whose first row lumps counts up to `to` and whose last lumps those from `from` on. */
export function lumped(id: string, trials: number, p: number, to: number, from: number): Nuisance {
  const at = (chance: number) => lumpedMoments(trials, chance, to, from);
  return {
    id,
    about: `${trials} trials, p = ${p}, in rows “${to} or fewer”, ${to + 1}, … ${from - 1}, “${from} or more”`,
    trials,
    options: {},
    judges: everyTest,
    sees: 'ceiling',
    draw: (random, shots, strength): Histogram => {
      const shift = shiftForExcess(at, (mean) => at(chanceOf(mean, at)).variance, {
        ...{ p, trials, shots, strength }
      });
      const { counts } = shotsOf(shots, () =>
        binomialSample(random, trials, random.next() < 0.5 ? p - shift : p + shift)
      );
      const sum = (rows: [number, number][]) => rows.reduce((all, [, seen]) => all + seen, 0);
      return {
        kind: 'histogram',
        counts: counts.filter(([count]) => count > to && count < from),
        lump: { from, shots: sum(counts.filter(([count]) => count >= from)) },
        below: { to, shots: sum(counts.filter(([count]) => count <= to)) }
      };
    }
  };
}

/** Moments of equal trials whose counts below and above two edges are taken as these. */
function lumpedMoments(trials: number, p: number, to: number, from: number): MeanAndVariance {
  const { first, values } = binomialWindow(trials, p, 1e-20, 1);
  let [mean, square] = [0, 0];
  values.forEach((f, i) => {
    const count = Math.min(from, Math.max(to, first + i));
    mean += count * f;
    square += count * count * f;
  });
  return { mean, variance: square - mean ** 2 };
}

/** The p of equal trials with a mean, lumps taken as above; by bisection, since the mean rises with p. */
function chanceOf(mean: number, at: (p: number) => MeanAndVariance): number {
  let [low, high] = [0, 1];
  for (let step = 0; step < 50; step++) {
    const middle = (low + high) / 2;
    if (at(middle).mean < mean) low = middle;
    else high = middle;
  }
  return high;
}
