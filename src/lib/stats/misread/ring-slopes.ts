import { chainSlopes, type Chain, type ChainSpace } from './chain-space';

/**
 * Law of the kinks read on a ring (see ringWindow), and its slope in the p of each level, into the `f` and `df` of a
 * space; `g` and `dg` are left at 0. By stepping an open chain from either flip of the first site, closing it, and
 * dividing by the chance of an even total, ½(1 + Π(1 − 2p)).
 *
 * @param last counts above which the law is left out
 */
export function ringSlopes(
  space: ChainSpace,
  { p, runs }: Chain,
  rate: number,
  trim: number,
  last = Infinity
): void {
  const { f, g, df, dg, closed } = space;
  const present = runs.filter(({ trials }) => trials > 0);
  const { level, trials } = present[present.length - 1];
  const open = { p, runs: [...present.slice(0, -1), { level, trials: trials - 1 }] };
  for (let j = 0; j <= p.length; j++) closed[j].fill(0);
  let most = 0;
  for (const first of [0, 1]) {
    chainSlopes(space, open, rate, trim, last, first === 0 ? [1 - rate, 0] : [0, rate]);
    const to = Math.min(space.high + 1, last, f.length - 1);
    most = Math.max(most, to);
    const [same, other] = first === 0 ? [f, g] : [g, f];
    close(closed[0], same, other, p[level], space.low, to);
    for (let j = 0; j < p.length; j++) {
      const [a, b] = first === 0 ? [df[j], dg[j]] : [dg[j], df[j]];
      close(closed[j + 1], a, b, p[level], space.low, to);
    }
    // The closing bond owes to the p of its own level.
    for (let n = space.low; n <= to; n++)
      closed[level + 1][n] += other[n] - same[n] + (n > space.low ? same[n - 1] - other[n - 1] : 0);
  }
  const many = p.map((_, j) => present.reduce((sum, run) => sum + (run.level === j ? run.trials : 0), 0));
  const product = (left: number) =>
    p.reduce((all, one, j) => all * (1 - 2 * one) ** (many[j] - (j === left ? 1 : 0)), 1);
  const even = (1 + product(-1)) / 2;
  for (const values of [f, g, ...df, ...dg]) values.fill(0);
  space.low = 0;
  space.high = most;
  if (!(even > 0)) return;
  for (let n = 0; n <= most; n += 2) f[n] = closed[0][n] / even;
  for (let j = 0; j < p.length; j++) {
    // Slope of ln P(even).
    const norm = many[j] > 0 ? (-many[j] * product(j)) / even : 0;
    for (let n = 0; n <= most; n += 2) df[j][n] = closed[j + 1][n] / even - norm * f[n];
  }
}

/** The closing bond: read as it is where first and last site are flipped alike, the other way round where not. */
function close(
  into: Float64Array,
  same: Float64Array,
  other: Float64Array,
  p: number,
  from: number,
  to: number
): void {
  let [s, o] = [0, 0];
  for (let n = from; n <= to; n++) {
    into[n] += (1 - p) * same[n] + p * other[n] + p * s + (1 - p) * o;
    s = same[n];
    o = other[n];
  }
}
