import type { Explanations } from '$lib/stats/explanations/types';
import type { Diagnosis, Interval, TestResult } from '$lib/stats/types';

/** A test; what its resamples were is missing where a link keeps the counts back. */
export interface QuotableTest extends Pick<TestResult, 'id' | 'p' | 'pAdjusted' | 'source'> {
  /** Whether p is the smallest that its resamples can show. */
  atSmallest: boolean;
  resamples: number | null;
  stoppedEarly: boolean;
  /** What the resamples leave open of p, where they are not told; else null. */
  limits: Interval | null;
}

/** What the words are made of: a whole document, or what a link without counts leaves of it. Null: not known. */
export interface Quotable {
  answer: Pick<Diagnosis['answer'], 'verdict' | 'smallestExcess' | 'shotsToDecide'>;
  data: Pick<
    Diagnosis['data'],
    | 'shots'
    | 'trials'
    | 'unit'
    | 'geometry'
    | 'misread'
    | 'misreadUncertainty'
    | 'kept'
    | 'ordered'
    | 'batches'
  > & {
    digest: string | null;
    /** True where a stated misread rate was allowed for in every test. */
    misreadApplied: boolean;
    /** The closing row; its first count is null where it is kept back. */
    lump: { from: number | null } | null;
    /** The opening row; its last count is null where it is kept back. */
    opening: { to: number | null } | null;
  };
  moments: Record<'mean' | 'variance' | 'dispersion', Interval>;
  fit: {
    /** Chance taken off; null where it is kept back. */
    divergence: Interval | null;
    gSquared: number | null;
    /** Null where it is kept back. */
    certified: boolean | null;
    /** Divergence as found, and the floor under it; null where they are kept back. */
    found: number | null;
    floor: number | null;
  };
  tests: QuotableTest[];
  notRun: Diagnosis['notRun'];
  certificate: Diagnosis['tails']['certificate'];
  flags: Diagnosis['flags'];
  /** Null where no story was told, or where it is kept back. */
  explanations: Explanations | null;
  engine: Omit<Diagnosis['engine'], 'seed' | 'resamples'> & { seed: number | null; resamples: number | null };
}

/** What there is to quote of a whole document. */
export function quotableOf(diagnosis: Diagnosis): Quotable {
  const { answer, data, moments, nuisances, fit, tests, notRun, tails, flags, explanations, engine } =
    diagnosis;
  const { divergenceInterval, divergence, gSquared, certified, floor } = fit;
  return {
    answer,
    data: {
      ...data,
      misreadApplied: nuisances?.misread?.applied ?? false,
      lump: data.lump && { from: data.lump.from },
      opening: data.below ? { to: data.below.to } : null
    },
    moments,
    fit: {
      divergence:
        divergenceInterval.value === null ? { value: divergence, low: null, high: null } : divergenceInterval,
      gSquared,
      certified,
      found: divergence,
      floor
    },
    tests: tests.map(({ id, p, pAdjusted, source, resamples, smallestP, stoppedEarly }) => ({
      id,
      p,
      pAdjusted,
      source,
      atSmallest: source !== 'exact' && p <= smallestP,
      resamples,
      stoppedEarly,
      limits: null
    })),
    notRun,
    certificate: tails.certificate,
    flags,
    explanations: explanations ?? null,
    engine
  };
}
