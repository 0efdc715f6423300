import type { TailPoint } from '$lib/stats/types';
import { columnOf } from './column-of';
import { intervalPath } from './interval-path';
import { observedMarks } from './observed-marks';
import type { Frame, Mark, Point } from './picture';
import { standing } from './standing';
import { thinnedMarks } from './thinned-marks';

type Place = (value: number) => number;

/** Seen tail shares with intervals; a tail never reached is an arrow down from its upper limit. */
export function tailPoints(groups: TailPoint[][], x: Place, y: Place, frame: Frame): Mark[] {
  if (!groups.length) return [];
  const held = (value: number): number => Math.max(frame.top, Math.min(frame.bottom, y(value)));
  const arrows = groups
    .filter((group) => group.every((point) => point.shots === 0))
    .map((group) => {
      const from = held(Math.max(...group.map((point) => point.high)));
      return { x: x(group[0].count), from, to: Math.min(frame.bottom, from + 16), open: true };
    });
  const empty: Mark = { kind: 'path', role: 'unseen', d: intervalPath(arrows) };
  const reached = groups
    .map((group) => group.filter((point) => point.shots > 0))
    .filter((group) => group.length);
  if (groups[0].length === 1) {
    const seen = reached.flat().map((point) => ({
      at: [x(point.count), held(point.observed)] as Point,
      interval: { x: x(point.count), from: held(point.low), to: held(point.high) },
      standing: standing(point)
    }));
    return [empty, ...observedMarks(seen, 6)];
  }
  const columns = reached.map((group) =>
    columnOf(
      x((group[0].count + group[group.length - 1].count) / 2),
      group.map((point) => ({
        low: held(point.low),
        high: held(point.high),
        value: held(point.observed),
        standing: standing(point)
      }))
    )
  );
  return [empty, ...thinnedMarks(columns)];
}
