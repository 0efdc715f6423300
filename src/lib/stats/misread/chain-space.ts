/** Kink probabilities along a chain: runs of bonds, in order, that share a level. */
export interface Chain {
  /** Distinct probabilities. */
  p: number[];
  runs: { level: number; trials: number }[];
}

/** Buffers for the law of a chain and its slopes in the p of each level; see chainSlopes. */
export interface ChainSpace {
  /** Law by the flip of the last site, upright and flipped. */
  f: Float64Array;
  g: Float64Array;
  /** Slopes of both, one pair a level. */
  df: Float64Array[];
  dg: Float64Array[];
  /** Law and slopes of a ring while it is put together, see ringSlopes. */
  closed: Float64Array[];
  /** Counts low … high hold something; values lie at their count. */
  low: number;
  high: number;
}

/** Room for a chain of `bonds` bonds with at most `levels` levels. */
export function chainSpace(bonds: number, levels: number): ChainSpace {
  const room = () => new Float64Array(bonds + 2);
  return {
    f: room(),
    g: room(),
    df: Array.from({ length: levels }, room),
    dg: Array.from({ length: levels }, room),
    closed: Array.from({ length: levels + 1 }, room),
    low: 0,
    high: 0
  };
}

/**
 * Law of the kinks read along an open chain (see chainWindow), and its slope in the p of each level, by stepping both
 * along the chain together.
 *
 * @param chain no more levels than the space has room for
 * @param trim part of the largest value below which the ends are left out
 * @param last counts above are left out: the others do not depend on them
 * @param start weights of the first site read rightly and wrongly
 *
 * A step is linear in p, so its slope adds (z − 1)(f − g), upright as it stands and flipped with the other sign.
 */
export function chainSlopes(
  space: ChainSpace,
  { p, runs }: Chain,
  rate: number,
  trim: number,
  last = Infinity,
  start: readonly [upright: number, flipped: number] = [1 - rate, rate]
): void {
  const { f, g, df, dg } = space;
  for (const values of [f, g, ...df, ...dg]) values.fill(0);
  [f[0], g[0]] = start;
  let low = 0;
  let high = 0;
  const met = p.map(() => false);
  for (const { level, trials } of runs) {
    met[level] ||= trials > 0;
    for (let bond = 0; bond < trials; bond++) {
      if (high < last) high++;
      for (let j = 0; j < p.length; j++) if (met[j]) step(df[j], dg[j], p[level], rate, low, high);
      slope(space, level, rate, low, high);
      const most = step(f, g, p[level], rate, low, high);
      const least = trim * most;
      while (high > low && f[high] + g[high] < least) clear(space, high--);
      while (low < high && f[low] + g[low] < least) clear(space, low++);
    }
  }
  space.low = low;
  space.high = high;
}

function clear({ f, g, df, dg }: ChainSpace, n: number): void {
  f[n] = g[n] = 0;
  for (let j = 0; j < df.length; j++) df[j][n] = dg[j][n] = 0;
}

/** One bond, from the last count down, in place; gives the largest value of the sum. */
function step(f: Float64Array, g: Float64Array, p: number, rate: number, low: number, high: number): number {
  const q = 1 - p;
  const upright = 1 - rate;
  let most = 0;
  let fHere = f[high];
  let gHere = g[high];
  for (let n = high; n > low; n--) {
    const fBefore = f[n - 1];
    const gBefore = g[n - 1];
    const a = upright * (q * (fHere + gBefore) + p * (fBefore + gHere));
    const b = rate * (p * (fHere + gBefore) + q * (fBefore + gHere));
    f[n] = a;
    g[n] = b;
    if (a + b > most) most = a + b;
    fHere = fBefore;
    gHere = gBefore;
  }
  f[low] = upright * (q * fHere + p * gHere);
  g[low] = rate * (p * fHere + q * gHere);
  return Math.max(most, f[low] + g[low]);
}

/** What the step of the law owes to the p of its own level; to be added after the slope was stepped itself. */
function slope({ f, g, df, dg }: ChainSpace, level: number, rate: number, low: number, high: number): void {
  const a = df[level];
  const b = dg[level];
  const upright = 1 - rate;
  for (let n = high; n >= low; n--) {
    const change = (n > low ? f[n - 1] - g[n - 1] : 0) - (f[n] - g[n]);
    a[n] += upright * change;
    b[n] -= rate * change;
  }
}
