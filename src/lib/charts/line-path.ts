import { line } from 'd3-shape';
import { clipLine } from './clip-line';
import type { Frame, Point } from './picture';
import { thinnedLine } from './thinned-line';

const straight = line<Point>().digits(2);

/** Path string of a broken line, cut to the frame; '' when nothing of it is inside. Null breaks the line. */
export function linePath(points: (Point | null)[], frame: Frame): string {
  return clipLine(points, frame)
    .map((run) => straight(thinnedLine(run)) ?? '')
    .join('');
}
