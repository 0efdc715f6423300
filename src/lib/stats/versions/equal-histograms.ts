import { SequentialP } from '../multiple/sequential-p';
import { generator } from '../random/generator';
import { hypergeometricSample } from '../random/hypergeometric-sample';
import { stream } from '../resampling/streams';
import { BadInput, type Histogram } from '../types';
import { gStatistic } from './g-statistic';
import { twoRows } from './two-rows';

export interface EqualityOptions {
  /** Shuffles at most. */
  resamples: number;
  seed: number;
  /** Number of the comparison, so that no two share their shuffles; 0 by default. */
  comparison?: number;
}

export interface EqualityTest {
  /** G in nats, and its degrees of freedom K − 1. */
  statistic: number;
  freedom: number;
  p: number;
  smallestP: number;
  source: 'permuted';
  resamples: number;
  stoppedEarly: boolean;
}

/**
 * Could two histograms come from one law? Permutation test with the G statistic: all shots are shuffled between the two,
 * and p is the share of shuffles with at least the G observed, by the sequential rule of SequentialP. It asks only that
 * shots are alike and do not depend on each other within a version, and it is not directed: any difference counts.
 *
 * A shuffle of shots is drawn as a table with both margins fixed, cell by cell (hypergeometric): its time grows with the
 * number of counts and as the root of the shots.
 *
 * @throws BadInput for a histogram without shots, RangeError for resamples that are no positive integer
 *
 * Source: Fisher 1935, The Design of Experiments (permutation test) (m); Besag & Clifford 1991, Biometrika 78:301;
 * Patefield 1981, Appl. Statist. 30:91, for tables with fixed margins (m).
 */
export function equalHistograms(
  a: Histogram,
  b: Histogram,
  { resamples, seed, comparison = 0 }: EqualityOptions
): EqualityTest {
  const { first, second, totals } = twoRows(a, b);
  if (!(totals[0] > 0 && totals[1] > 0)) throw new BadInput('A version without shots cannot be compared.');
  const cells = first.length;
  const columns = Float64Array.from(first, (x, i) => x + second[i]);
  // Largest columns first: the draw often ends before the rare counts are reached.
  const order = Array.from(columns, (_, i) => i).sort((i, j) => columns[j] - columns[i] || i - j);
  const statistic = gStatistic(first, second);
  // Equal up to rounding counts as equal: terms of the size of S cancel.
  const reached = statistic - 1e-12 * (totals[0] + totals[1]) - 1e-10 * statistic;
  const drawn = new Float64Array(cells);
  const rest = new Float64Array(cells);
  const random = generator(seed, stream('versions', 0) + comparison);
  const sequence = new SequentialP(resamples);
  while (!sequence.done) {
    let left = totals[0];
    let after = totals[0] + totals[1];
    for (const i of order) {
      after -= columns[i];
      drawn[i] = left === 0 ? 0 : hypergeometricSample(random, columns[i], after, left);
      rest[i] = columns[i] - drawn[i];
      left -= drawn[i];
    }
    sequence.push(gStatistic(drawn, rest) >= reached);
  }
  const { p, smallestP, draws, stoppedEarly } = sequence;
  return {
    statistic,
    freedom: cells - 1,
    p,
    smallestP,
    source: 'permuted',
    resamples: draws,
    stoppedEarly
  };
}
