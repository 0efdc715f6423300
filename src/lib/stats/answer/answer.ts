import type { Evidence } from '../flags/evidence';
import type { Diagnosis, Flag, Verdict } from '../types';
import { because } from './because';
import { decide } from './decide';
import { rateLeftOut } from './rate-left-out';
import { restsOnSearch } from './rests-on-search';
import { shotsToDecide } from './shots-to-decide';
import { smallestExcess, dispersionShape } from './smallest-excess';
import { statement } from './statement';
import { unreachable } from './unreachable';

/**
 * One of three answers.
 *
 * - ruled out: a certificate, or any adjusted p, at or under α;
 * - compatible: neither, and the data could have shown an excess that matters: the upper 95 % limit of
 *   variance/ceiling is below 1 + tolerance, an excess of one half would have been seen, there are at least 50 shots,
 *   and no test is as extreme as its resamples can show;
 * - undecided: otherwise, with the number of shots that would decide. Also where only a law that may not be the best
 *   speaks against independent trials (see restsOnSearch), and where the tests cannot allow for the misread rate of kinks that was stated.
 *
 * A misread rate known with an uncertainty: compatible only where it is so at every rate tried.
 */
export function answer(evidence: Evidence, flags: Flag[]): Diagnosis['answer'] {
  const { options, moments, shots, trials } = evidence;
  const mean = moments.mean.value!;
  // Two counts cannot exceed their own ceiling with any number of shots, and counts without spread have none to compare.
  const testable =
    !(evidence.fixed ?? trials === 1) && moments.variance.value !== null && moments.variance.value > 0;
  const shape = evidence.cut?.shape ?? (evidence.cut ? null : dispersionShape(mean, trials));
  const seen = testable ? smallestExcess(mean, trials, shots, shape) : null;
  // N trials can exceed the ceiling N-fold at most, a cut leaves less room, and an eye for twice the ceiling is none.
  const most = evidence.cut?.most ?? (trials ?? Infinity) - 1;
  const excess = seen !== null && seen <= Math.min(2, most) ? seen : null;
  const verdict = overRates(evidence, decide(evidence, excess));
  const deciding = {
    shape,
    shots,
    dispersion: moments.dispersion,
    tolerance: options.tolerance,
    alpha: options.alpha,
    tests: Math.max(1, evidence.tests.length)
  };
  const open =
    unreachable(evidence).length === 0 &&
    !ratesDiffer(evidence) &&
    !rateLeftOut(evidence) &&
    !restsOnSearch(evidence);
  const needed = verdict === 'undecided' && testable && open ? shotsToDecide(deciding) : null;
  return {
    verdict,
    statement: statement(verdict, evidence, flags, needed),
    because: because(verdict, evidence, excess, needed),
    smallestExcess: excess,
    shotsToDecide: needed
  };
}

/** Whether the misread rate is what leaves the answer open: more shots would not settle that. */
const ratesDiffer = ({ rates }: Evidence): boolean =>
  rates !== undefined &&
  (rates.changes.length > 0 || rates.rates.some(({ verdict }) => verdict === 'ruled-out'));

function overRates({ rates }: Evidence, verdict: Verdict): Verdict {
  if (!rates || verdict === 'ruled-out') return verdict;
  return rates.rates.every((one) => one.verdict === 'compatible') ? verdict : 'undecided';
}
