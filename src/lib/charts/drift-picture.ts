import { formatCount, formatNumber } from '$lib/model/format-number';
import type { DriftPart } from '$lib/stats/drift/types';
import type { MeanPoint } from '$lib/stats/drift/running-mean';
import { scaleLinear } from 'd3-scale';
import { bottomAxis, leftAxis } from './axis-marks';
import { frameOf } from './frame-of';
import { linePath } from './line-path';
import { observedMarks, type Seen } from './observed-marks';
import type { Mark, Picture, Point, Role, Size } from './picture';
import { roomyTicks } from './roomy-ticks';
import { scaledTexts } from './scaled-texts';

/** A change less likely than this by chance is drawn. */
const shown = 0.05;

/** Means of stretches of shots over time, with three-sigma limits, and the change best supported. */
export function driftPicture({ means, change }: DriftPart, { width, text }: Size): Picture {
  const height = Math.min(360, Math.max(240, width * 0.42));
  const frame = frameOf(width, height, {
    left: text * 4.4,
    right: text * 1.8,
    top: text * 2.2,
    bottom: text * 3.8
  });
  const last = means.at(-1)?.to ?? 1;
  const values = means.flatMap(({ mean, low, high }) => [mean, low, high]);
  const least = Math.min(...values, Infinity);
  const most = Math.max(...values, -Infinity);
  const [bottom, top] = means.length === 0 ? [0, 1] : [least, most];
  const room = (top - bottom) * 0.08 || 0.5;
  const x = scaleLinear([1, Math.max(2, last)], [frame.left, frame.right]);
  const y = scaleLinear([bottom - room, top + room], [frame.bottom, frame.top]);
  const at = ({ from, to }: MeanPoint): number => x((from + 1 + to) / 2);
  // Limits hold over the whole stretch, and the last may be longer than the others.
  const steps = (pick: (point: MeanPoint) => number): string =>
    linePath(
      means.flatMap((point): Point[] => [
        [x(point.from + 1), y(pick(point))],
        [x(point.to), y(pick(point))]
      ]),
      frame
    );
  const seen = means.map((point): Seen => ({
    at: [at(point), y(point.mean)],
    interval: null,
    standing: point.mean > point.high ? 'more' : point.mean < point.low ? 'fewer' : 'within'
  }));
  const ticks = y.ticks(5);
  const { texts, exponent } = scaledTexts(ticks);
  const points = observedMarks(seen, 6).filter((mark) => mark.kind === 'path' && mark.d !== '');
  const drawn = (role: Role) => points.some((mark) => mark.kind === 'path' && mark.role === role);
  const changed = change !== null && change.p <= shown && means.length > 0;
  const marks: Mark[] = [
    ...leftAxis(
      frame,
      ticks.map((value, i) => ({ at: y(value), text: texts[i] })),
      'mean count',
      text,
      exponent
    ),
    { kind: 'path', role: 'limit', d: steps(({ low }) => low) + steps(({ high }) => high) },
    ...(changed
      ? [
          {
            kind: 'path' as const,
            role: 'horizon' as const,
            d: `M${x(change.shot).toFixed(2)},${frame.bottom}V${frame.top}`
          }
        ]
      : []),
    ...points,
    ...bottomAxis(frame, roomyTicks(x, text, Number.isInteger), 'shot, in the order taken', text)
  ];
  return {
    width,
    height,
    build: 'low-field',
    marks,
    legend: [
      { role: 'observed', label: 'mean of a stretch of shots' },
      ...(drawn('observed-more')
        ? [{ role: 'observed-more' as const, label: 'mean above the limits: more than steady shots give' }]
        : []),
      ...(drawn('observed-fewer')
        ? [{ role: 'observed-fewer' as const, label: 'mean below the limits: fewer than steady shots give' }]
        : []),
      { role: 'limit', label: 'three standard errors about the mean of all shots' },
      ...(changed ? [{ role: 'horizon' as const, label: 'change best supported' }] : [])
    ],
    order: 'across',
    readings: means.map((point) => ({ x: at(point), y: y(point.mean), words: () => wordsOf(point) })),
    notes: []
  };
}

const wordsOf = ({ from, to, mean, low, high, outside }: MeanPoint): string =>
  `Shots ${formatCount(from + 1)} to ${formatCount(to)}: mean ${formatNumber(mean)}, ${outside ? 'outside' : 'within'} its limits ${formatNumber(low)} to ${formatNumber(high)}.`;
