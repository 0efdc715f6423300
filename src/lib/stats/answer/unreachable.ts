import type { Evidence } from '../flags/evidence';
import type { TestResult } from '../types';

/**
 * Tests at the smallest p that their resamples can show, which once adjusted still lies above α: nothing was as
 * extreme as the data, and yet nothing can be ruled out. Such data must not be called compatible.
 */
export function unreachable({ tests, options }: Pick<Evidence, 'tests' | 'options'>): TestResult[] {
  return tests.filter(
    (test) => test.resamples > 0 && test.p <= test.smallestP && test.pAdjusted > options.alpha
  );
}

/** Resamples with which the smallest p, times the number of tests, reaches α; β of a misread rate is part of each p. */
export function resamplesNeeded({
  tests,
  options,
  rates
}: Pick<Evidence, 'tests' | 'options' | 'rates'>): number {
  return Math.ceil(tests.length / (options.alpha - tests.length * (rates?.miss ?? 0)));
}
