import type { BestLaw } from '../fit/best-law';
import type { FitData } from '../fit/fit-data';
import { lawWindow } from '../laws/law-window';
import { SequentialP } from '../multiple/sequential-p';
import { generator } from '../random/generator';
import { toLaw } from '../fit/trial-levels';
import type { TestId, TestResult } from '../types';
import { expectedEmpty } from './empty-excess';
import type { Pace } from './pace';
import { progress } from './progress';
import { largestGSquared } from './largest-g-squared';
import { redraw } from './redraw';
import { refitted, type Buffers, type Refitted } from './refitted';
import { chooseStatistics, lowTailOfTheRest, type StatisticId } from './statistics';
import { stream } from './streams';
import { testResult } from './test-result';

/** Tests against the fitted law, refitted to every resample, and what else those resamples told. */
export interface FittedTests {
  tests: Omit<TestResult, 'pAdjusted'>[];
  notRun: { id: TestId; reason: string }[];
  /** KL of the first 299 resamples from their own refits, nats a shot: what the plug-in divergence shows when all is well. */
  nullDivergences: number[];
  /** p of the low tail with empty shots set aside; null when it was not asked. */
  lowTailOfTheRest: number | null;
  /** Empty shots that the law of the others expects; null when there are none of either. */
  expectedEmpty: number | null;
}

/** Their mean is then known to a seventeenth of their standard deviation, and later draws need no refit for it. */
const divergencesKept = 299;

/**
 * Draws histograms from the fitted law, refits each, and recomputes every statistic;
 * p = (1 + #{≥ observed})/(B + 1), ended early by the rule of Besag & Clifford 1991.
 *
 * A draw that no refit could bring near the observed value is counted without one: see Statistic.most. Where the
 * data are clear, that is nearly every draw; the answers are the same.
 */
export async function fittedTests(
  data: FitData,
  fit: BestLaw,
  options: { resamples: number; seed: number },
  pace: Pace
): Promise<FittedTests> {
  const window = lawWindow(toLaw(fit.levels), 1e-18, 1);
  const observed = refitted(data, fit.levels, {
    levels: fit.levels,
    logLikelihood: fit.logLikelihood,
    window
  });
  const { statistics, notRun } = chooseStatistics(observed);
  const runs = [...statistics].map(([id, statistic]) => {
    const value = statistic.of(observed);
    // Equal up to rounding counts as equal: a resample that repeats the data must count.
    const bar = value - 1e-9 * Math.max(1, Math.abs(value));
    return { id, statistic, value, bar, sequence: new SequentialP(options.resamples) };
  });
  const source = redraw(window, data, data.total);
  const nullDivergences: number[] = [];
  const buffers: Buffers = {};
  for (let b = 0; runs.some(({ sequence }) => !sequence.done); b++) {
    const resample = source.draw(generator(options.seed, stream('fitted law', b)));
    const most = largestGSquared(resample, window);
    let drawn: Refitted | null = null;
    const refit = () => (drawn ??= refitted(resample, fit.levels, undefined, buffers));
    if (b < divergencesKept) nullDivergences.push(refit().divergence);
    for (const { statistic, bar, sequence } of runs) {
      if (sequence.done) continue;
      const near = statistic.most(resample, most) >= bar;
      sequence.push(near && statistic.of(refit()) >= bar);
    }
    await pace.breathe(Math.min(...runs.map(({ sequence }) => progress(sequence))));
  }
  const p = (id: StatisticId) => runs.find((run) => run.id === id)?.sequence.p ?? null;
  return {
    tests: runs
      .filter((run) => run.id !== lowTailOfTheRest)
      .map(({ id, value, sequence }) => testResult(id as TestId, value, sequence)),
    notRun,
    nullDivergences,
    lowTailOfTheRest: p(lowTailOfTheRest),
    expectedEmpty: expectedEmpty(observed)
  };
}
