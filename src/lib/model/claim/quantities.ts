import { carefulThird, LEAST_SHOTS } from '$lib/stats/claim/careful-third';
import { pLimits } from '$lib/stats/claim/p-limits';
import { thirdOverMean } from '$lib/stats/claim/third-over-mean';
import type { Diagnosis, Interval, TestResult } from '$lib/stats/types';
import type { Summary, SummaryTest } from '../link/summary';
import { TESTS } from '../labels';
import { lumpsOf, type Lumps } from '../lump-words';

/** Something that a manuscript may claim, with what the report says of it. */
export interface Quantity {
  id: string;
  label: string;
  interval: Interval;
  /** A p-value: never negative, never above 1, and often claimed as "less than". */
  isP: boolean;
  /** Cannot be below 0. */
  positive: boolean;
  /** A whole number claimed of it is meant exactly: "a Fano factor of 1" is not 1 ± 0.5. */
  wholeIsExact: boolean;
  /** Why lumped counts leave the claim open, in words that end a sentence; null without a lump. */
  lumped: string | null;
  /** What to know of this interval; empty when it is the document's own. */
  note: string;
}

const NONE: Interval = { value: null, low: null, high: null };

/** All quantities that claims can be made of, from a report with or without its counts. */
export function quantitiesOf(report: Diagnosis | Summary): Quantity[] {
  const { moments, fit, data } = report;
  const { shots } = data;
  const lumps: Lumps =
    'lumped' in data ? { above: data.lumped, below: data.opening ?? false } : lumpsOf(data);
  const lumped = lumps.above || lumps.below ? sayLumps(lumps) : null;
  const third = moments.third === null ? NONE : carefulThird(moments.third, shots);
  const ratio = thirdOverMean({ ...moments, third }, shots);
  const thirdNote = noteOfThird(moments.third, shots);
  const ofMoment = (
    id: string,
    label: string,
    interval: Interval,
    more: Partial<Quantity> = {}
  ): Quantity => ({
    ...PLAIN,
    id,
    label,
    ...more,
    interval: lumped ? lumpedLimits(id, interval, lumps) : interval,
    lumped,
    note: lumped ? `${noteOfLumps(lumped, lumps)} ${more.note ?? ''}`.trim() : (more.note ?? '')
  });
  return [
    ofMoment('mean', 'mean, κ₁', moments.mean),
    ofMoment('variance', 'variance, κ₂', moments.variance),
    ofMoment('third', 'third cumulant, κ₃', third, { note: thirdNote, positive: false }),
    ofMoment('fano', 'κ₂/κ₁, Fano factor', moments.fano, { wholeIsExact: true }),
    ofMoment('third-over-mean', 'κ₃/κ₁', ratio, {
      note: `${thirdNote} The ratio’s interval follows from those of κ₁ and κ₃ by the delta method, with Cov(κ₁, κ₃) = κ₄/S.`,
      positive: false,
      wholeIsExact: true
    }),
    {
      ...PLAIN,
      id: 'divergence',
      label: 'divergence from the best law, nats a shot',
      interval: fit.divergenceInterval ?? NONE,
      wholeIsExact: true,
      note: fit.divergenceInterval
        ? 'Chance is taken off. A divergence claimed without that is larger by what chance alone gives.'
        : 'The divergence is kept back with the counts.'
    },
    ...report.tests.map((test) => ofTest(test))
  ];
}

const PLAIN = { isP: false, positive: true, wholeIsExact: false, lumped: null };

function sayLumps({ above, below }: Lumps): string {
  if (above && below)
    return 'The first and the last row lump counts, counted as near to the others as they can be';
  return below
    ? 'The first row lumps counts, counted at the most they can be'
    : 'The last row lumps counts, counted at the least they can be';
}

function noteOfLumps(words: string, { above, below }: Lumps): string {
  const but =
    above === below ? '' : `, but for a mean ${below ? 'above its upper' : 'below its lower'} limit`;
  return `${words}, so this cannot settle a claim${but}.`;
}

/**
 * A mean with a closing row lumped is no larger than the true one, so its lower limit holds and a claim below it is wrong;
 * with an opening row its upper limit. Of the others neither limit is used: a ratio of two lower limits may err to either
 * side.
 */
const lumpedLimits = (id: string, { value, low, high }: Interval, { above, below }: Lumps): Interval => ({
  value,
  low: id === 'mean' && !below ? low : null,
  high: id === 'mean' && !above ? high : null
});

function noteOfThird(third: Interval | null, shots: number): string {
  if (third === null) return 'The third cumulant is kept back with the counts.';
  return shots < LEAST_SHOTS
    ? `Fewer than ${LEAST_SHOTS} shots carry no third cumulant that a claim could be held to.`
    : 'The interval is the report’s, widened by 1 + 8/√S: a third cumulant errs more often than its interval says.';
}

function ofTest(test: TestResult | SummaryTest): Quantity {
  const exact = test.source === 'exact' || test.source === 'limit';
  const itself = 'By itself, before other tests are allowed for.';
  return {
    ...PLAIN,
    id: `p-${test.id}`,
    label: `p of the test “${TESTS[test.id]}”`,
    interval: 'limits' in test ? test.limits : pLimits(test),
    isP: true,
    wholeIsExact: true,
    note: exact ? itself : `${itself} The interval is what other resamples could make of it.`
  };
}
