import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { evenDispersionFactors } from '../moments/even-dispersion-factors';
import { adjust } from '../multiple/adjust';
import { keptNull } from '../nulls/kept-null';
import { meanFixesVariance } from '../nulls/mean-fixes-variance';
import { mostBonds } from '../nulls/misread-applies';
import { varianceTest } from '../resampling/ceiling-test';
import type { DrawHelper } from '../resampling/draw-helper';
import { fittedTests } from '../resampling/fitted-tests';
import type { Pace } from '../resampling/pace';
import { setEmptyAside } from '../resampling/set-empty-aside';
import type { DiagnoseOptions, Interval, TestResult } from '../types';
import { sayRest, type RestTest } from './say-rest';

/** The shots with at least one defect, tested as counts of 1 and more. */
export interface EmptyAside {
  shots: number;
  mean: number;
  /** Largest variance of independent trials of which the empty shots were dropped, at that mean. */
  ceiling: number;
  dispersion: Interval;
  /** Of the variance alone. */
  p: number;
  smallestP: number;
  resamples: number;
  /** Variance, fit and tails of the rest, adjusted for one another. */
  tests: TestResult[];
  /** `excess`: the variance is over the ceiling; `misfit`: it is not, but fit or tails speak against such trials. */
  verdict: 'compatible' | 'excess' | 'misfit' | 'undecided';
  statement: string;
}

/** Resamples: the rest stands beside a diagnosis, and its tests are as many again. */
const draws = 999;
/** As in the answer. */
const fewest = 50;
/** The shape of the rest; parity and empty shots are what it was cut for. */
const shape: RestTest[] = ['fit', 'high-tail', 'low-tail'];

/**
 * Sets the empty shots aside and tests the rest as a declared cut "kept 1 and more" is: its variance against equal trials
 * so cut (see keptEqual), its shape and tails against the best independent trials so cut, by resampling from them with
 * refitting. Adds to a diagnosis and decides nothing in it. Limits of the dispersion by chi-square, as for equal trials,
 * with the degrees of freedom that the rest's own scatter leaves where those are fewer.
 *
 * @param helper makes some of the draws elsewhere; see fittedTests
 * @returns null where N is unknown or above 1000, with a lump, where fewer than two counts are left, and where the cut
 * leaves room for two only: their mean then fixes everything
 */
export async function emptyAside(
  data: FitData,
  options: DiagnoseOptions,
  pace: Pace,
  helper?: DrawHelper
): Promise<EmptyAside | null> {
  const { trials, lump, below } = data;
  const kept = { from: 1, to: Infinity };
  if (trials === null || trials > mostBonds || lump || below || meanFixesVariance(trials, kept)) return null;
  const { rest: aside } = setEmptyAside(data);
  const rest: FitData = { ...aside, withoutEmpty: false };
  if (rest.total < 2 || rest.shots.filter((shots) => shots > 0).length < 2) return null;
  const { mean, variance } = sampleMoments(rest);
  const tested = keptNull(rest, kept, options);
  const { window, ceiling: ceilingAt } = tested.mostDispersed;
  const drawing = { resamples: Math.min(draws, options.resamples), seed: options.seed };
  const spread = await varianceTest(rest, window, ceilingAt, drawing, pace);
  const fitted = await fittedTests(rest, tested, { ...drawing, only: shape }, pace, helper);
  const tests = adjust([spread, ...fitted.tests]);
  const ceiling = tested.ceiling!;
  const value = (variance * rest.total) / (rest.total - 1) / ceiling;
  let fourth = 0;
  for (let i = 0; i < rest.shots.length; i++) fourth += rest.shots[i] * (rest.first + i - mean) ** 4;
  const scatter = fourth / (rest.total * variance * variance) - 1;
  const freedom = scatter > 0 ? Math.min(rest.total - 1, (2 * rest.total) / scatter) : rest.total - 1;
  const { low, high } = evenDispersionFactors(Math.max(2, freedom + 1), null, 0.025);
  const dispersion = { value, low: value * low, high: value * high };
  const verdict = judge(tests, dispersion.high, rest.total, options);
  return {
    shots: rest.total,
    mean,
    ceiling,
    dispersion,
    p: spread.p,
    smallestP: spread.smallestP,
    resamples: spread.resamples,
    tests,
    verdict,
    statement: sayRest(verdict, dispersion, tests, options.alpha)
  };
}

/** As the answer of a diagnosis is decided: never "compatible" with a test as extreme as its resamples can show. */
function judge(
  tests: TestResult[],
  high: number,
  shots: number,
  { alpha, tolerance }: DiagnoseOptions
): EmptyAside['verdict'] {
  const against = tests.filter(({ pAdjusted }) => pAdjusted <= alpha);
  if (against.some(({ id }) => id === 'ceiling')) return 'excess';
  if (against.length > 0) return 'misfit';
  if (tests.some(({ p, smallestP }) => p <= smallestP)) return 'undecided';
  return high < 1 + tolerance && shots >= fewest ? 'compatible' : 'undecided';
}
