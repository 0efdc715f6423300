import { pLimits } from '$lib/stats/claim/p-limits';
import type { Diagnosis, Flag, Interval, MisreadPart, TestResult } from '$lib/stats/types';
import { differentCounts, LEAST_SHOTS_FOR_LAW, LEAST_TO_HIDE } from './hides-counts';
import { rounded, roundedAll, roundedOutward } from './rounded';
import { summaryWords } from './summary-words';

/** Significant digits of a p-value: a third one tells histograms apart. */
const DIGITS_OF_P = 2;

/** A test by its p, with what its resamples leave open; statistic, draws and smallest p are kept back. */
export interface SummaryTest extends Pick<TestResult, 'id' | 'p' | 'pAdjusted' | 'source'> {
  limits: Interval;
}

/** A diagnosis without its counts, and without the numbers that tell most about them. */
export interface Summary extends Pick<Diagnosis, 'answer' | 'cautions' | 'notRun'> {
  format: 'severalty.summary/1';
  engine: Omit<Diagnosis['engine'], 'seed' | 'resamples'>;
  data: Omit<Diagnosis['data'], 'counts' | 'lump' | 'below' | 'digest'> & {
    /** True when the last row lumps counts: the moments are lower limits then. */
    lumped: boolean;
    /** True when the first row lumps counts; left out otherwise. */
    opening?: true;
  };
  moments: Record<'mean' | 'variance' | 'fano' | 'dispersion', Interval> & {
    third: Interval | null;
    fourth: Interval | null;
  };
  fit: {
    divergenceInterval: Interval | null;
    law: Pick<Diagnosis['fit'], 'levels' | 'poissonPart'> | null;
  };
  /** Whether misreads were allowed for, and the rate that would explain the variance; the ceilings are left out. */
  nuisances?: { misread: Pick<MisreadPart, 'applied' | 'neededRate'> };
  tests: SummaryTest[];
  flags: Flag[];
}

/**
 * What a link shows that does not show the counts.
 *
 * Gone: counts, closing row and their digest (short histograms can be guessed and hashed), the seen shares and their
 * intervals in distribution, rate and tails (an exact interval gives its count back), statistics of tests,
 * likelihoods and G² (whole sums of counts at sixteen digits), seed and resamples, and the sentences that name numbers
 * of shots. Every number has three digits, a p two, an interval those that its width carries; what was set before
 * anything was counted, and the number of shots, are told as they are. Third and fourth cumulant, divergence and law
 * wait for many shots.
 *
 * This does not make the counts secret. Who guesses them, or tries all that fit mean and variance, can diagnose the
 * guess and check it against what is left; the defaults of seed and resamples are no secret either. Large data leave
 * many histograms that fit, small data few, and where the line runs is not proven: hidesCounts refuses the clear cases.
 */
export function withoutCounts(diagnosis: Diagnosis): Summary {
  const { shots, trials, unit, geometry, misread, ordered, batches, lump, below } = diagnosis.data;
  const { misreadUncertainty, kept } = diagnosis.data;
  const { version, alpha, tolerance } = diagnosis.engine;
  const { mean, variance, third, fourth, fano, dispersion } = diagnosis.moments;
  const { levels, poissonPart, divergenceInterval } = diagnosis.fit;
  const many = shots >= LEAST_SHOTS_FOR_LAW && differentCounts(diagnosis) >= LEAST_TO_HIDE;
  const { answer, flags, cautions } = summaryWords(diagnosis);
  const measured = roundedAll({
    moments: { mean, variance, fano, dispersion, third: many ? third : null, fourth: many ? fourth : null },
    fit: {
      divergenceInterval: many ? divergenceInterval : null,
      law: many ? { levels: levels.map(({ p, trials }) => ({ p, trials })), poissonPart } : null
    },
    flags,
    answer
  });
  return {
    format: 'severalty.summary/1',
    engine: { version, alpha, tolerance },
    data: {
      shots,
      trials,
      unit,
      geometry,
      misread,
      ...(misreadUncertainty ? { misreadUncertainty } : {}),
      ...(kept ? { kept } : {}),
      ordered,
      batches,
      lumped: lump !== null,
      ...(below && { opening: true as const })
    },
    ...measured,
    ...(diagnosis.nuisances?.misread ? { nuisances: ofMisreads(diagnosis.nuisances.misread) } : {}),
    tests: diagnosis.tests.map(ofTest),
    notRun: diagnosis.notRun,
    cautions
  };
}

/** Two digits of the rate, as of a p: mean and variance, which it is made of, are told with as many as they carry. */
const ofMisreads = ({ applied, neededRate }: MisreadPart): Summary['nuisances'] => ({
  misread: { applied, neededRate: roundedOutward(neededRate, DIGITS_OF_P) }
});

function ofTest(test: TestResult): SummaryTest {
  const { id, p, pAdjusted, source } = test;
  const { value, low, high } = roundedOutward(pLimits(test), DIGITS_OF_P);
  return {
    id,
    p: rounded(p, DIGITS_OF_P),
    pAdjusted: rounded(pAdjusted, DIGITS_OF_P),
    source,
    limits: { value, low, high: high === null ? null : Math.min(1, high) }
  };
}
