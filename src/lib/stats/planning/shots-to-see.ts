import { dispersionSpread } from './dispersion-spread';
import type { Effect, Sharpness } from './effect';
import { effectWindow } from './effect-window';
import { powerOfShots } from './power-of-shots';
import { windowCumulants } from './window-cumulants';

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
  /**
   * The plan lies where the formula is rough: the fewest shots it knows, or under 20 defects in all. With 7 defects in
   * 24 shots the power was 6 points off in simulations, with 20 and more under 5 points on the whole grid tried.
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
  const spread = dispersionSpread(windowCumulants(window), effect.trials);
  const excess = spread.ratio - 1;
  const enough = (shots: number) => powerOfShots(spread, effect.trials, shots, alpha) >= power;
  if (!enough(mostPlanned)) return { shots: null, excess, rough: false };
  let [low, high] = [fewestPlanned - 1, fewestPlanned];
  while (!enough(high)) [low, high] = [high, 2 * high];
  // The least whole number: power grows with the shots.
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (enough(middle)) high = middle;
    else low = middle;
  }
  return { shots: high, excess, rough: high === fewestPlanned || high * effect.mean < 20 };
}
