import type { Evidence } from '../flags/evidence';
import type { Diagnosis, Flag, Verdict } from '../types';
import { because } from './because';
import { shotsToDecide } from './shots-to-decide';
import { smallestExcess } from './smallest-excess';
import { statement } from './statement';

/**
 * With fewer shots than see the ceiling exceeded by half, nothing was tested that a reader would care about,
 * however low the variance happens to be. For counts of ordinary shape that is about fifty shots.
 */
const blind = 0.5;

/**
 * One of three answers.
 *
 * - ruled out: a certificate, or any adjusted p, at or under α;
 * - compatible: neither, and the data could have shown an excess that matters: the upper 95 % limit of
 *   variance/ceiling is below 1 + tolerance, and an excess of one half would have been seen;
 * - undecided: otherwise, with the number of shots that would decide.
 */
export function answer(evidence: Evidence, flags: Flag[]): Diagnosis['answer'] {
  const { options, moments, shots, trials } = evidence;
  const mean = moments.mean.value!;
  // One trial cannot exceed its own ceiling, with any number of shots.
  const excess = trials === 1 ? null : smallestExcess(mean, trials, shots);
  const verdict = decide(evidence, excess);
  const deciding = {
    mean,
    trials,
    shots,
    dispersion: moments.dispersion,
    tolerance: options.tolerance,
    alpha: options.alpha
  };
  const needed = verdict === 'undecided' && excess !== null ? shotsToDecide(deciding) : null;
  return {
    verdict,
    statement: statement(verdict, evidence, flags, needed),
    because: because(verdict, evidence, excess, needed),
    smallestExcess: excess,
    shotsToDecide: needed
  };
}

function decide({ certificate, tests, moments, options }: Evidence, excess: number | null): Verdict {
  if (certificate && certificate.p <= options.alpha) return 'ruled-out';
  if (tests.some((test) => test.pAdjusted <= options.alpha)) return 'ruled-out';
  const { high } = moments.dispersion;
  const sighted = excess !== null && excess <= blind;
  return sighted && high !== null && high < 1 + options.tolerance ? 'compatible' : 'undecided';
}
