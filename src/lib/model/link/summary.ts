import type { Diagnosis, Flag, Interval, TestResult } from '$lib/stats/types';
import { formatNumber } from '../format-number';
import { rounded, roundedInterval } from './rounded';

/**
 * Fewer different counts than this, and a mean, a variance and a number of shots would leave next to nothing to guess:
 * a link cannot hide such counts, and is not made.
 */
export const LEAST_TO_HIDE = 6;

/** Third and fourth cumulant and the best law are kept back below this many different counts, for the same reason. */
export const LEAST_FOR_LAW = 8;

type Kept = 'answer' | 'cautions' | 'engine' | 'notRun';

/** A diagnosis without its counts, and without the numbers from which they could be worked out. */
export interface Summary extends Pick<Diagnosis, Kept> {
  format: 'severalty.summary/1';
  data: Omit<Diagnosis['data'], 'counts' | 'lump' | 'digest'>;
  moments: Record<'mean' | 'variance' | 'fano' | 'dispersion', Interval> & {
    third: Interval | null;
    fourth: Interval | null;
  };
  fit: Pick<Diagnosis['fit'], 'divergenceInterval'> & {
    law: Pick<Diagnosis['fit'], 'levels' | 'poissonPart'> | null;
  };
  tests: Omit<TestResult, 'statistic'>[];
  flags: Flag[];
}

/** How many different counts were seen, the closing row "or more" being one. */
export function differentCounts({ data }: Pick<Diagnosis, 'data'>): number {
  return data.counts.filter(([, shots]) => shots > 0).length + (data.lump ? 1 : 0);
}

/**
 * What a link shows that keeps the counts back.
 *
 * Gone: counts, closing row and their digest (short histograms can be guessed and hashed), the seen shares and their
 * intervals in distribution, rate and tails (an exact interval gives its count back), statistics of tests,
 * likelihoods and G² (whole sums of counts at sixteen digits), and the sentences that name numbers of shots. What
 * stays of numbers has three digits. The law and the mean tell roughly how often each count came, as every published
 * fit does; not the numbers themselves.
 */
export function withoutCounts(diagnosis: Diagnosis): Summary {
  const { shots, trials, unit, geometry, misread, ordered, batches } = diagnosis.data;
  const { mean, variance, third, fourth, fano, dispersion } = diagnosis.moments;
  const wide = differentCounts(diagnosis) >= LEAST_FOR_LAW;
  return {
    format: 'severalty.summary/1',
    engine: diagnosis.engine,
    data: { shots, trials, unit, geometry, misread, ordered, batches },
    moments: {
      mean: roundedInterval(mean),
      variance: roundedInterval(variance),
      fano: roundedInterval(fano),
      dispersion: roundedInterval(dispersion),
      third: wide ? roundedInterval(third) : null,
      fourth: wide ? roundedInterval(fourth) : null
    },
    fit: {
      divergenceInterval: roundedInterval(diagnosis.fit.divergenceInterval),
      law: wide
        ? {
            levels: diagnosis.fit.levels.map(({ p, trials }) => ({ p: rounded(p), trials })),
            poissonPart: rounded(diagnosis.fit.poissonPart)
          }
        : null
    },
    tests: diagnosis.tests.map(withoutStatistic),
    notRun: diagnosis.notRun,
    flags: diagnosis.flags.map(withoutNumbersOfShots),
    answer: { ...diagnosis.answer, because: reasons(diagnosis) },
    cautions: diagnosis.cautions.filter((caution) => !diagnosis.data.lump || !/lumps counts/.test(caution))
  };
}

function withoutStatistic(test: TestResult): Omit<TestResult, 'statistic'> {
  const { id, p, pAdjusted, smallestP, source, resamples, stoppedEarly } = test;
  return { id, p, pAdjusted, smallestP, source, resamples, stoppedEarly };
}

/** Flags about one count, or one half of them, give the shots with it; their words stay, their size goes. */
function withoutNumbersOfShots(flag: Flag): Flag {
  const size = flag.id === 'dead-shots' || flag.id === 'pairing' ? '' : flag.size;
  return { ...flag, size };
}

/** Reasons of the answer; the certificate's names the shots in a tail, so only its p is told. */
function reasons({ answer, tails }: Diagnosis): string[] {
  return answer.because.map((reason) =>
    reason.startsWith('Exact certificate') && tails.certificate
      ? `Exact certificate, without fit or simulation, of a tail heavier than independent trials allow (p at most ${formatNumber(tails.certificate.p, 2)}).`
      : reason
  );
}
