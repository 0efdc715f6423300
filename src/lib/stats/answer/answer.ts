import type { Evidence } from '../flags/evidence';
import type { Diagnosis, Flag, Verdict } from '../types';
import { because } from './because';
import { shotsToDecide } from './shots-to-decide';
import { smallestExcess } from './smallest-excess';
import { statement } from './statement';
import { unreachable } from './unreachable';

/** Fewer shots than this are never called compatible: the rule below fails for tiny N. */
const fewest = 50;

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
 *   variance/ceiling is below 1 + tolerance, an excess of one half would have been seen, there are at least 50 shots,
 *   and no test is as extreme as its resamples can show;
 * - undecided: otherwise, with the number of shots that would decide.
 */
export function answer(evidence: Evidence, flags: Flag[]): Diagnosis['answer'] {
  const { options, moments, shots, trials } = evidence;
  const mean = moments.mean.value!;
  // Two counts cannot exceed their own ceiling with any number of shots, and counts without spread have none to compare.
  const testable =
    !(evidence.fixed ?? trials === 1) && moments.variance.value !== null && moments.variance.value > 0;
  const seen = testable ? smallestExcess(mean, trials, shots) : null;
  // N trials can exceed the ceiling N-fold at most, and an eye for twice the ceiling is none.
  const excess = seen !== null && seen <= Math.min(2, (trials ?? Infinity) - 1) ? seen : null;
  const verdict = decide(evidence, excess);
  const deciding = {
    mean,
    trials,
    shots,
    dispersion: moments.dispersion,
    tolerance: options.tolerance,
    alpha: options.alpha,
    tests: Math.max(1, evidence.tests.length)
  };
  const needed =
    verdict === 'undecided' && testable && unreachable(evidence).length === 0
      ? shotsToDecide(deciding)
      : null;
  return {
    verdict,
    statement: statement(verdict, evidence, flags, needed),
    because: because(verdict, evidence, excess, needed),
    smallestExcess: excess,
    shotsToDecide: needed
  };
}

function decide({ certificate, tests, moments, options, shots }: Evidence, excess: number | null): Verdict {
  if (certificate && certificate.p <= options.alpha) return 'ruled-out';
  if (tests.some((test) => test.pAdjusted <= options.alpha)) return 'ruled-out';
  if (unreachable({ tests, options }).length > 0) return 'undecided';
  const { high } = moments.dispersion;
  const sighted = shots >= fewest && excess !== null && excess <= blind;
  return sighted && high !== null && high < 1 + options.tolerance ? 'compatible' : 'undecided';
}
