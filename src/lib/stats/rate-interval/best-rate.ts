import type { FitData } from '../fit/fit-data';
import { chainFit } from '../misread/chain-fit';

/** Points of the first look, and halvings of their distance after it. */
const points = 7;
const halvings = 4;

/**
 * The misread rate within limits at which the best chain found fits best: there the tests of the fit speak least against
 * independent kinks. A grid, then ever shorter strides from its best.
 */
export function bestRate(counts: FitData, low: number, high: number, ring = false): number {
  const known = new Map<number, number>();
  const value = (rate: number) => {
    const before = known.get(rate);
    if (before !== undefined) return before;
    const found = chainFit(counts, rate, null, 1e-4, ring).value;
    known.set(rate, found);
    return found;
  };
  let stride = (high - low) / (points - 1);
  let best = low;
  for (let i = 1; i < points; i++) {
    const rate = i === points - 1 ? high : low + i * stride;
    if (value(rate) > value(best)) best = rate;
  }
  for (let step = 0; step < halvings; step++) {
    stride /= 2;
    for (const rate of [best - stride, best + stride]) {
      if (rate >= low && rate <= high && value(rate) > value(best)) best = rate;
    }
  }
  return best;
}
