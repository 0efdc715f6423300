import { formatNumber } from '$lib/model/format-number';
import { LEAST_CHANCE } from '$lib/stats/sweep/floor-chance';
import { sayChance } from '$lib/stats/sweep/say-chance';
import type { SweepReport } from '$lib/stats/sweep/types';
import { scaleLinear } from 'd3-scale';
import { bottomAxis } from './axis-marks';
import { frameOf } from './frame-of';
import type { Mark, Picture, Size } from './picture';
import { pointPath } from './point-path';
import { roomyTicks } from './roomy-ticks';

/** Most windows drawn besides the whole one. */
const MOST = 24;

/** The common exponent in every window that was looked at, a line each, with the one expected where there is one. */
export function windowsPicture(
  { windows: all, expected, alpha }: Pick<SweepReport, 'windows' | 'expected' | 'alpha'>,
  { width, text }: Size
): Picture {
  // A hundred datasets have 195 windows: a page of lines tells no more than two dozen do.
  const step = Math.ceil((all.length - 1) / MOST);
  const windows = all.filter((_, i) => step <= 1 || i % step === 0);
  const row = text * 1.9;
  const height = text * 5.2 + row * Math.max(1, windows.length);
  const frame = frameOf(width, height, {
    left: text * 10.5,
    right: text * 1.8,
    top: text * 1.2,
    bottom: text * 3.8
  });
  const ends = windows.flatMap(({ exponent }) => [exponent.low, exponent.high]);
  if (expected) ends.push(expected.exponent);
  const [low, high] = ends.length > 0 ? [Math.min(...ends), Math.max(...ends)] : [0, 1];
  const room = (high - low) * 0.08 || 0.5;
  const x = scaleLinear([low - room, high + room], [frame.left, frame.right]);
  const y = (i: number) => frame.top + row * (i + 0.5);
  const refused = (p: number) => p <= alpha;
  const of = (pick: boolean) =>
    windows.flatMap(({ exponent, commonP }, i) =>
      refused(commonP) === pick ? [[x(exponent.value), y(i)] as [number, number]] : []
    );
  const strokes = windows
    .map(({ exponent }, i) => `M${x(exponent.low).toFixed(2)},${y(i)}H${x(exponent.high).toFixed(2)}`)
    .join('');
  const marks: Mark[] = [
    ...(expected
      ? [
          {
            kind: 'path' as const,
            role: 'limit' as const,
            d: `M${x(expected.exponent).toFixed(2)},${frame.top}V${frame.bottom}`
          }
        ]
      : []),
    { kind: 'path', role: 'interval', d: strokes },
    { kind: 'path', role: 'observed', d: pointPath(of(false), 'dot', 6) },
    { kind: 'path', role: 'observed-unsure', d: pointPath(of(true), 'diamond', 9) },
    ...windows.map(({ from, to }, i): Mark => ({
      kind: 'text',
      x: frame.left - 8,
      y: y(i) + text * 0.35,
      text: `${short(from)} – ${short(to)}`,
      anchor: 'end',
      ink: 'ink',
      face: 'number',
      size: text
    })),
    ...bottomAxis(frame, roomyTicks(x, text), 'common exponent', text)
  ];
  return {
    width,
    height,
    build: 'lines',
    marks,
    legend: [
      { role: 'observed', label: 'one exponent for all, with its 95 % interval' },
      ...(of(true).length > 0
        ? [{ role: 'observed-unsure' as const, label: 'one exponent refused in this window' }]
        : []),
      ...(expected ? [{ role: 'limit' as const, label: 'exponent expected' }] : [])
    ],
    order: 'down',
    readings: windows.map(({ from, to, exponent, commonP }, i) => ({
      x: x(exponent.value),
      y: y(i),
      words: () =>
        `From ${formatNumber(from)} to ${formatNumber(to)}: ${formatNumber(exponent.value)}, 95 % interval ${formatNumber(exponent.low)} to ${formatNumber(exponent.high)}; one exponent for all: p ${commonP <= LEAST_CHANCE ? '' : '= '}${sayChance(commonP)}.`
    })),
    notes:
      windows.length < all.length
        ? [`${windows.length} of ${all.length} windows are drawn: the table has all.`]
        : []
  };
}

/** At most seven signs, so that two of them and a dash fit beside the frame. */
const short = (time: number): string =>
  time >= 1e4 || time < 1e-3 ? time.toExponential(1).replace('e+', 'e') : String(Number(time.toPrecision(3)));
