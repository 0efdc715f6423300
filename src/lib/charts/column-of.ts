import type { Standing } from './standing';
import { standingOfGroup, type Column } from './thinned-marks';

/** How one member of a group is drawn: picture units. */
export interface Member {
  low: number;
  high: number;
  value: number;
  standing: Standing;
}

/** Gathers neighbours into one column at `x`; all of it in picture units. */
export function columnOf(x: number, members: Member[]): Column {
  const values = members.map((member) => member.value);
  const ends = members.flatMap(({ low, high }) => [low, high]);
  return {
    x,
    low: Math.max(...ends),
    high: Math.min(...ends),
    from: Math.max(...values),
    to: Math.min(...values),
    standing: standingOfGroup(members.map((member) => member.standing))
  };
}
