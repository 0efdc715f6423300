import type { namedLaws } from './named-laws';
import type { Frame, Mark, Point, TextMark } from './picture';

type Place = (value: number) => number;
type Box = [left: number, right: number, top: number, bottom: number];

/**
 * Names beside their crosses: right of them, since the region and its hatch lie to the left, or else above, below or
 * left of them, wherever they touch no other name and as few of the points as can be. Laws outside the frame have none.
 *
 * @param points drawn besides, which a name keeps off where it can
 */
export function namedLabels(
  named: ReturnType<typeof namedLaws>,
  x: Place,
  y: Place,
  frame: Frame,
  text: number,
  points: Point[]
): Mark[] {
  const shown = named.filter(({ at }) => x(at[0]) <= frame.right && y(at[1]) >= frame.top);
  const crosses = [...points, ...shown.map(({ at }): Point => [x(at[0]), y(at[1])])];
  const taken: Box[] = [];
  return shown.flatMap(({ name, at }): Mark[] => {
    const [cx, cy] = [x(at[0]), y(at[1])];
    const room = name.length * text * 0.52;
    const right = Math.min(cx + text * 0.9, frame.right + text * 1.5 - room);
    const middle = Math.min(cx - room / 2, frame.right + text * 1.5 - room);
    const beside: Point = [right, cy + text * 0.35];
    const under: Point = [right, Math.min(frame.bottom - 4, cy + text * 1.6)];
    const places: Point[] = [
      // Right of equal trials the way goes on to the Poisson law.
      ...(name === 'Poisson' ? [beside, under] : [under, beside]),
      [right, cy - text * 0.8],
      [middle, cy - text * 0.8],
      [cx - text * 0.9 - room, cy + text * 0.35]
    ];
    const free = places
      .map((place) => ({ place, box: boxOf(place, room, text) }))
      .filter(({ box }) => box[0] >= frame.left && !taken.some((other) => touch(box, other)))
      .map((one) => ({ ...one, hit: crosses.filter((point) => touch(one.box, around(point))).length }))
      .sort((a, b) => a.hit - b.hit);
    if (free.length === 0) return [];
    const [{ place, box }] = free;
    taken.push(box);
    const look: Pick<TextMark, 'anchor' | 'ink' | 'face' | 'size' | 'halo'> = {
      anchor: 'start',
      ink: 'faint',
      face: 'text',
      size: text,
      halo: true
    };
    return [{ kind: 'text', x: place[0], y: place[1], text: name, ...look }];
  });
}

/** Letters reach about 0.75 of their size above the line, and a quarter below. */
const boxOf = ([left, line]: Point, room: number, text: number): Box => [
  left,
  left + room,
  line - 0.75 * text,
  line + 0.25 * text
];

const around = ([x, y]: Point): Box => [x - 5, x + 5, y - 5, y + 5];

const touch = (a: Box, b: Box): boolean => a[0] < b[1] && b[0] < a[1] && a[2] < b[3] && b[2] < a[3];
