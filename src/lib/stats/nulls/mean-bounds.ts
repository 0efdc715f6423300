import { logHoeffdingTail } from '../bounds/log-hoeffding-tail';
import { logMeanChernoff } from '../bounds/log-mean-chernoff';
import type { TailBounds } from './null-law';

/** Bounds of the tails that independent trials of this mean allow. */
export function meanBounds(mean: number, trials: number | null): TailBounds {
  return {
    meanChernoff: (side, count) => logMeanChernoff(side, count, mean, trials),
    hoeffding: (side, count) => logHoeffdingTail(side, count, mean, trials)
  };
}
