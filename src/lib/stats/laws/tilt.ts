import type { Law } from '../types';

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
 * @remarks Newton kept within a bracket; Λ' is monotone. Probabilities from 1e-300 up.
 */
export function tilt(law: Law, count: number): Tilt | null {
  const sure = law.levels.reduce((sum, { p, trials }) => sum + (p >= 1 ? trials : 0), 0);
  const possible = law.levels.reduce((sum, { p, trials }) => sum + (p > 0 ? trials : 0), 0);
  if (!(count > sure) || !(law.poissonPart > 0 || count < possible)) return null;
  let low = -Infinity;
  let high = Infinity;
  let theta = 0;
  // From far out the variance is nearly nothing and a Newton step endless: it is cut, at first at 2, then at twice
  // the cut before, for probabilities of 1e-300 lie 690 away.
  let cut = 2;
  for (let step = 1; step <= 200; step++) {
    const [mean, variance] = tiltedMoments(law, theta);
    const gap = count - mean;
    if (Math.abs(gap) <= 1e-13 * Math.max(1, Math.abs(count))) break;
    if (gap > 0) low = theta;
    else high = theta;
    let next = theta + Math.max(-cut, Math.min(cut, gap / variance));
    const bracketed = high - low < Infinity;
    // Between trials of very different probability Λ' has plateaus, on which Newton creeps: after a dozen steps every third halves.
    if (bracketed && ((step > 12 && step % 3 === 0) || !(next > low && next < high))) next = (low + high) / 2;
    if (!bracketed) cut *= 2;
    if (next === theta) break;
    theta = next;
  }
  return { theta, exponent: exponent(law, theta, count), law: tilted(law, theta) };
}

function tiltedMoments(law: Law, theta: number): [number, number] {
  let mean = law.poissonPart * Math.exp(theta);
  let variance = mean;
  for (const { p, trials } of law.levels) {
    const q = tiltedProbability(p, theta);
    mean += trials * q;
    variance += trials * q * (1 - q);
  }
  return [mean, variance];
}

function tiltedProbability(p: number, theta: number): number {
  if (p <= 0 || p >= 1) return p;
  return theta > 0
    ? p / (p + (1 - p) * Math.exp(-theta))
    : (p * Math.exp(theta)) / (1 - p + p * Math.exp(theta));
}

function tilted(law: Law, theta: number): Law {
  return {
    levels: law.levels.map(({ p, trials }) => ({ p: tiltedProbability(p, theta), trials })),
    poissonPart: law.poissonPart * Math.exp(theta)
  };
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

/** ln(1 + p(e^θ − 1)) for p ≤ ½; beyond θ = 700 the exponential would overflow. */
function logShift(p: number, theta: number): number {
  if (p <= 0) return 0;
  return theta > 700 ? theta + Math.log(p) : Math.log1p(p * Math.expm1(theta));
}
