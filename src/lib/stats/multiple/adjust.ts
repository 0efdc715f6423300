import type { TestResult } from '../types';
import { holm } from './holm';

/** Adds Holm's adjusted p over the tests that ran. */
export function adjust(tests: Omit<TestResult, 'pAdjusted'>[]): TestResult[] {
  const adjusted = holm(tests.map((test) => test.p));
  return tests.map((test, i) => ({
    id: test.id,
    statistic: test.statistic,
    p: test.p,
    pAdjusted: adjusted[i],
    smallestP: test.smallestP,
    source: test.source,
    resamples: test.resamples,
    stoppedEarly: test.stoppedEarly
  }));
}
