import type { TestResult } from '../types';
import { sayP } from './say-p';

/** How often the result of a test would turn up under independent trials, plain first. */
export function sayTest(test: TestResult): string {
  return sayP(test.p, test.smallestP, test.resamples);
}
