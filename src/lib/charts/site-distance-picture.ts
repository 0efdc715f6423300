import { formatCount, formatNumber } from '$lib/model/format-number';
import type { DistanceCorrelation } from '$lib/stats/sites/correlation-by-distance';
import type { SitesReport } from '$lib/stats/sites/sites-types';
import { scaleLinear } from 'd3-scale';
import { bottomAxis, leftAxis } from './axis-marks';
import { frameOf } from './frame-of';
import { observedMarks, type Seen } from './observed-marks';
import type { LegendEntry, Picture, Role, Size } from './picture';
import { roomyTicks } from './roomy-ticks';
import { scaledTexts } from './scaled-texts';

/** Mean correlation of all pairs of one distance over that distance, with intervals, and 0 as a dashed line. */
export function siteDistancePicture(
  { byDistance }: Pick<SitesReport, 'byDistance'>,
  { width, text }: Size
): Picture {
  const height = Math.min(360, Math.max(240, width * 0.42));
  const frame = frameOf(width, height, {
    left: text * 4.4,
    right: text * 1.8,
    top: text * 2.2,
    bottom: text * 3.8
  });
  const known = byDistance.flatMap((one) => (one.value === null ? [] : [{ ...one, value: one.value }]));
  const ends = known.flatMap(({ value, low, high }) => [value, low ?? value, high ?? value]);
  const [least, most] = [Math.min(0, ...ends), Math.max(0, ...ends)];
  const room = (most - least) * 0.08 || 0.01;
  const x = scaleLinear([0.5, Math.max(1, byDistance.length) + 0.5], [frame.left, frame.right]);
  const y = scaleLinear([least - room, most + room], [frame.bottom, frame.top]);
  const seen = known.map(({ distance, value, low, high }): Seen => ({
    at: [x(distance), y(value)],
    interval: low === null || high === null ? null : { x: x(distance), from: y(low), to: y(high) },
    standing: low !== null && low > 0 ? 'more' : high !== null && high < 0 ? 'fewer' : 'within'
  }));
  const ticks = y.ticks(5);
  const { texts, exponent } = scaledTexts(ticks);
  const points = observedMarks(seen, 6).filter((mark) => mark.kind === 'path' && mark.d !== '');
  const drawn = (role: Role) => points.some((mark) => mark.kind === 'path' && mark.role === role);
  const entry = (role: Role, label: string): LegendEntry[] => (drawn(role) ? [{ role, label }] : []);
  return {
    width,
    height,
    build: 'low-field',
    marks: [
      ...leftAxis(
        frame,
        ticks.map((value, i) => ({ at: y(value), text: texts[i] })),
        'mean correlation',
        text,
        exponent
      ),
      { kind: 'path', role: 'limit', d: `M${frame.left},${y(0).toFixed(2)}H${frame.right}` },
      ...points,
      ...bottomAxis(
        frame,
        roomyTicks(x, text, (value) => Number.isInteger(value) && value >= 1),
        'distance, sites',
        text
      )
    ],
    legend: [
      ...entry('observed', 'mean of the pairs of a distance, with its 95 % interval'),
      ...entry('observed-more', 'interval above 0'),
      ...entry('observed-fewer', 'interval below 0'),
      { role: 'limit', label: 'sites that share nothing' }
    ],
    order: 'across',
    readings: known.map((one) => ({ x: x(one.distance), y: y(one.value), words: () => wordsOf(one) })),
    notes: []
  };
}

function wordsOf({ distance, pairs, value, low, high }: DistanceCorrelation): string {
  const ends =
    low === null || high === null
      ? ''
      : `, 95\u202f% interval ${formatNumber(low, 2)} to ${formatNumber(high, 2)}`;
  return `${distance === 1 ? 'Neighbours' : `Sites ${distance} apart`}, ${formatCount(pairs)} pairs: mean correlation ${formatNumber(value, 2)}${ends}.`;
}
