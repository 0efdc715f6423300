import { scaleLinear, scaleLog } from 'd3-scale';
import { bottomAxis, leftAxis } from './axis-marks';
import { frameOf } from './frame-of';
import { intervalPath, type Stroke } from './interval-path';
import { logTicks } from './log-ticks';
import type { LegendEntry, Mark, Picture, Point, Role, Size } from './picture';
import { pointPath, type Shape } from './point-path';
import { scaledTexts } from './scaled-texts';

/** How a point stands: what it is drawn as. */
export type OverTimeKind = 'within' | 'outside' | 'more' | 'unsure';

export interface OverTimePoint {
  time: number;
  value: number;
  /** Null where that end is open. */
  low: number | null;
  high: number | null;
  kind: OverTimeKind;
  words: () => string;
}

/** A quantity of the datasets of a sweep, over their times. */
export interface OverTime {
  /** Titles of the two axes. */
  time: string;
  quantity: string;
  points: OverTimePoint[];
  /** Lines across, over all times or from one to another. */
  levels: { value: number; role: Role; from?: number; to?: number }[];
  legend: LegendEntry[];
  notes: string[];
}

const LOOKS: Record<OverTimeKind, { point: Role; interval: Role; shape: Shape; size: number }> = {
  within: { point: 'observed', interval: 'interval', shape: 'dot', size: 6 },
  outside: { point: 'law', interval: 'interval', shape: 'dot', size: 7 },
  more: { point: 'observed-more', interval: 'interval-more', shape: 'up', size: 9 },
  unsure: { point: 'observed-unsure', interval: 'interval-unsure', shape: 'diamond', size: 9 }
};

/** Points with their intervals over a logarithmic time, and lines across to hold them against. */
export function overTimePicture(over: OverTime, { width, text }: Size): Picture {
  const height = Math.min(360, Math.max(240, width * 0.42));
  const margin = { left: text * 4.4, right: text * 1.8, top: text * 2.2, bottom: text * 3.8 };
  const frame = frameOf(width, height, margin);
  const times = over.points.map(({ time }) => time);
  const [first, last] = times.length > 0 ? [Math.min(...times), Math.max(...times)] : [1, 10];
  const edge = Math.max((last / first) ** 0.05, 1.05);
  const x = scaleLog([first / edge, last * edge], [frame.left, frame.right]);
  const seen = [
    ...over.points.flatMap(({ value, low, high }) => [value, low ?? value, high ?? value]),
    ...over.levels.map(({ value }) => value)
  ];
  const [least, most] = seen.length > 0 ? [Math.min(...seen), Math.max(...seen)] : [0, 1];
  const room = (most - least) * 0.08 || Math.abs(most) * 0.1 || 0.5;
  const y = scaleLinear([least - room, most + room], [frame.bottom, frame.top]);
  const ticks = y.ticks(5);
  const { texts, exponent } = scaledTexts(ticks);
  const at = ({ time, value }: OverTimePoint): Point => [x(time), y(value)];
  const strokesOf = ({ time, value, low, high }: OverTimePoint): Stroke[] => [
    { x: x(time), from: y(value), to: low === null ? frame.bottom : y(low), open: low === null },
    { x: x(time), from: y(value), to: high === null ? frame.top : y(high), open: high === null }
  ];
  const kinds = (Object.keys(LOOKS) as OverTimeKind[]).map((kind) => ({
    look: LOOKS[kind],
    points: over.points.filter((point) => point.kind === kind)
  }));
  const levels = over.levels.map(({ value, role, from, to }): Mark => {
    const [start, end] = [from ? x(from) : frame.left, to ? x(to) : frame.right];
    return { kind: 'path', role, d: `M${start.toFixed(2)},${y(value).toFixed(2)}H${end.toFixed(2)}` };
  });
  const drawn = kinds.filter(({ points }) => points.length > 0);
  const marks: Mark[] = [
    ...leftAxis(
      frame,
      ticks.map((value, i) => ({ at: y(value), text: texts[i] })),
      over.quantity,
      text,
      exponent
    ),
    ...levels,
    ...drawn.flatMap(({ look, points }): Mark[] => [
      { kind: 'path', role: look.interval, d: intervalPath(points.flatMap(strokesOf)) },
      { kind: 'path', role: look.point, d: pointPath(points.map(at), look.shape, look.size) }
    ]),
    ...bottomAxis(frame, logTicks(x, text * 3.5), over.time, text)
  ];
  const { legend, notes } = over;
  const readings = over.points.map((point) => ({ x: x(point.time), y: y(point.value), words: point.words }));
  return { width, height, build: 'low-field', marks, legend, order: 'across', readings, notes };
}
