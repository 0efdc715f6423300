import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { evenDispersionFactors } from '../moments/even-dispersion-factors';
import { mostBonds } from '../nulls/misread-applies';
import { varianceTest } from '../resampling/ceiling-test';
import type { Pace } from '../resampling/pace';
import { setEmptyAside } from '../resampling/set-empty-aside';
import type { DiagnoseOptions, Interval } from '../types';
import { sayInterval } from '../words/say-interval';
import { sayHowOften } from '../words/say-p';
import { keptEqual } from './kept-equal';
import { windowMoments } from './window-moments';

/** The shots with at least one defect, tested as counts of 1 and more. */
export interface EmptyAside {
  shots: number;
  mean: number;
  /** Largest variance of independent trials of which the empty shots were dropped, at that mean. */
  ceiling: number;
  dispersion: Interval;
  p: number;
  smallestP: number;
  resamples: number;
  verdict: 'compatible' | 'excess' | 'undecided';
  statement: string;
}

/** Resamples: each costs a few microseconds, and the p stands beside others. */
const draws = 999;
/** As in the answer. */
const fewest = 50;

/**
 * Sets the empty shots aside and tests the variance of the rest against equal trials so cut (see keptEqual). Adds to a
 * diagnosis and decides nothing in it. Limits by chi-square, as for equal trials, with the degrees of freedom that the
 * rest's own scatter leaves where those are fewer.
 *
 * @returns null where N is unknown or above 1000, with a lump, and where fewer than two counts are left
 */
export async function emptyAside(
  data: FitData,
  options: DiagnoseOptions,
  pace: Pace
): Promise<EmptyAside | null> {
  const { trials, lump, below } = data;
  if (trials === null || trials < 2 || trials > mostBonds || lump || below) return null;
  const { rest: aside } = setEmptyAside(data);
  const rest: FitData = { ...aside, withoutEmpty: false };
  if (rest.total < 2 || rest.shots.filter((shots) => shots > 0).length < 2) return null;
  const kept = { from: 1, to: Infinity };
  const { mean, variance } = sampleMoments(rest);
  const window = keptEqual(trials, kept, mean);
  const ceiling = windowMoments(window).variance;
  const test = await varianceTest(
    rest,
    window,
    (at) => windowMoments(keptEqual(trials, kept, at)).variance,
    { ...options, resamples: Math.min(draws, options.resamples) },
    pace
  );
  const value = (variance * rest.total) / (rest.total - 1) / ceiling;
  let fourth = 0;
  for (let i = 0; i < rest.shots.length; i++) fourth += rest.shots[i] * (rest.first + i - mean) ** 4;
  const scatter = fourth / (rest.total * variance * variance) - 1;
  const freedom = scatter > 0 ? Math.min(rest.total - 1, (2 * rest.total) / scatter) : rest.total - 1;
  const { low, high } = evenDispersionFactors(Math.max(2, freedom + 1), null, 0.025);
  const dispersion = { value, low: value * low, high: value * high };
  const verdict =
    test.p <= options.alpha
      ? 'excess'
      : dispersion.high < 1 + options.tolerance && rest.total >= fewest
        ? 'compatible'
        : 'undecided';
  const measured = `With the empty shots set aside and the rest tested as counts of 1 and more, the variance is ${sayInterval(dispersion, 3)} times the ceiling of independent trials so cut:`;
  const end = {
    compatible:
      'the rest keeps it, so their variance does not speak against independent trials; their shape was not tested by itself.',
    excess: `the excess is there without them too. One as large ${sayHowOften(test.p, test.smallestP)} under independent trials so cut.`,
    undecided: 'the rest neither breaks it nor excludes an excess that matters.'
  };
  return {
    shots: rest.total,
    mean,
    ceiling,
    dispersion,
    p: test.p,
    smallestP: test.smallestP,
    resamples: test.resamples,
    verdict,
    statement: `${measured} ${end[verdict]}`
  };
}
