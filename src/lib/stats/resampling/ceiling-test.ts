import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { binomialWindow } from '../laws/binomial-window';
import { poissonWindow } from '../laws/poisson-window';
import type { Window } from '../laws/window';
import { SequentialP } from '../multiple/sequential-p';
import { generator } from '../random/generator';
import type { TestResult } from '../types';
import type { Pace } from './pace';
import { progress } from './progress';
import { redraw } from './redraw';
import { stream } from './streams';
import { testResult } from './test-result';

/**
 * Ceiling test: s² − μ̂(1−μ̂/N), s² unbiased, against equal trials at the observed mean (Poisson when N is
 * unknown), the most dispersed of all independent-trial laws of that mean. One-sided, and conservative for
 * uneven trials.
 *
 * @param p probability of the equal trials, or their mean when N is unknown
 * A lump counts as its first count, in the data and in every resample alike.
 */
export async function ceilingTest(
  data: FitData,
  p: number,
  options: { resamples: number; seed: number },
  pace: Pace
): Promise<Omit<TestResult, 'pAdjusted'>> {
  const { window, ceiling } = equalWindow(data.trials, p);
  return varianceTest(data, window, ceiling, options, pace);
}

/** Equal trials at `p` (Poisson of that mean when N is unknown), and the ceiling they reach, as a function of the mean. */
export function equalWindow(
  trials: number | null,
  p: number
): { window: Window; ceiling: (mean: number) => number } {
  return {
    window: trials === null ? poissonWindow(p, 1e-18, 1) : binomialWindow(trials, p, 1e-18, 1),
    ceiling: (mean) => mean * (1 - (trials === null ? 0 : mean / trials))
  };
}

/**
 * The same for another ceiling: s² − ceiling(μ̂) against histograms drawn from a law.
 *
 * @param window the most dispersed law of the null at the observed mean
 * @param ceiling largest variance at a mean
 */
export async function varianceTest(
  data: FitData,
  window: Window,
  ceiling: (mean: number) => number,
  options: { resamples: number; seed: number },
  pace: Pace
): Promise<Omit<TestResult, 'pAdjusted'>> {
  const source = redraw(window, data, data.total);
  const statistic = excess(data, ceiling);
  // Equal up to rounding counts as equal: S·ε of the sum of squares.
  const slack = 1e-12 * Math.max(1, Math.abs(statistic));
  const sequence = new SequentialP(options.resamples);
  for (let b = 0; !sequence.done; b++) {
    const drawn = source.draw(generator(options.seed, stream('equal trials', b)));
    sequence.push(excess(drawn, ceiling) >= statistic - slack);
    await pace.breathe(progress(sequence));
  }
  return testResult('ceiling', statistic, sequence);
}

function excess(data: FitData, ceiling: (mean: number) => number): number {
  const { mean, variance } = sampleMoments(data);
  const unbiased = (variance * data.total) / (data.total - 1);
  return unbiased - ceiling(mean);
}
