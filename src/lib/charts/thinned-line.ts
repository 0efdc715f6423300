import type { Point } from './picture';

/** Points closer than this, across, share a column: a third of the thinnest line. */
const COLUMN = 1 / 3;

/**
 * A line of many points with no more of them than can be seen: of those that share a column of a third of a unit only
 * the first, the lowest, the highest and the last stay, in their order. 10 000 counts would otherwise write 150 kB a line.
 *
 * @param points in order of x, picture units; fewer than 1000 stay as they are
 */
export function thinnedLine(points: Point[]): Point[] {
  if (points.length < 1000) return points;
  const kept: Point[] = [];
  for (let from = 0; from < points.length;) {
    const column = Math.floor(points[from][0] / COLUMN);
    let [to, low, high] = [from, from, from];
    for (; to < points.length && Math.floor(points[to][0] / COLUMN) === column; to++) {
      if (points[to][1] > points[low][1]) low = to;
      if (points[to][1] < points[high][1]) high = to;
    }
    for (const at of [...new Set([from, low, high, to - 1])].sort((a, b) => a - b)) kept.push(points[at]);
    from = to;
  }
  return kept;
}
