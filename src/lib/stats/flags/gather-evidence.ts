import type { DriftPart } from '../drift/types';
import type { FitData } from '../fit/fit-data';
import { evenShots } from './even-shots';
import type { FittedTests } from '../resampling/fitted-tests';
import type { MisreadUse } from '../nulls/misread-applies';
import type { RateSpread } from '../rate-interval/types';
import type { FittedLaw } from '../resampling/fitted-law';
import type { Certificate, DiagnoseOptions, TestResult } from '../types';
import type { Evidence } from './evidence';

export interface Gathered {
  options: DiagnoseOptions;
  counts: FitData;
  trials: number | null;
  moments: Evidence['moments'];
  tests: TestResult[];
  certificate: Certificate | null;
  fitted: FittedTests;
  law: FittedLaw;
  neighbours: Evidence['neighbours'];
  misread: MisreadUse;
  rates: RateSpread | undefined;
  drift: DriftPart | undefined;
  fixed: boolean;
  cut: Evidence['cut'];
}

/** What flags and the answer are decided from, out of the parts of a diagnosis. */
export function evidenceOf({
  options,
  counts,
  trials,
  moments,
  tests,
  certificate,
  fitted,
  law,
  neighbours,
  misread,
  rates,
  drift,
  fixed,
  cut
}: Gathered): Evidence {
  return {
    options,
    shots: counts.total,
    trials,
    moments,
    tests,
    certificate,
    neighbours,
    misread,
    fixed,
    ...(cut && { cut }),
    ...(rates && { rates }),
    ...(drift && { drift }),
    lowTailOfTheRest: fitted.lowTailOfTheRest,
    empty: { seen: counts.first === 0 ? (counts.shots[0] ?? 0) : 0, expected: fitted.expectedEmpty },
    even: counts.lump || counts.below ? null : evenShots(counts, law)
  };
}
