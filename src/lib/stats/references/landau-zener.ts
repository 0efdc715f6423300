import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { lawMoments } from '../laws/law-moments';
import { findRoot } from '../numerics/find-root';
import { maximise } from '../numerics/maximise';
import { landauZenerLaw } from './landau-zener-law';
import { lawLogLikelihood } from '../fit/law-log-likelihood';

/** Multiplications that one evaluation may cost; forty are needed, and the whole must stay well under a second. */
const budget = 2e7;

/** Half the width of the search in ln a: a factor of two. */
const reach = 0.7;

/**
 * Best Landau–Zener law for N modes, by likelihood in its one parameter a.
 *
 * @returns null when N is unknown or the mean is 0 or N (then a has no finite best value), or when one
 *   evaluation would cost over 2e7 multiplications.
 * The search runs in ln a, a factor of two either way of the a that matches the mean, and on from there where shots
 * far out pull it to the edge.
 */
export function landauZener(data: FitData): { logLikelihood: number; a: number } | null {
  const { mean } = sampleMoments(data);
  const modes = data.trials;
  if (modes === null || !(mean > 0) || !(mean < modes)) return null;
  const width = 20 * Math.sqrt(mean) + 20;
  if (Math.min(modes, 10 * mean + 100) * width > budget) return null;
  const meanAt = (logA: number) => lawMoments(landauZenerLaw(modes, Math.exp(logA))).mean;
  const low = Math.log(slowEnough(modes, mean));
  const high = 2 * Math.log(2 * modes) + 6;
  if (!(meanAt(low) > mean && meanAt(high) < mean)) return null;
  const centre = findRoot((logA) => meanAt(logA) - mean, low, high, 1e-9);
  const score = (logA: number) => lawLogLikelihood(data, landauZenerLaw(modes, Math.exp(logA)));
  let best = maximise(score, centre - reach, centre + reach, 1e-8);
  for (const step of [-reach, reach]) {
    for (let edge = centre + step; Math.abs(best.at - edge) < 1e-6; edge += step) {
      const next = maximise(score, Math.min(edge, edge + step), Math.max(edge, edge + step), 1e-8);
      if (!(next.value > best.value) || Math.abs(edge - centre) > 4) break;
      best = next;
    }
  }
  return best.value > -Infinity ? { logLikelihood: best.value, a: Math.exp(best.at) } : null;
}

/**
 * An a whose law has more than the mean wanted, but not so small that a billion modes would have to be written out.
 * With k continuous the mean is N·erf(π√a)/(2√(πa)), and over N(1 − aπ²/3); the first mode alone is exp(−aπ²/4N²).
 */
function slowEnough(modes: number, mean: number): number {
  if (mean < 0.3) return 0.4 * modes ** 2;
  const rough = (modes / mean) ** 2 / (4 * Math.PI);
  return rough > 0.2 ? rough / 10 : 0.1 * (1 - mean / modes);
}
