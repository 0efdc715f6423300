/**
 * First and last count worth drawing: those seen, and those that the law or a bound keeps in view.
 * Never empty: a single count gets room on both sides.
 */
export function shownSpan<T extends { count: number }>(
  points: T[],
  worth: (point: T) => boolean
): [number, number] {
  let from = Infinity;
  let to = -Infinity;
  for (const point of points) {
    if (!worth(point)) continue;
    from = Math.min(from, point.count);
    to = Math.max(to, point.count);
  }
  if (from > to) return [0, 1];
  return [from, to];
}
