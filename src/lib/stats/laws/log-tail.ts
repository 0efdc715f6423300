import { logOneMinusExp } from '../numerics/log-one-minus-exp';
import type { Law } from '../types';
import { lawWindow } from './law-window';
import { logPmf } from './log-pmf';
import { logShift } from './log-shift';
import { tiltAngle } from './tilt-angle';
import { tiltedLaw } from './tilted-law';

/** Smaller probabilities cannot be tilted in doubles, and count as none. */
const leastProbability = 1e-300;
/** Part of the tilted mode that is left out at each join: over 1e5 trials they sum to less than 1e-12. */
const trim = 1e-17;

/**
 * Natural logarithm of a tail of a Poisson-binomial law, however improbable: P(X ≥ count) for `high`, P(X ≤ count) for
 * `low`, at about the price of one trimmed pmf.
 *
 * P(X ≥ c) = e^{Λ(θ) − θc} Σ_{n ≥ c} e^{−θ(n−c)} f̃_n with θ ≥ 0 tilting the mean onto c: the sum is of the order of
 * 1/σ̃ and no term of it is small, so a trimmed pmf of the tilted law is enough. On the side of c that holds the mean
 * it is one minus the other tail.
 *
 * @param given probabilities under 1e-300 are taken for 0
 * @param count a whole number
 * @returns 0 where the tail is all there is, −Infinity where it is impossible. The probability has a relative error
 *   under 1e-11 down to 1e-200 for up to 1e5 trials, which `log-tail.test.ts` holds to exact arithmetic.
 */
export function logTail(given: Law, side: 'high' | 'low', count: number): number {
  const law = { ...given, levels: given.levels.filter(({ p }) => p >= leastProbability) };
  const high = side === 'high';
  let [sure, possible, mean] = [0, 0, law.poissonPart];
  for (const { p, trials } of law.levels) {
    if (p >= 1) sure += trials;
    if (p > 0) possible += trials;
    mean += trials * p;
  }
  const top = law.poissonPart > 0 ? Infinity : possible;
  if (high ? count <= sure : count >= top) return 0;
  if (high ? count > top : count < sure) return -Infinity;
  if (count === (high ? top : sure)) return logPmf(law, count);
  if (high ? count <= mean : count >= mean) {
    return logOneMinusExp(logTail(law, high ? 'low' : 'high', high ? count - 1 : count + 1));
  }
  const theta = tiltAngle(law, count)!;
  const { first, values } = lawWindow(tiltedLaw(law, theta), trim, 1);
  const step = high ? 1 : -1;
  const decay = Math.exp(-Math.abs(theta));
  let weight = 1;
  let sum = 0;
  for (let i = count - first; i >= 0 && i < values.length; i += step) {
    sum += weight * values[i];
    weight *= decay;
  }
  return exponent(law, theta, count) + Math.log(sum);
}

/**
 * Λ(θ) − θ·count as in `tilt`, summed with the rounding of each step carried along (Neumaier 1974): over 1e4 trials
 * the plain sum loses 1e-11.
 */
function exponent(law: Law, theta: number, count: number): number {
  let likely = 0;
  for (const { p, trials } of law.levels) if (p > 0.5) likely += trials;
  let sum = theta * (likely - count);
  let lost = 0;
  const add = (term: number) => {
    const next = sum + term;
    lost += Math.abs(sum) >= Math.abs(term) ? sum - next + term : term - next + sum;
    sum = next;
  };
  add(law.poissonPart * Math.expm1(theta));
  for (const { p, trials } of law.levels) {
    add(trials * (p > 0.5 ? logShift(1 - p, -theta) : logShift(p, theta)));
  }
  return sum + lost;
}
