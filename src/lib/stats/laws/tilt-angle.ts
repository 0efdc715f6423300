import type { Law } from '../types';
import { tiltedProbability } from './tilted-law';

/**
 * The θ that tilts a law to the mean `count`: Λ'(θ) = Σ p e^θ/(1−p+p e^θ) + γ e^θ = count.
 *
 * @returns null where no tilt reaches the count: at or beyond the ends of the law's support
 * @remarks Newton kept within a bracket; Λ' is monotone. Probabilities from 1e-300 up.
 */
export function tiltAngle(law: Law, count: number): number | null {
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
  return theta;
}

function tiltedMoments(law: Law, theta: number): [number, number] {
  const growth = Math.exp(theta);
  const decay = Math.exp(-theta);
  let mean = law.poissonPart * growth;
  let variance = mean;
  for (const { p, trials } of law.levels) {
    const q = tiltedProbability(p, theta, growth, decay);
    mean += trials * q;
    variance += trials * q * (1 - q);
  }
  return [mean, variance];
}
