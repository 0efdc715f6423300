import type { Window } from '../laws/window';
import { keptShape } from './kept-shape';
import type { KeptCounts } from './truncated-law';
import { windowMoments } from './window-moments';

/**
 * What an excess over the ceiling of counts so cut can be seen by, and how large it can be at all: half the shots at
 * either end of the cut have the variance (mean − from)(to − mean), more than which nothing has.
 *
 * @param window equal trials so cut, of the mean that was seen
 */
export function cutReach(
  window: Window,
  { from, to }: KeptCounts,
  trials: number
): { shape: number | null; most: number } {
  const { mean, variance } = windowMoments(window);
  const last = Math.min(to, trials);
  const most = variance > 0 ? ((mean - from) * (last - mean)) / variance - 1 : 0;
  return { shape: keptShape(window), most };
}
