import type { Law } from '../types';

/** A law tilted by θ: p → p e^θ/(1−p+p e^θ), γ → γ e^θ. */
export function tiltedLaw(law: Law, theta: number): Law {
  const growth = Math.exp(theta);
  const decay = Math.exp(-theta);
  return {
    levels: law.levels.map(({ p, trials }) => ({ p: tiltedProbability(p, theta, growth, decay), trials })),
    poissonPart: law.poissonPart * growth
  };
}

/** One tilted probability; `growth` and `decay` are e^θ and e^{−θ}, of which the one at or under 1 is used, or both are finite. */
export function tiltedProbability(p: number, theta: number, growth: number, decay: number): number {
  if (p <= 0 || p >= 1) return p;
  return theta > 0 ? p / (p + (1 - p) * decay) : (p * growth) / (1 - p + p * growth);
}
