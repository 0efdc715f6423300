import type { Cumulants } from '../laws/law-moments';
import type { Diagnosis, Interval, TestId, Verdict } from '../types';

/** Tests, the certificate, and what stands beside them: shots within their batches, and shots that are not empty, their
 * tests allowed for. */
export type PName = TestId | 'certificate' | 'within-batches' | 'empty-aside';
export const COVERED = ['mean', 'variance', 'third', 'fourth', 'dispersion'] as const;

/** What one diagnosis said, as far as calibration asks. */
export interface Outcome {
  /** p before adjustment of every test that ran, and of the certificate. */
  p: Partial<Record<PName, number>>;
  /** Smallest α at which the whole answer is "ruled out": the least of the adjusted p and the certificate's. */
  ruledOutFrom: number;
  verdict: Verdict;
  /** Any flag other than the remark "regular". */
  flagged: boolean;
  /** Whether each 95 % interval holds the truth; null when there is no law to compare with. */
  covered: Record<(typeof COVERED)[number], boolean> | null;
}

/** Reduces a diagnosis to its outcome. `cumulants` are those of the law the shots came from, or null. */
export function outcomeOf(diagnosis: Diagnosis, cumulants: Cumulants | null): Outcome {
  const { tests, tails, moments, flags, answer, nuisances } = diagnosis;
  const p: Outcome['p'] = {};
  for (const test of tests) p[test.id] = test.p;
  if (tails.certificate) p.certificate = tails.certificate.p;
  const within = nuisances?.drift?.split?.pTogether ?? null;
  if (within !== null) p['within-batches'] = within;
  if (nuisances?.emptyAside)
    p['empty-aside'] = Math.min(...nuisances.emptyAside.tests.map((test) => test.pAdjusted));
  const adjusted = tests.map((test) => test.pAdjusted);
  return {
    p,
    ruledOutFrom: Math.min(1, p.certificate ?? 1, ...adjusted),
    verdict: answer.verdict,
    flagged: flags.some((flag) => flag.id !== 'regular'),
    covered: cumulants && covered(moments, cumulants, diagnosis.data.trials)
  };
}

function covered(
  moments: Diagnosis['moments'],
  { mean, variance, third, fourth }: Cumulants,
  trials: number | null
): Outcome['covered'] {
  const ceiling = mean * (1 - (trials === null ? 0 : mean / trials));
  return {
    mean: holds(moments.mean, mean),
    variance: holds(moments.variance, variance),
    third: holds(moments.third, third),
    fourth: holds(moments.fourth, fourth),
    dispersion: holds(moments.dispersion, variance / ceiling)
  };
}

/** An end that the data set no limit to holds everything. */
function holds({ low, high }: Interval, truth: number): boolean {
  return (low === null || low <= truth) && (high === null || truth <= high);
}
