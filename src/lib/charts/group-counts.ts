/**
 * Gathers neighbours when they would lie closer than `least` picture units, so that 10 000 counts stay
 * a readable drawing. Nothing is dropped: a group is drawn as the range of what it holds.
 * @param points in order of count
 * @param unit picture units from one count to the next
 */
export function groupCounts<T>(points: T[], unit: number, least: number): T[][] {
  const together = unit >= least ? 1 : Math.ceil(least / Math.max(unit, 1e-9));
  if (together === 1) return points.map((point) => [point]);
  const groups: T[][] = [];
  for (let i = 0; i < points.length; i += together) groups.push(points.slice(i, i + together));
  return groups;
}
