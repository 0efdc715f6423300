import { dispersionSpread } from './dispersion-spread';
import type { Effect, Sharpness } from './effect';
import { effectWindow } from './effect-window';
import { equalCounts } from './equal-counts';
import { largestEffect } from './largest-effect';
import { powerOfShots } from './power-of-shots';

/**
 * Smallest size of an effect that `shots` shots see with this power: the inverse of `shotsToSee`, to 1e-4 of itself.
 *
 * @returns null when no size that the effect can have is seen, or the sharpness is out of its range
 */
export function smallestEffect(
  planned: Omit<Effect, 'size'>,
  shots: number,
  { alpha, power }: Sharpness
): number | null {
  if (!(alpha > 0 && alpha < 0.5 && power > alpha && power < 1 && shots >= 2)) return null;
  const { mean, trials } = planned;
  const largest = largestEffect(planned);
  if (!(largest > 0 && mean > 0 && mean < (trials ?? Infinity))) return null;
  const none = dispersionSpread(equalCounts(mean, trials), trials);
  const seen = (size: number): boolean => {
    const window = effectWindow({ ...planned, size });
    if (!window) return false;
    return powerOfShots(none, dispersionSpread(window, trials), shots, alpha) >= power;
  };
  // From the top of its range an effect may be so wild that it scatters out of sight: the smallest is looked for upward.
  let high = 1e-9 * largest;
  while (high < largest && !seen(high)) high *= 2;
  if (high >= largest) {
    high = largest * (1 - 1e-9);
    if (!seen(high)) return null;
  }
  let low = high / 2;
  while (high / low > 1.0001) {
    const middle = Math.sqrt(low * high);
    if (seen(middle)) high = middle;
    else low = middle;
  }
  return high;
}
