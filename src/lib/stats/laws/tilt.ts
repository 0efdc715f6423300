import type { Law } from '../types';
import { logShift } from './log-shift';
import { tiltAngle } from './tilt-angle';
import { tiltedLaw } from './tilted-law';

/** A law tilted so that its mean is a given count, and what the tilt costs. */
export interface Tilt {
  theta: number;
  /** Λ(θ) − θ·count ≤ 0: minus the large-deviation rate of the count, in nats a shot. */
  exponent: number;
  law: Law;
}

/**
 * Exponential tilt of a law to the mean `count`: p → p e^θ/(1−p+p e^θ), γ → γ e^θ, with θ solving
 * Λ'(θ) = count. Then f_count = e^{Λ(θ) − θ·count} f̃_count.
 *
 * @returns null where no tilt reaches the count: at or beyond the ends of the law's support. There
 *   Λ(θ) − θ·count has its infimum in the limit (see lawRate).
 */
export function tilt(law: Law, count: number): Tilt | null {
  const theta = tiltAngle(law, count);
  if (theta === null) return null;
  return { theta, exponent: exponent(law, theta, count), law: tiltedLaw(law, theta) };
}

/**
 * Λ(θ) − θ·count, with Λ(θ) = γ(e^θ − 1) + Σ ln(1 + p(e^θ − 1)). A trial with p > ½ is counted from its sure side,
 * ln(1 + p(e^θ − 1)) = θ + ln(1 + (1−p)(e^{−θ} − 1)): near p = 1 and θ ≪ 0 the first form is the logarithm of
 * rounding. log1p and expm1 keep the digits for small p, 1−p and θ.
 */
function exponent(law: Law, theta: number, count: number): number {
  let sum = law.poissonPart * Math.expm1(theta);
  let likely = 0;
  for (const { p, trials } of law.levels) {
    if (p > 0.5) likely += trials;
    sum += trials * (p > 0.5 ? logShift(1 - p, -theta) : logShift(p, theta));
  }
  return sum + theta * (likely - count);
}
