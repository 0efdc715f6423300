import type { DistributionPoint } from '$lib/stats/types';
import { intervalPath } from './interval-path';
import type { Mark } from './picture';
import { standing } from './standing';

const ROLES = {
  within: ['interval', 'range'],
  more: ['interval-more', 'range-more'],
  fewer: ['interval-fewer', 'range-fewer']
} as const;

/** Counts over which a lump is drawn beyond the one nearest to the others; all of a short one. */
export const LUMP_REACH = 2;

/** First and last count over which a lump is drawn. */
export const lumpSpan = ({ count, below }: Pick<DistributionPoint, 'count' | 'below'>): [number, number] =>
  below ? [Math.max(0, count - LUMP_REACH), count] : [count, count + LUMP_REACH];

/** Where a lump is marked: the middle of the counts over which it is drawn. */
export const lumpMiddle = (lump: Pick<DistributionPoint, 'count' | 'below'>): number => {
  const [first, last] = lumpSpan(lump);
  return (first + last) / 2;
};

/**
 * A row that lumps counts: a bar over its counts at the share seen, its interval beside it, and what the law gives all of
 * them as a line of its own. No point, since no single count was seen.
 */
export function lumpMarks(
  points: DistributionPoint[],
  x: (count: number) => number,
  y: (share: number) => number
): Mark[] {
  return points.flatMap((point) => {
    const [first, last] = lumpSpan(point);
    const [left, right] = [x(first - 0.4), x(last + 0.4)];
    const half = Math.min(3.5, (right - left) / 8);
    const [interval, range] = ROLES[standing(point)];
    const seen = y(point.observed);
    const flat = (at: number) => `M${left.toFixed(2)},${at.toFixed(2)}H${right.toFixed(2)}`;
    return [
      {
        kind: 'path',
        role: interval,
        d: intervalPath([{ x: (left + right) / 2, from: y(point.low), to: y(point.high) }])
      },
      {
        kind: 'path',
        role: range,
        d: `M${left.toFixed(2)},${(seen - half).toFixed(2)}H${right.toFixed(2)}V${(seen + half).toFixed(2)}H${left.toFixed(2)}Z`
      },
      { kind: 'path', role: 'fitted', d: flat(y(point.fitted)) }
    ] satisfies Mark[];
  });
}
