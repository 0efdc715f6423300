import { intervalPath } from './interval-path';
import type { Mark, Point, Role } from './picture';
import { pointPath } from './point-path';
import type { Standing } from './standing';

/** A group of neighbouring counts at `x`: extent of their intervals and range of what was seen. */
export interface Column {
  x: number;
  low: number;
  high: number;
  from: number;
  to: number;
  standing: Standing;
}

const RANGES: Record<Standing, Role> = { within: 'range', more: 'range-more', fewer: 'range-fewer' };

/** A group stands off the law when some of its counts do, all to the same side; mixed ones are drawn in ink. */
export function standingOfGroup(standings: Standing[]): Standing {
  const more = standings.includes('more');
  const fewer = standings.includes('fewer');
  return more === fewer ? 'within' : more ? 'more' : 'fewer';
}

/** Groups of counts as columns: hairline over all their intervals, heavy stroke over the values seen. */
export function thinnedMarks(columns: Column[]): Mark[] {
  const hairlines = intervalPath(columns.map((c) => ({ x: c.x, from: c.low, to: c.high })));
  return [
    { kind: 'path', role: 'unseen', d: hairlines },
    ...(['within', 'fewer', 'more'] as const).flatMap((standing): Mark[] => {
      const these = columns.filter((column) => column.standing === standing);
      if (!these.length) return [];
      // A value of no height still needs a stroke to be seen.
      const strokes = these.map((c) => ({
        x: c.x,
        from: Math.min(c.from, c.to) - 1,
        to: Math.max(c.from, c.to) + 1
      }));
      const ranges: Mark = { kind: 'path', role: RANGES[standing], d: intervalPath(strokes) };
      if (standing === 'within') return [ranges];
      const tips = strokes.map((stroke): Point => [stroke.x, standing === 'more' ? stroke.from : stroke.to]);
      const role = standing === 'more' ? 'observed-more' : 'observed-fewer';
      return [ranges, { kind: 'path', role, d: pointPath(tips, standing === 'more' ? 'up' : 'down', 5) }];
    })
  ];
}

/** What the page says when counts were gathered. */
export const thinnedNote = (together: number): string =>
  `Too many counts for one mark each: a heavy stroke covers ${together} neighbouring counts, from the smallest to ` +
  'the largest value seen. The table and the CSV file have every count.';
