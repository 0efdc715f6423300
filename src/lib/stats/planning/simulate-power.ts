import { ceiling } from '../bounds/ceiling';
import type { Window } from '../laws/window';
import { clopperPearson } from '../numerics/clopper-pearson';
import { generator, type Generator } from '../random/generator';
import { histogramSampler } from '../random/histogram-sampler';
import { binomialRange } from './binomial-range';
import type { Effect } from './effect';
import { effectWindow } from './effect-window';
import { equalCounts } from './equal-counts';

/** A plan tried out on invented shots. */
export interface SimulatedPower {
  /** Experiments drawn, and those in which the test saw the effect. */
  repeats: number;
  seen: number;
  share: number;
  /**
   * 95 % limits of the power: exact limits of the share, held against both ends of where the cut can lie, at 97.5 % each.
   * low is 0 where the cut may lie beyond all that was drawn.
   */
  low: number;
  high: number;
}

/** Experiments drawn under independence, which set where the test begins to say so; and under the effect. */
export interface Repeats {
  without: number;
  with: number;
}

/**
 * Power of the ceiling test by simulation: variance over ceiling of whole experiments of equal trials sets the cut at
 * level α, and experiments under the effect are held against it.
 *
 * @param seed whole number 0 … 2^32 − 1
 * @param onProgress share done, 0 … 1
 * @returns null where the effect cannot have this size
 */
export function simulatePower(
  effect: Effect,
  shots: number,
  alpha: number,
  repeats: Repeats,
  seed: number,
  onProgress: (share: number) => void = () => {}
): SimulatedPower | null {
  const window = effectWindow(effect);
  if (!window) return null;
  const { mean, trials } = effect;
  const all = repeats.without + repeats.with;
  const under = experiments(equalCounts(mean, trials), trials, shots);
  const random = generator(seed, 1);
  const drawn = new Float64Array(repeats.without);
  for (let r = 0; r < drawn.length; r++) {
    drawn[r] = under(random);
    if (r % 200 === 0) onProgress(r / all);
  }
  drawn.sort();
  const cut = drawn[Math.min(drawn.length - 1, Math.ceil((1 - alpha) * (drawn.length + 1)) - 1)];
  const other = experiments(window, trials, shots);
  const apart = generator(seed, 2);
  const [nearest, farthest] = cutLimits(drawn, alpha);
  let [seen, atMost, atLeast] = [0, 0, 0];
  for (let r = 0; r < repeats.with; r++) {
    const value = other(apart);
    if (value > cut) seen++;
    if (value > nearest) atMost++;
    if (value > farthest) atLeast++;
    if (r % 200 === 0) onProgress((repeats.without + r) / all);
  }
  return {
    repeats: repeats.with,
    seen,
    share: seen / repeats.with,
    low: clopperPearson(atLeast, repeats.with, 0.975).low,
    high: clopperPearson(atMost, repeats.with, 0.975).high
  };
}

/**
 * Where the cut of the level lies, 97.5 %, by order statistics: of n draws Bin(n, α) lie beyond it.
 *
 * @param drawn in rising order
 */
function cutLimits(drawn: Float64Array, alpha: number): [nearest: number, farthest: number] {
  const n = drawn.length;
  const { low, high } = binomialRange(n, alpha, 0.975);
  return [high < n ? drawn[n - 1 - high] : -Infinity, low > 0 ? drawn[n - low] : Infinity];
}

/** Draws variance over ceiling of one experiment after the other. */
function experiments(window: Window, trials: number | null, shots: number): (random: Generator) => number {
  const sampler = histogramSampler(window.values);
  const into = new Float64Array(window.values.length);
  return (random) => {
    sampler.draw(random, shots, into);
    let sum = 0;
    into.forEach((seen, i) => (sum += seen * i));
    const centre = sum / shots;
    let square = 0;
    into.forEach((seen, i) => (square += seen * (i - centre) * (i - centre)));
    const top = ceiling(window.first + centre, trials);
    // Without a defect in any shot, or with all, there is no spread to see.
    return top > 0 ? square / (shots - 1) / top : 0;
  };
}
