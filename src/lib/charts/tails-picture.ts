import type { Diagnosis, TailPoint } from '$lib/stats/types';
import { scaleLinear, scaleLog } from 'd3-scale';
import { bottomAxis, leftAxis } from './axis-marks';
import { countTicks } from './count-ticks';
import { frameOf } from './frame-of';
import { groupCounts } from './group-counts';
import { hatchEdge } from './hatch-edge';
import { legendOfDrawn } from './legend-of-drawn';
import { legendOfStanding } from './legend-of-standing';
import { linePath } from './line-path';
import type { Frame, Mark, Picture, Point, Size } from './picture';
import { powerTick } from './power-tick';
import { shownSpan } from './shown-span';
import { tailPoints } from './tail-points';
import { tailWords } from './tail-words';
import { thinnedNote } from './thinned-marks';

const SIDES = ['low', 'high'] as const;

/** Both tails on a logarithmic scale: seen shares, the best law, and the bounds that every law obeys. */
export function tailsPicture(diagnosis: Diagnosis, { width, text }: Size): Picture {
  const { shots, unit } = diagnosis.data;
  const [from, to] = shownSpan(
    diagnosis.tails.points,
    (point) => point.shots > 0 || point.fitted * shots > 0.02
  );
  const points = diagnosis.tails.points.filter((point) => point.count >= from && point.count <= to);
  const height = Math.min(460, Math.max(280, width * 0.58));
  const frame = frameOf(width, height, {
    left: text * 4.4,
    right: text * 1.8,
    top: text * 2.2,
    bottom: text * 3.8
  });
  const least = lowest(points, shots);
  const x = scaleLinear([from - 0.6, to + 0.6], [frame.left, frame.right]);
  const y = scaleLog([least, 1], [frame.bottom, frame.top]);
  const floor = (value: number): number => (value > 0 ? y(value) : frame.bottom + 1e4);

  const sides = SIDES.map((side) => points.filter((point) => point.side === side));
  const groups = sides.map((side) => groupCounts(side, x(1) - x(0), 5));
  const together = Math.max(1, ...groups.map((side) => side[0]?.length ?? 1));
  const marks: Mark[] = [
    ...leftAxis(frame, decades(least, y, frame, text), 'share of shots in the tail', text),
    ...sides.flatMap((side) => boundsOf(side, x, floor, frame)),
    ...groups.flatMap((side) => tailPoints(side, x, floor, frame)),
    ...bottomAxis(
      frame,
      countTicks(x, text),
      `n ${unit === 'pair' ? 'pairs' : 'defects'} or fewer; n or more`,
      text
    )
  ];
  return {
    width,
    height,
    build: 'field',
    marks,
    legend: legendOfDrawn(marks, [
      { role: 'observed', label: 'seen in the tail, with its 95 % interval' },
      ...legendOfStanding(marks, 'tail seen'),
      { role: 'unseen', label: 'tail never seen: upper limit only', down: true },
      { role: 'fitted', label: 'best law' },
      { role: 'limit', label: 'Chernoff bound of the best law' },
      { role: 'mean-bound', label: 'Chernoff bound from the mean alone' },
      { role: 'bound', label: 'Hoeffding: no independent trials above this edge' }
    ]),
    order: 'across',
    readings: points.map((point) => ({
      x: x(point.count),
      y: Math.min(frame.bottom, floor(point.observed)),
      words: () => tailWords(point, shots)
    })),
    notes: together > 1 ? [thinnedNote(together)] : []
  };
}

/** Bottom of the scale: a decade under the smallest thing seen or expected, but no deeper than S shots reach. */
function lowest(points: TailPoint[], shots: number): number {
  const values = points.flatMap(({ low, fitted }) => [low, fitted]).filter((value) => value > 0);
  const smallest = Math.min(1 / shots, ...values);
  return 10 ** Math.floor(Math.log10(Math.max(smallest, 0.005 / shots, 1e-300)) - 0.01);
}

function decades(least: number, y: (value: number) => number, frame: Frame, text: number) {
  const deepest = Math.round(Math.log10(least));
  const step = Math.max(1, Math.ceil((-deepest * text * 2.2) / (frame.bottom - frame.top)));
  const ticks = [];
  for (let exponent = 0; exponent >= deepest; exponent -= step)
    ticks.push({ at: y(10 ** exponent), ...powerTick(exponent) });
  return ticks;
}

function boundsOf(
  side: TailPoint[],
  x: (n: number) => number,
  y: (p: number) => number,
  frame: Frame
): Mark[] {
  const line = (pick: (point: TailPoint) => number): (Point | null)[] =>
    widened(side.map((point) => [x(point.count), y(pick(point))]));
  // Within one of the mean the bound is 1 and says nothing.
  const edge = widened(
    side.map((point): Point | null => (point.hoeffding < 1 ? [x(point.count), y(point.hoeffding)] : null))
  );
  // A bound that holds at one count alone is drawn over the width of that count: a line of one point is none.
  function widened(points: (Point | null)[]): (Point | null)[] {
    const there = points.filter((point) => point !== null);
    if (there.length !== 1) return points;
    const [[at, height]] = there;
    const half = 0.35 * (x(1) - x(0));
    return [
      [at - half, height],
      [at + half, height]
    ];
  }
  return [
    {
      kind: 'path',
      role: 'mean-bound',
      d: linePath(
        line((point) => point.meanChernoff),
        frame
      )
    },
    {
      kind: 'path',
      role: 'limit',
      d: linePath(
        line((point) => point.chernoff),
        frame
      )
    },
    { kind: 'path', role: 'hatch', d: hatchEdge(edge, 'above', frame) },
    { kind: 'path', role: 'bound', d: linePath(edge, frame) },
    {
      kind: 'path',
      role: 'fitted',
      d: linePath(
        line((point) => point.fitted),
        frame
      )
    }
  ];
}
