import type { FitData } from '../fit/fit-data';
import { SequentialP } from '../multiple/sequential-p';
import type { TestId, TestResult } from '../types';
import type { DrawHelper } from './draw-helper';
import { expectedEmpty } from './empty-excess';
import { fittedDraws, type FittedJob } from './fitted-draws';
import type { FittedLevels } from './fitted-law';
import type { Pace } from './pace';
import { progress } from './progress';
import { SharedDraws } from './shared-draws';
import { lowTailOfTheRest, type StatisticId } from './statistics';
import { testResult } from './test-result';

/** Tests against the fitted law, refitted to every resample, and what else those resamples told. */
export interface FittedTests {
  tests: Omit<TestResult, 'pAdjusted'>[];
  notRun: { id: TestId; reason: string }[];
  /** KL of the first 149 resamples from their own refits, nats a shot: what the plug-in divergence shows when all is well. */
  nullDivergences: number[];
  /** p of the low tail with empty shots set aside; null when it was not asked. */
  lowTailOfTheRest: number | null;
  /** Empty shots that the law of the others expects; null when there are none of either. */
  expectedEmpty: number | null;
}

/**
 * Draws histograms from the fitted law, refits each, and recomputes every statistic (see fittedDraws);
 * p = (1 + #{≥ observed})/(B + 1), ended early by the rule of Besag & Clifford 1991.
 *
 * @param options `only`: just these tests, and no divergences; where they are far out hardly a draw needs a refit
 * @param helper makes some of the draws elsewhere; the answers are the same with and without
 */
export async function fittedTests(
  data: FitData,
  fit: { levels: FittedLevels; logLikelihood: number; drawnFrom?: FittedLevels },
  options: { resamples: number; seed: number; only?: readonly TestId[] },
  pace: Pace,
  helper?: DrawHelper
): Promise<FittedTests> {
  const { levels, logLikelihood, drawnFrom } = fit;
  const { resamples, seed, only } = options;
  const job: FittedJob = {
    data,
    levels,
    logLikelihood,
    ...(drawnFrom && { drawnFrom }),
    seed,
    ...(only && { whole: 0 })
  };
  const draws = fittedDraws(job);
  const shared = new SharedDraws(draws, job, resamples, helper);
  const runs = draws.questions
    .map(({ id, value }, i) => ({ id, value, bit: 1 << i, sequence: new SequentialP(resamples) }))
    .filter(({ id }) => !only || only.some((one) => one === id));
  const nullDivergences: number[] = [];
  let share = 0;
  const breathe = () => pace.breathe(share);
  for (let b = 0, wanted = unfinished(runs); wanted !== 0; b++, wanted = unfinished(runs)) {
    const { exceeds, divergence } = await shared.answer(b, wanted, share, breathe);
    if (divergence !== null) nullDivergences.push(divergence);
    for (const { bit, sequence } of runs) sequence.push((exceeds & bit) !== 0);
    share = Math.min(...runs.map(({ sequence }) => progress(sequence)));
    await breathe();
  }
  const p = (id: StatisticId) => runs.find((run) => run.id === id)?.sequence.p ?? null;
  return {
    tests: runs
      .filter((run) => run.id !== lowTailOfTheRest)
      .map(({ id, value, sequence }) => testResult(id as TestId, value, sequence)),
    notRun: draws.notRun,
    nullDivergences,
    lowTailOfTheRest: p(lowTailOfTheRest),
    expectedEmpty: expectedEmpty(draws.observed)
  };
}

/** Bits of the tests that want more draws. */
function unfinished(runs: { bit: number; sequence: SequentialP }[]): number {
  return runs.reduce((bits, { bit, sequence }) => (sequence.done ? bits : bits | bit), 0);
}
