import { carefulThird, LEAST_SHOTS } from '$lib/stats/claim/careful-third';
import { pLimits } from '$lib/stats/claim/p-limits';
import { thirdOverMean } from '$lib/stats/claim/third-over-mean';
import type { Diagnosis, Interval, TestResult } from '$lib/stats/types';
import type { Summary } from '../link/summary';
import { TESTS } from '../labels';

/** Something that a manuscript may claim, with what the report says of it. */
export interface Quantity {
  id: string;
  label: string;
  interval: Interval;
  /** A p-value: never negative, never above 1, and often claimed as "less than". */
  isP: boolean;
  /** Cannot be below 0. */
  positive: boolean;
  /** What to know of this interval; empty when it is the document's own. */
  note: string;
}

const NONE: Interval = { value: null, low: null, high: null };

/** All quantities that claims can be made of, from a report with or without its counts. */
export function quantitiesOf(report: Diagnosis | Summary): Quantity[] {
  const { moments, fit, data } = report;
  const { shots } = data;
  const third = moments.third === null ? NONE : carefulThird(moments.third, shots);
  const ratio = thirdOverMean({ ...moments, third }, shots);
  const thirdNote =
    moments.third === null
      ? 'The third cumulant is kept back with the counts.'
      : shots < LEAST_SHOTS
        ? `Fewer than ${LEAST_SHOTS} shots carry no third cumulant that a claim could be held to.`
        : 'The interval is the report’s, widened by 1 + 8/√S: a third cumulant errs more often than its interval says.';
  const tests: Pick<TestResult, 'id' | 'p' | 'source' | 'resamples' | 'stoppedEarly'>[] = report.tests;
  const plain = (id: string, label: string, interval: Interval, note = '', positive = true): Quantity => ({
    id,
    label,
    interval,
    isP: false,
    positive,
    note
  });
  return [
    plain('mean', 'mean, κ₁', moments.mean),
    plain('variance', 'variance, κ₂', moments.variance),
    plain('third', 'third cumulant, κ₃', third, thirdNote, false),
    plain('fano', 'κ₂/κ₁, Fano factor', moments.fano),
    plain(
      'third-over-mean',
      'κ₃/κ₁',
      ratio,
      `${thirdNote} The ratio’s interval follows from those of κ₁ and κ₃ by the delta method, with Cov(κ₁, κ₃) = κ₄/S.`,
      false
    ),
    plain(
      'divergence',
      'divergence from the best law, nats a shot',
      fit.divergenceInterval,
      'Chance is taken off. A divergence claimed without that is larger by what chance alone gives.'
    ),
    ...tests.map((test) => ({
      id: `p-${test.id}`,
      label: `p of the test “${TESTS[test.id]}”`,
      interval: pLimits(test),
      isP: true,
      positive: true,
      note:
        test.source === 'exact' || test.source === 'limit'
          ? 'By itself, before other tests are allowed for.'
          : 'By itself, before other tests are allowed for. The interval is what other resamples could make of it.'
    }))
  ];
}
