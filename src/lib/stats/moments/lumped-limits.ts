import type { Histogram } from '../types';

/** What mean and unbiased variance of the shots can be, given that a lump hides where in it each of its shots lies. */
export interface LumpedLimits {
  mean: { low: number; high: number | null };
  variance: { low: number | null; high: number | null };
}

/**
 * Exact limits of the mean and the variance of the shots over all counts that their lumps allow: 0 … to for an opening
 * row, from … N for a closing one. Not intervals of the law: what the table itself leaves open.
 *
 * The variance is least with every hidden count nearest to the others, since that brings all counts nearer to each
 * other. It is convex in each count, so it is largest with every hidden count at an end of its lump; with i shots of one
 * lump and j of the other at the far ends it is a part linear in i and j less the square of another linear part, so one
 * of the largest has i or j at an end, where the other follows from a parabola.
 *
 * @returns high null where N is unknown and a closing row has no end; variance null for one shot
 */
export function lumpedLimits({ counts, lump, below = null }: Histogram, trials: number | null): LumpedLimits {
  const rows = [...counts];
  if (below) rows.push([below.to, below.shots]);
  if (lump) rows.push([lump.from, lump.shots]);
  const shots = rows.reduce((sum, [, h]) => sum + h, 0);
  const mean = rows.reduce((sum, [n, h]) => sum + n * h, 0) / shots;
  const squares = rows.reduce((sum, [n, h]) => sum + h * (n - mean) ** 2, 0);
  const down = below ? below.to : 0;
  const few = below ? below.shots : 0;
  const open = lump !== null && trials === null;
  const up = lump && trials !== null ? trials - lump.from : 0;
  const many = lump ? lump.shots : 0;
  const unbiased = (sum: number) => (shots > 1 ? sum / (shots - 1) : null);
  /** Σ(n − mean)² with i shots of the opening row at 0 and j of the closing one at N. */
  const spread = (i: number, j: number) => {
    const low = below ? i * ((mean - below.to + down) ** 2 - (mean - below.to) ** 2) : 0;
    const high = lump ? j * ((lump.from + up - mean) ** 2 - (lump.from - mean) ** 2) : 0;
    return squares + low + high - (j * up - i * down) ** 2 / shots;
  };
  let most = squares;
  for (const i of [0, few])
    most = Math.max(
      most,
      best((j) => spread(i, j), many)
    );
  for (const j of [0, many])
    most = Math.max(
      most,
      best((i) => spread(i, j), few)
    );
  return {
    mean: { low: mean - (few * down) / shots, high: open ? null : mean + (many * up) / shots },
    variance: { low: unbiased(squares), high: open ? null : unbiased(most) }
  };
}

/** Largest value of a downward parabola at the whole numbers 0 … last, from its values at three of them. */
function best(value: (k: number) => number, last: number): number {
  const ends = Math.max(value(0), value(last));
  if (last < 2) return ends;
  const [start, middle, end] = [value(0), value(last / 2), value(last)];
  const bend = start - 2 * middle + end;
  if (!(bend < 0)) return ends;
  const top = Math.min(last, Math.max(0, (last / 4) * ((3 * start - 4 * middle + end) / bend)));
  return Math.max(ends, value(Math.floor(top)), value(Math.ceil(top)));
}
