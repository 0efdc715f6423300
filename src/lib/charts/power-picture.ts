import { formatCount, formatPercent } from '$lib/model/format-number';
import { scaleLinear } from 'd3-scale';
import { bottomAxis, leftAxis } from './axis-marks';
import { frameOf } from './frame-of';
import { linePath } from './line-path';
import type { Mark, Picture, Point, Size } from './picture';
import { pointPath } from './point-path';
import { roomyTicks } from './roomy-ticks';

/** A plan as its chart needs it. */
export interface ShownPlan {
  /** Chance to see the effect, by shots. */
  curve: [shots: number, power: number][];
  shots: number;
  /** Power with that many shots, and the power asked for. */
  power: number;
  asked: number;
}

const words = (shots: number, power: number): string =>
  `${formatCount(shots)} shots: seen in ${formatPercent(power, 3)} of experiments.`;

/** How the chance to see an effect grows with the shots, and where the plan lies. */
export function powerPicture({ curve, shots, power, asked }: ShownPlan, { width, text }: Size): Picture {
  const height = Math.min(460, Math.max(280, width * 0.58));
  const frame = frameOf(width, height, {
    left: text * 4.4,
    right: text * 1.8,
    top: text * 2.2,
    bottom: text * 3.8
  });
  const x = scaleLinear([0, curve[curve.length - 1][0]], [frame.left, frame.right]);
  const y = scaleLinear([0, 1], [frame.bottom, frame.top]);
  const plan: Point = [x(shots), y(power)];
  const marks: Mark[] = [
    ...leftAxis(
      frame,
      [0, 0.2, 0.4, 0.6, 0.8, 1].map((at) => ({ at: y(at), text: at.toFixed(1) })),
      'power',
      text
    ),
    { kind: 'path', role: 'limit', d: `M${frame.left},${y(asked).toFixed(2)}H${frame.right}` },
    {
      kind: 'path',
      role: 'fitted',
      d: linePath(
        curve.map(([at, chance]): Point => [x(at), y(chance)]),
        frame
      )
    },
    { kind: 'path', role: 'law', d: pointPath([plan], 'dot', 9) },
    ...bottomAxis(frame, roomyTicks(x, text), 'shots', text)
  ];
  const readings = curve.map(([at, chance]) => ({
    x: x(at),
    y: y(chance),
    words: () => words(at, chance)
  }));
  readings.push({ x: plan[0], y: plan[1], words: () => `The plan, ${words(shots, power)}` });
  return {
    width,
    height,
    build: 'field',
    marks,
    legend: [
      { role: 'fitted', label: 'chance to see the effect' },
      { role: 'limit', label: 'power asked for' },
      { role: 'law', label: 'the plan' }
    ],
    order: 'across',
    readings: readings.sort((a, b) => a.x - b.x),
    notes: []
  };
}
