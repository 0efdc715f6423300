import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { binomialWindow } from '../laws/binomial-window';
import { poissonWindow } from '../laws/poisson-window';
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
  const window = data.trials === null ? poissonWindow(p, 1e-18, 1) : binomialWindow(data.trials, p, 1e-18, 1);
  const source = redraw(window, data, data.total);
  const statistic = excess(data);
  // Equal up to rounding counts as equal: S·ε of the sum of squares.
  const slack = 1e-12 * Math.max(1, Math.abs(statistic));
  const sequence = new SequentialP(options.resamples);
  for (let b = 0; !sequence.done; b++) {
    const drawn = source.draw(generator(options.seed, stream('equal trials', b)));
    sequence.push(excess(drawn) >= statistic - slack);
    await pace.breathe(progress(sequence));
  }
  return testResult('ceiling', statistic, sequence);
}

function excess(data: FitData): number {
  const { mean, variance } = sampleMoments(data);
  const unbiased = (variance * data.total) / (data.total - 1);
  return unbiased - mean * (1 - (data.trials === null ? 0 : mean / data.trials));
}
