import type { Histogram } from '../types';

/** What the likelihood of a law is computed from. */
export interface FitData {
  trials: number | null;
  /** Count of shots[0]. */
  first: number;
  /** Shots at counts first, first+1, … last seen; inner zeros kept. */
  shots: Float64Array;
  /** A closing row "from or more", or null. */
  lump: { from: number; shots: number } | null;
  /** An opening row "to or fewer", or null. Beside a lump `shots` reaches up to it, with zeros where nothing was seen. */
  below: { to: number; shots: number } | null;
  /** All shots that enter, the lumps included. */
  total: number;
  /** True: shots with count 0 were set aside and the law is conditioned on n ≥ 1. */
  withoutEmpty: boolean;
}

/** A histogram as dense arrays from the first to the last count seen; `withoutEmpty` sets count 0 aside. */
export function fitData(histogram: Histogram, trials: number | null, withoutEmpty = false): FitData {
  const rows = histogram.counts.filter(([count, shots]) => shots > 0 && !(withoutEmpty && count === 0));
  const { lump, below = null } = histogram;
  const first = below ? below.to + 1 : rows.length > 0 ? rows[0][0] : (lump?.from ?? 0);
  const last = lump ? lump.from - 1 : rows.length > 0 ? rows[rows.length - 1][0] : first - 1;
  const shots = new Float64Array(last - first + 1);
  let total = (lump?.shots ?? 0) + (below?.shots ?? 0);
  for (const [count, seen] of rows) {
    shots[count - first] += seen;
    total += seen;
  }
  return { trials, first, shots, lump, below, total, withoutEmpty };
}
