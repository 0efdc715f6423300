import type { SequentialP } from '../multiple/sequential-p';
import type { TestId, TestResult } from '../types';

/** What a finished resampling run says, before adjustment for the other tests. */
export function testResult(
  id: TestId,
  statistic: number,
  sequence: SequentialP
): Omit<TestResult, 'pAdjusted'> {
  return {
    id,
    statistic,
    p: sequence.p,
    smallestP: sequence.smallestP,
    source: 'resampled',
    resamples: sequence.draws,
    stoppedEarly: sequence.stoppedEarly
  };
}
