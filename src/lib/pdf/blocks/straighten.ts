type Point = [number, number];

/** Far less than a line is wide, in a chart's own units. */
const TOLERANCE = 0.06;
/** Shorter paths are left as they are. */
const LONG = 6000;

/**
 * A long broken line with the points taken out that a straight line passes within {@link TOLERANCE} of (Douglas and
 * Peucker 1973): a law of 10 000 counts is drawn the same with a tenth of the bytes. Other paths come back unchanged.
 *
 * @param d absolute M and L commands only, as linePath writes them
 */
export function straighten(d: string): string {
  if (d.length < LONG || !/^[ML\d.,-]+$/.test(d)) return d;
  return d
    .split('M')
    .filter((run) => run !== '')
    .map((run) => {
      const points = run.split('L').map((pair): Point => {
        const [x, y] = pair.split(',').map(Number);
        return [x, y];
      });
      return `M${kept(points)
        .map(([x, y]) => `${x},${y}`)
        .join('L')}`;
    })
    .join('');
}

function kept(points: Point[]): Point[] {
  const keep = new Array<boolean>(points.length).fill(false);
  keep[0] = keep[points.length - 1] = true;
  // A list instead of recursion: a line that bends everywhere would go too deep.
  const spans: [number, number][] = [[0, points.length - 1]];
  for (let span = spans.pop(); span; span = spans.pop()) {
    const [from, to] = span;
    let [farthest, distance] = [-1, TOLERANCE];
    for (let i = from + 1; i < to; i++) {
      const off = offLine(points[i], points[from], points[to]);
      if (off > distance) [farthest, distance] = [i, off];
    }
    if (farthest < 0) continue;
    keep[farthest] = true;
    spans.push([from, farthest], [farthest, to]);
  }
  return points.filter((_, i) => keep[i]);
}

/** Distance of a point from the segment a–b. */
function offLine([x, y]: Point, [ax, ay]: Point, [bx, by]: Point): number {
  const [run, rise] = [bx - ax, by - ay];
  const square = run * run + rise * rise;
  const share = square === 0 ? 0 : Math.min(1, Math.max(0, ((x - ax) * run + (y - ay) * rise) / square));
  return Math.hypot(x - ax - share * run, y - ay - share * rise);
}
