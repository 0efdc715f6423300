import { dispersionSpread } from './dispersion-spread';
import type { Effect, Sharpness } from './effect';
import { effectWindow } from './effect-window';
import { equalCounts } from './equal-counts';
import { powerOfShots } from './power-of-shots';

/** Fewer shots than these are never planned: the formula of power is one for many. */
export const fewestPlanned = 20;
/** More than these nobody takes. */
export const mostPlanned = 1e15;

/** Shots with which the ceiling test sees an effect, and how much the effect is. */
export interface ShotsToSee {
  /** A whole number; null when no number up to 1e15 is enough. */
  shots: number | null;
  /** The excess over the ceiling that the effect makes, as a part of it. */
  excess: number;
  /** Power with that many shots: more than asked where even the fewest are enough. */
  power: number;
  /**
   * The plan lies where the formula is rough: under 50 shots, or shots · mean² under 50. On a grid of 1350 plans for
   * an excess the simulated power was up to 19 points off there, and within 5 points elsewhere (one of 5.2, no more
   * than the simulation itself is off). `npm run calibrate -- --plans`, with enough experiments to find the cut at every
   * level: 483 plans of every kind of effect, the worst 2.4 points off.
   */
  rough: boolean;
}

/**
 * Fewest shots with which the ceiling test at level α sees an effect with this power.
 *
 * @returns null where the effect cannot have this size on counts of this mean, or the sharpness is out of its range
 */
export function shotsToSee(effect: Effect, { alpha, power }: Sharpness): ShotsToSee | null {
  const window = effectWindow(effect);
  if (!window || !(alpha > 0 && alpha < 0.5 && power > alpha && power < 1)) return null;
  const { mean, trials } = effect;
  const none = dispersionSpread(equalCounts(mean, trials), trials);
  const some = dispersionSpread(window, trials);
  const excess = some.ratio - 1;
  const powerOf = (shots: number) => powerOfShots(none, some, shots, alpha);
  if (!(powerOf(mostPlanned) >= power))
    return { shots: null, excess, power: powerOf(mostPlanned), rough: false };
  let [low, high] = [fewestPlanned - 1, fewestPlanned];
  while (!(powerOf(high) >= power)) [low, high] = [high, 2 * high];
  // The least whole number: power grows with the shots.
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (powerOf(middle) >= power) high = middle;
    else low = middle;
  }
  const rough = high < 50 || high * mean * mean < 50;
  return { shots: high, excess, power: powerOf(high), rough };
}
