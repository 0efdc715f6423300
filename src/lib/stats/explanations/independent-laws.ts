import type { FitData } from '../fit/fit-data';
import type { TrialLevels } from '../fit/trial-levels';
import { saturated } from '../resampling/divergence';
import type { TestResult } from '../types';
import { formatNumber } from '../words/format-number';
import type { Unranked } from './tell-story';

/** What a diagnosis already knows of independent trials. */
export interface Independent {
  /** p of equal trials, or their mean when N is unknown, and their log-likelihood. */
  equal: { parameter: number; logLikelihood: number };
  /** null when the diagnosis tested something else. */
  best: { levels: TrialLevels; logLikelihood: number } | null;
  /** Outcome of the test of the fit as a whole, which is the best law's goodness; null when it did not run. */
  fitTest: Pick<TestResult, 'p' | 'smallestP' | 'resamples'> | null;
}

/**
 * Independent trials as entries of the list: equal ones, and the best law where it is another.
 *
 * The best law counts one number for each probability strictly between 0 and 1 and one for a Poisson part. How many
 * trials have which probability was fitted too and is not counted: that favours independent trials, on purpose.
 */
export function independentLaws(data: FitData, { equal, best, fitTest }: Independent): Unranked[] {
  const goodness = fitTest && { p: fitTest.p, smallestP: fitTest.smallestP, resamples: fitTest.resamples };
  const entry = (
    id: 'equal-trials' | 'best-independent',
    logLikelihood: number,
    parameters: number,
    base: number | null,
    meaning: string
  ): Unranked => ({
    id,
    logLikelihood,
    parameters,
    aic: 2 * parameters - 2 * logLikelihood,
    base,
    parameter: null,
    second: null,
    gSquared: Math.max(0, 2 * (saturated(data) - logLikelihood)),
    // Equal trials have no test of their own unless they are the best law.
    goodness: id === 'best-independent' || same ? goodness : null,
    meaning
  });
  const parameters = best ? Math.max(1, best.levels.p.length + (best.levels.poissonPart > 0 ? 1 : 0)) : 1;
  const same = best !== null && parameters === 1 && best.logLikelihood - equal.logLikelihood < 0.01;
  const found: Unranked[] = [];
  if (Number.isFinite(equal.logLikelihood)) {
    const rate = formatNumber(equal.parameter, 3);
    found.push(
      entry(
        'equal-trials',
        equal.logLikelihood,
        1,
        equal.parameter,
        data.trials === null
          ? `Defects form independently and rarely, ${rate} a shot on average.`
          : `Defects form independently, each trial with probability ${rate}.`
      )
    );
  }
  if (best && !same && Number.isFinite(best.logLikelihood)) {
    found.push(
      entry(
        'best-independent',
        best.logLikelihood,
        parameters,
        null,
        'Defects form independently, some trials more likely than others; see the best law.'
      )
    );
  }
  return found;
}
