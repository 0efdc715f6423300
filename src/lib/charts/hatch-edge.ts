import { clipLine } from './clip-line';
import type { Frame, Point } from './picture';

const SPACING = 7;
const REACH = 6;
const round = (value: number): number => Math.round(value * 100) / 100;

/**
 * Short strokes along one side of a line: the edge that nothing allowed may cross.
 * @param points the bound, picture units; null breaks it
 * @param side `above` or `below`: where the forbidden ground lies on the picture
 * @returns path string, a stroke each 7 units of length, cut to the frame
 */
export function hatchEdge(points: (Point | null)[], side: 'above' | 'below', frame: Frame): string {
  const sign = side === 'above' ? -1 : 1;
  let path = '';
  for (const run of clipLine(points, frame)) {
    let due = SPACING / 2;
    for (let i = 1; i < run.length; i++) {
      const [ax, ay] = run[i - 1];
      const [bx, by] = run[i];
      const length = Math.hypot(bx - ax, by - ay);
      // Strokes lean across the line: along a line that climbs their own way they could not be seen.
      const lean = sign * (bx - ax) * (by - ay) > 0 ? -1 : 1;
      for (; due <= length; due += SPACING) {
        const x = ax + ((bx - ax) * due) / length;
        const y = ay + ((by - ay) * due) / length;
        const tip = Math.max(frame.left, Math.min(frame.right, x + lean * REACH));
        const end = Math.min(frame.bottom, Math.max(frame.top, y + sign * REACH));
        path += `M${round(x)},${round(y)}L${round(tip)},${round(end)}`;
      }
      due -= length;
    }
  }
  return path;
}
