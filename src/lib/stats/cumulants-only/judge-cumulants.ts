import { ceiling } from '../bounds/ceiling';
import { criticalTrials } from '../bounds/critical-trials';
import { chiSquareTail } from '../numerics/chi-square-tail';
import { logNormalTail } from '../numerics/log-normal-tail';
import type { Interval, Verdict } from '../types';
import { conditionsOf, type Condition } from './condition';
import { countLimits } from './count-limits';
import { nearestReachable, type NearestReachable } from './nearest-reachable';
import { givenCumulants, type PublishedCumulants } from './published-cumulants';
import { roundedDispersion } from './rounded-dispersion';
import { roundingReaches } from './rounding-reaches';
import { trialLimits } from './trial-limits';

/** What printed cumulants alone say about independence. */
export interface CumulantsVerdict {
  /** `impossible`: no counts at all have them, independent or not. */
  verdict: Verdict | 'impossible';
  /** The inequalities of independent trials. */
  conditions: Condition[];
  /** Those of any counts that are broken. */
  broken: Condition[];
  nearest: NearestReachable;
  /** Whether the bounds of the distance meet. Errors a billion times apart leave too few digits for that. */
  settled: boolean;
  /** Cumulants without a printed error, from 1 on: rounding alone stands for it, and of chance nothing can be said. */
  rounded: number[];
  /**
   * Where rounding stands for errors: whether it alone can have put the cumulants outside; null when that is too close
   * to tell.
   */
  reaches: boolean | null;
  /** Printed minus nearest, each in its own error. */
  pulls: number[];
  /** At most this often do errors of this size turn up when some independent trials are true, errors independent. */
  p: number;
  /** The same whatever the correlations of the errors. */
  pAnyErrors: number;
  /** Variance over ceiling with its 95 % interval; where rounding stands for errors, with all that it leaves open. */
  dispersion: Interval;
  /** N at which the ceiling equals the printed variance; null when no N does. */
  criticalTrials: number | null;
}

/** Level of the answer, and the excess over the ceiling that matters: those of a fresh page. */
const alpha = 0.01;
const tolerance = 0.1;
/** Further than this outside what any counts can have, it is the table that is wrong. */
const misprint = 3;
/** How far the bounds of the distance may lie apart, a part of one error and of the distance; as a rule 1e-6. */
const apart = 0.01;
/** From here the hull is so long beside its errors that the one for N unknown, which holds it, bounds it better. */
const long = 1e5;

/**
 * Whether any independent trials can have printed cumulants, with the errors that are printed beside them.
 *
 * The distance √χ² to the moment body is at most that to the true cumulants, which is χ² with as many degrees of
 * freedom as cumulants are given when errors are normal and independent: p = P(χ²_k ≥ distance²) is never too small
 * then, and as a rule too large. Whatever their correlations, a distance d needs one cumulant off by d/√k errors:
 * p ≤ 2k·P(Z ≥ d/√k). Both use the lower bound of the distance.
 *
 * Compatible asks in addition that the upper 95 % limit of variance over ceiling lies below 1.1, and that the bounds of
 * the distance meet: a variance of 3.6 ± 1e-10 beside a mean of 4 ± 0.05 was 59 errors away by one and 0 by the other.
 * Where an error was not printed, rounding alone stands for it. How far the shots themselves scatter is then not known, so
 * the answer is neither compatible nor ruled out.
 *
 * @param printed errors > 0; a mean from 0 to N, a variance ≥ 0
 */
export function judgeCumulants(printed: PublishedCumulants): CumulantsVerdict {
  const given = givenCumulants(printed);
  const { trials } = printed;
  const values = given.map(({ value }) => value);
  const errors = given.map(({ error }) => error);
  const nearest = nearestReachable(trials, values, errors);
  if (trials !== null && trials > long && nearest.distance > 0)
    nearest.atLeast = Math.max(nearest.atLeast, nearestReachable(null, values, errors).atLeast);
  const size = nearest.atLeast;
  const p = chiSquareTail(size * size, values.length);
  const pAnyErrors = Math.min(
    1,
    2 * values.length * Math.exp(logNormalTail(size / Math.sqrt(values.length)))
  );
  const broken = conditionsOf(values, errors, (at) => countLimits(trials, at)).filter(
    ({ standing }) => standing === 'broken'
  );
  const ruledOut = p <= alpha;
  const rounded = given.flatMap((one, i) => (one.rounded ? [i + 1] : []));
  const known = rounded.length === 0;
  const dispersion = known ? dispersionOf(printed) : roundedDispersion(printed);
  const seen = dispersion.high !== null && dispersion.high < 1 + tolerance;
  const settled = nearest.distance - nearest.atLeast <= apart * (1 + nearest.distance);
  const beyondAny = broken.some(({ slack, error }) => -slack > misprint * error);
  return {
    verdict: beyondAny
      ? 'impossible'
      : known && ruledOut
        ? 'ruled-out'
        : known && seen && settled
          ? 'compatible'
          : 'undecided',
    conditions: conditionsOf(values, errors, (at) => trialLimits(trials, at)),
    broken,
    nearest,
    settled,
    rounded,
    reaches: known || nearest.distance === 0 || roundingReaches(trials, values, errors),
    pulls: values.map((value, i) => (value - nearest.cumulants[i]) / errors[i]),
    p,
    pAnyErrors,
    dispersion,
    criticalTrials: criticalTrials(values[0], values[1])
  };
}

/** κ2 over its ceiling, by the printed errors to first order. */
function dispersionOf({ trials, mean, variance }: PublishedCumulants): Interval {
  const top = ceiling(mean.value, trials);
  if (!(top > 0)) return { value: null, low: null, high: null };
  const value = variance.value / top;
  const share = trials === null ? 0 : mean.value / trials;
  const error = Math.hypot(variance.error, value * (1 - 2 * share) * mean.error) / top;
  return { value, low: value - 1.96 * error, high: value + 1.96 * error };
}
