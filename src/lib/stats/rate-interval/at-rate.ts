import type { FitData } from '../fit/fit-data';
import { misreadNull } from '../nulls/misread-null';
import { varianceTest } from '../resampling/ceiling-test';
import type { DrawHelper } from '../resampling/draw-helper';
import { fittedTests } from '../resampling/fitted-tests';
import type { Pace } from '../resampling/pace';
import type { Certificate, DiagnoseOptions, Histogram, TestId, TestResult } from '../types';

/** A test before adjustment for the others. */
export type BareTest = Omit<TestResult, 'pAdjusted'>;

/** What every test says where a site is misread at one rate. */
export interface AtRate {
  rate: number;
  ceiling: number;
  tests: BareTest[];
  certificate: Certificate | null;
  /** Left out: every test was asked. */
  only?: readonly TestId[];
}

/**
 * The ceiling test, the tests of the fit and the certificate at one misread rate.
 *
 * @param enough asked once the ceiling test is known: true ends there, where that alone settles the answer
 * @param helper makes some of the draws elsewhere; see fittedTests
 */
export async function atRate(
  counts: FitData,
  histogram: Histogram,
  rate: number,
  options: DiagnoseOptions,
  pace: Pace,
  enough: (ceiling: BareTest) => boolean = () => false,
  helper?: DrawHelper
): Promise<AtRate> {
  const tested = misreadNull(counts, histogram, rate, options);
  const drawing = { resamples: options.resamples, seed: options.seed };
  const { window, ceiling } = tested.mostDispersed;
  const variance = await varianceTest(counts, window, ceiling, drawing, partOf(pace, 0, 0.2));
  const rest = enough(variance)
    ? []
    : (await fittedTests(counts, tested, drawing, partOf(pace, 0.2, 1), helper)).tests;
  return { rate, ceiling: tested.ceiling!, tests: [variance, ...rest], certificate: tested.certificate };
}

/** A stretch of a pace, as a pace. */
export function partOf(pace: Pace, from: number, to: number): Pace {
  return { breathe: (share) => pace.breathe(from + (to - from) * Math.min(1, share)) };
}
