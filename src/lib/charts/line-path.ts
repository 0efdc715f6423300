import { clipLine } from './clip-line';
import type { Frame, Point } from './picture';
import { thinnedLine } from './thinned-line';

/** Path string of a broken line, cut to the frame; '' when nothing of it is inside. Null breaks the line. */
export function linePath(points: (Point | null)[], frame: Frame): string {
  return clipLine(points, frame)
    .map((run) => straight(thinnedLine(run)))
    .join('');
}

/** A run has two points at least: clipLine leaves no others. */
const straight = (points: Point[]): string =>
  points.map(([x, y], i) => `${i ? 'L' : 'M'}${round(x)},${round(y)}`).join('');

const round = (value: number): number => Math.round(value * 100) / 100;
