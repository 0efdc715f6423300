import { tally } from '../demo/tally';
import type { Histogram } from '../types';

/** Histogram of `shots` counts, each from one call. */
export function shotsOf(shots: number, count: () => number): Histogram {
  return {
    kind: 'histogram',
    counts: tally(Array.from({ length: shots }, count)),
    lump: null
  };
}
