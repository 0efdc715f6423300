import type { FitData } from '../fit/fit-data';
import type { NullLaw } from '../nulls/null-law';
import { equalTrials } from '../references/equal-trials';
import type { Pace } from '../resampling/pace';
import type { DiagnoseOptions, Diagnosis, TestResult } from '../types';
import { explanationsOf } from './explanations-of';
import type { Explanations } from './types';

/** What a diagnosis has in hand when its answer is "ruled out". */
export interface RuledOut {
  counts: FitData;
  options: DiagnoseOptions;
  moments: Pick<Diagnosis['moments'], 'ceiling' | 'dispersion'>;
  tested: Pick<NullLaw, 'levels' | 'logLikelihood' | 'ceiling'>;
  tests: TestResult[];
  /** Whether the shots show that their rate changed. */
  drifted: boolean;
}

/**
 * Explanations within a diagnosis. Where it tested kinks as they are read, its law and its ceiling are not those of
 * plain independent trials: then only equal trials stand beside the stories, and there is no limit for pairs.
 */
export async function explainRuledOut(
  { counts, options, moments, tested, tests, drifted }: RuledOut,
  pace: Pace
): Promise<Explanations> {
  const { levels, logLikelihood } = tested;
  const independent = {
    equal: equalTrials(counts, counts.trials),
    best: 'rate' in levels ? null : { levels, logLikelihood },
    fitTest: ('rate' in levels ? undefined : tests.find(({ id }) => id === 'fit')) ?? null
  };
  const plain = tested.ceiling === null ? moments.dispersion : { value: null, low: null, high: null };
  const found = await explanationsOf(counts, options, { ...moments, dispersion: plain }, independent, pace);
  const apart = [
    'rate' in levels
      ? ' The stories are told of the counts as read: the misread rate that the tests allow for is in none of them.'
      : '',
    drifted
      ? ' The stories are told of all shots together, and a rate that changed meanwhile, which these shots show, is none of them: it can make any of them fit.'
      : ''
  ].join('');
  return { ...found, statement: found.statement + apart };
}
