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
 *   Λ(θ) − θ·count has its infimum in the limit (see rateOf).
 * @remarks Newton from the tilt of an equal-trials law, kept within a bracket; Λ' is monotone.
 */
export function tilt(law: Law, count: number): Tilt | null {
  const sure = law.levels.reduce((sum, { p, trials }) => sum + (p >= 1 ? trials : 0), 0);
  const possible = law.levels.reduce((sum, { p, trials }) => sum + (p > 0 ? trials : 0), 0);
  if (!(count > sure) || !(law.poissonPart > 0 || count < possible)) return null;
  let low = -Infinity;
  let high = Infinity;
  let theta = 0;
  for (let step = 0; step < 200; step++) {
    const [mean, variance] = tiltedMoments(law, theta);
    const gap = count - mean;
    if (Math.abs(gap) <= 1e-13 * Math.max(1, Math.abs(count))) break;
    if (gap > 0) low = theta;
    else high = theta;
    // A Newton step is cut at 2: from far out the variance is nearly nothing.
    let next = theta + Math.max(-2, Math.min(2, gap / variance));
    if (!(next > low && next < high)) next = (low + high) / 2;
    if (next === theta) break;
    theta = next;
  }
  return { theta, exponent: cumulantFunction(law, theta) - theta * count, law: tilted(law, theta) };
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

/** Λ(θ) = γ(e^θ − 1) + Σ ln(1 + p(e^θ − 1)); log1p and expm1 keep the digits for small p and θ. */
function cumulantFunction(law: Law, theta: number): number {
  let sum = law.poissonPart * Math.expm1(theta);
  for (const { p, trials } of law.levels) {
    if (p > 0)
      sum +=
        trials *
        (theta > 30 ? theta + Math.log(p + (1 - p) * Math.exp(-theta)) : Math.log1p(p * Math.expm1(theta)));
  }
  return sum;
}
