import type { DistributionPoint } from '$lib/stats/types';
import { scaleLinear } from 'd3-scale';
import { leftAxis } from './axis-marks';
import { columnOf } from './column-of';
import { observedMarks } from './observed-marks';
import type { Frame, Mark, Point } from './picture';
import { residualOf } from './residual-of';
import { standing } from './standing';
import { thinnedMarks } from './thinned-marks';
import { residualTicks } from './residual-ticks';

/**
 * The strip under the counts: distance of each from the law, with the band that an interval spans. A row that lumps counts
 * is a point of its own, also where single counts are gathered into columns.
 */
export function residualMarks(
  groups: DistributionPoint[][],
  lumps: DistributionPoint[],
  x: (point: DistributionPoint) => number,
  frame: Frame,
  text: number
): Mark[] {
  const points = [...groups.flat(), ...lumps];
  const far = Math.max(1.6, ...points.map((point) => Math.abs(residualOf(point))));
  const y = scaleLinear([-far, far], [frame.bottom - 4, frame.top + 4]);
  const axis = leftAxis(
    frame,
    residualTicks(far).map(({ at, ...label }) => ({ at: y(at), ...label })),
    'off the law, in half-intervals',
    text
  );
  const band = [-1, 1].map((value) => `M${frame.left},${y(value).toFixed(2)}H${frame.right}`).join('');
  const marks: Mark[] = [
    ...axis,
    { kind: 'path', role: 'level', d: band },
    { kind: 'path', role: 'fitted', d: `M${frame.left},${y(0).toFixed(2)}H${frame.right}` }
  ];
  const dots = (of: DistributionPoint[]) =>
    observedMarks(
      of.map((point) => {
        const at: Point = [x(point), y(residualOf(point))];
        return { at, interval: { x: at[0], from: y(0), to: at[1] }, standing: standing(point) };
      }),
      5
    );
  if ((groups[0]?.length ?? 1) === 1) return [...marks, ...dots(points)];
  const columns = groups.map((group) =>
    columnOf(
      (x(group[0]) + x(group[group.length - 1])) / 2,
      group.map((point) => {
        const value = y(residualOf(point));
        return { low: value, high: value, value, standing: standing(point) };
      })
    )
  );
  return [...marks, ...thinnedMarks(columns), ...(lumps.length > 0 ? dots(lumps) : [])];
}
