import type { RatePoint } from '$lib/stats/types';
import { columnOf } from './column-of';
import { intervalPath, type Stroke } from './interval-path';
import { observedMarks, type Seen } from './observed-marks';
import type { Frame, Mark } from './picture';
import { standing } from './standing';
import { thinnedMarks, type Column } from './thinned-marks';

type Place = (value: number) => number;

/** Seen rates with their intervals; counts never seen as arrows up from their lower limit. */
export function ratePoints(
  groups: RatePoint[][],
  at: (point: RatePoint) => number,
  y: Place,
  frame: Frame
): Mark[] {
  const single = groups[0].length === 1;
  const held = (value: number): number => Math.max(frame.top, Math.min(frame.bottom, y(value)));
  const arrows: Stroke[] = groups
    .filter((group) => group.every((point) => point.empirical === null))
    .map((group) => {
      const from = held(Math.min(...group.map((point) => point.low)));
      return { x: at(group[0]), from, to: Math.max(frame.top, from - 16), open: true };
    });
  const unseen: Mark = { kind: 'path', role: 'unseen', d: intervalPath(thinArrows(arrows)) };
  if (single) {
    const seen = groups.flat().flatMap((point): Seen[] => {
      if (point.empirical === null) return [];
      const x = at(point);
      const open = point.high === null;
      const interval = { x, from: held(point.low), to: held(point.high ?? Infinity), open };
      return [{ at: [x, held(point.empirical)], interval, standing: rateStanding(point) }];
    });
    return [unseen, ...observedMarks(seen, 6)];
  }
  const columns = groups.flatMap((group): Column[] => {
    const seen = group.filter((point) => point.empirical !== null);
    if (!seen.length) return [];
    const members = seen.map((point) => ({
      low: held(point.low),
      high: held(point.high ?? Infinity),
      value: held(point.empirical ?? Infinity),
      standing: rateStanding(point)
    }));
    return [columnOf(at(group[Math.floor(group.length / 2)]), members)];
  });
  return [unseen, ...thinnedMarks(columns)];
}

/** A low rate is a count seen often: the sides change places. No law at all counts as an infinite rate. */
function rateStanding(point: RatePoint): Seen['standing'] {
  return standing({ low: -(point.high ?? Infinity), high: -point.low, fitted: -(point.fitted ?? Infinity) });
}

/** Arrows at least 9 units apart; all stand at the same height, so the ones left out say nothing new. */
function thinArrows(arrows: Stroke[]): Stroke[] {
  let last = -Infinity;
  return arrows.filter(({ x }) => {
    if (x - last < 9) return false;
    last = x;
    return true;
  });
}
