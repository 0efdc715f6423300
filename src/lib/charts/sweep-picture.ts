import { formatNumber } from '$lib/model/format-number';
import type { SweepReport } from '$lib/stats/sweep/types';
import { bottomAxis, leftAxis } from './axis-marks';
import { intervalPath } from './interval-path';
import { linePath } from './line-path';
import { logTicks } from './log-ticks';
import type { Mark, Picture, Point, Reading, Size } from './picture';
import { pointPath } from './point-path';
import { seriesLabels } from './series-labels';
import { sweepFrame } from './sweep-frame';
import { timeTitle } from './time-title';

const NAMES = ['mean', 'variance', 'third cumulant'];
const SIGNS = ['κ₁', 'κ₂', 'κ₃'];

/** Cumulants over the time of a sweep, both logarithmic, with the power laws fitted in the window. */
export function sweepPicture(report: SweepReport, { width, text }: Size): Picture {
  const { height, frame, x, y } = sweepFrame(report, { width, text });
  const [times, values] = [x.domain(), y.domain()];
  const low = (value: number) => y(Math.max(value, values[0]));
  const seen = report.points.flatMap((point) =>
    (point.cumulants ?? []).flatMap((one, q) => (one.value > 0 ? [{ point, one, q }] : []))
  );
  const place = ({ point, one }: (typeof seen)[number]): Point => [x(point.time), y(one.value)];
  const within = seen.filter(({ point }) => point.inWindow);
  const outside = seen.filter(({ point }) => !point.inWindow);
  const strokes = seen.map(({ point, one }) => ({
    x: x(point.time),
    from: low(one.low),
    to: y(one.high)
  }));
  const { laws, window } = report;
  const span = [window.from, window.to].map((time) => Math.min(times[1], Math.max(times[0], time)));
  const line = (level: number, exponent: number) =>
    linePath(
      span.map((time): Point => [x(time), y(Math.exp(level - exponent * (Math.log(time) - laws!.middle)))]),
      frame
    );
  const each = laws?.exponents.map(({ value }, q) => line(laws.logLevels[q], value)).join('') ?? '';
  const all = laws?.common.logLevels.map((level) => line(level, laws.common.exponent.value)).join('') ?? '';
  const ends = [0, 1, 2].flatMap((q) => {
    const last = seen.filter((one) => one.q === q).at(-1);
    return last ? [{ text: SIGNS[q], y: place(last)[1] }] : [];
  });
  const marks: Mark[] = [
    ...leftAxis(frame, logTicks(y, text * 1.6), 'cumulant', text),
    { kind: 'path', role: 'limit', d: all },
    { kind: 'path', role: 'fitted', d: each },
    { kind: 'path', role: 'interval', d: intervalPath(strokes) },
    { kind: 'path', role: 'law', d: pointPath(outside.map(place), 'dot', 7) },
    { kind: 'path', role: 'observed', d: pointPath(within.map(place), 'dot', 6) },
    ...seriesLabels(ends, frame, text),
    ...bottomAxis(frame, logTicks(x, text * 3.5), timeTitle(report), text)
  ];
  return {
    width,
    height,
    build: 'field',
    marks,
    legend: [
      { role: 'observed', label: 'in the window, with its 95 % interval' },
      ...(outside.length > 0 ? [{ role: 'law' as const, label: 'outside the window' }] : []),
      ...(laws
        ? [
            { role: 'fitted' as const, label: 'power law of each' },
            { role: 'limit' as const, label: 'one exponent for all' }
          ]
        : [])
    ],
    order: 'across',
    readings: seen.map((one): Reading => {
      const [at, up] = place(one);
      return { x: at, y: up, words: () => wordsOf(report, one) };
    }),
    notes: [...notesOf(report, seen.length)]
  };
}

function wordsOf(
  { timeUnit }: SweepReport,
  {
    point,
    one,
    q
  }: { point: SweepReport['points'][number]; one: { value: number; low: number; high: number }; q: number }
): string {
  return `${point.label}, ${formatNumber(point.time)}${timeUnit ? ` ${timeUnit}` : ''}: ${NAMES[q]} ${formatNumber(one.value)}, 95 % interval ${formatNumber(one.low)} to ${formatNumber(one.high)}${point.inWindow ? '' : ', outside the window'}.`;
}

function notesOf({ points }: SweepReport, drawn: number): string[] {
  const known = points.reduce((sum, { cumulants }) => sum + (cumulants?.length ?? 0), 0);
  const left = known - drawn;
  const which = left === 1 ? 'One cumulant at or below 0 has' : `${left} cumulants at or below 0 have`;
  return left > 0 ? [`${which} no place on a logarithmic axis: see the table.`] : [];
}
