import { dispersionSpread } from './dispersion-spread';
import type { Effect } from './effect';
import { effectWindow } from './effect-window';
import { equalCounts } from './equal-counts';
import { fewestPlanned } from './shots-to-see';
import { powerOfShots } from './power-of-shots';

/**
 * Chance to see an effect as the shots grow, in equal steps from the fewest that are planned to `most`.
 *
 * @param alpha level of the ceiling test
 * @returns empty where the effect cannot have this size
 */
export function powerCurve(
  effect: Effect,
  alpha: number,
  most: number,
  steps = 80
): [shots: number, power: number][] {
  const window = effectWindow(effect);
  if (!window || !(most > fewestPlanned)) return [];
  const { mean, trials } = effect;
  const none = dispersionSpread(equalCounts(mean, trials), trials);
  const some = dispersionSpread(window, trials);
  return Array.from({ length: steps + 1 }, (_, i): [number, number] => {
    const shots = Math.round(fewestPlanned + ((most - fewestPlanned) * i) / steps);
    return [shots, powerOfShots(none, some, shots, alpha)];
  });
}
