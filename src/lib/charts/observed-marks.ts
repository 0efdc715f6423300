import type { Mark, Point } from './picture';
import { intervalPath, type Stroke } from './interval-path';
import { pointPath, type Shape } from './point-path';
import type { Standing } from './standing';

export interface Seen {
  at: Point;
  interval: Stroke | null;
  standing: Standing;
}

const ROLES = {
  within: ['interval', 'observed', 'dot'],
  more: ['interval-more', 'observed-more', 'up'],
  fewer: ['interval-fewer', 'observed-fewer', 'down']
} as const satisfies Record<Standing, readonly [string, string, Shape]>;

/** Observed points with their intervals; the shape says what the ink says. */
export function observedMarks(seen: Seen[], pointSize: number): Mark[] {
  return (['within', 'fewer', 'more'] as const).flatMap((standing) => {
    const these = seen.filter((point) => point.standing === standing);
    if (!these.length) return [];
    const [interval, observed, shape] = ROLES[standing];
    const strokes = these.flatMap((point) => (point.interval ? [point.interval] : []));
    const points = these.map((point) => point.at);
    const size = shape === 'dot' ? pointSize : pointSize + 3;
    return [
      { kind: 'path', role: interval, d: intervalPath(strokes) },
      { kind: 'path', role: observed, d: pointPath(points, shape, size) }
    ] satisfies Mark[];
  });
}
