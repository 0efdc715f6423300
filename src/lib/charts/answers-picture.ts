import type { SweepReport } from '$lib/stats/sweep/types';
import { scaleLog } from 'd3-scale';
import { answersAlong } from './answers-along';
import { bottomAxis } from './axis-marks';
import { frameOf } from './frame-of';
import { logTicks } from './log-ticks';
import type { Mark, Picture, Size } from './picture';
import { pointPath } from './point-path';
import { sayPointTime } from './say-point-time';
import { sweepSpan } from './sweep-span';
import { timeTitle } from './time-title';

/** The answers of the datasets along the time of a sweep: a line for each answer under its words. */
export function answersPicture(report: SweepReport, { width, text }: Size): Picture {
  const rows = answersAlong(report);
  const row = text * 3.2;
  const height = text * 4.4 + row * Math.max(1, rows.length);
  const frame = frameOf(width, height, {
    left: text,
    right: text * 1.8,
    top: text * 0.6,
    bottom: text * 3.8
  });
  const x = scaleLog(sweepSpan(report).times, [frame.left, frame.right]);
  const y = (i: number) => frame.top + row * (i + 0.68);
  const lines = rows.map((_, i) => `M${frame.left},${y(i).toFixed(2)}H${frame.right}`).join('');
  const marks: Mark[] = [
    { kind: 'path', role: 'grid', d: lines },
    ...rows.flatMap(({ words, role, shape, size, points }, i): Mark[] => [
      {
        kind: 'text',
        x: 0,
        y: y(i) - text * 1.1,
        text: words,
        anchor: 'start',
        ink: 'ink',
        face: 'text',
        size: text
      },
      {
        kind: 'path',
        role,
        d: pointPath(
          points.map(({ time }) => [x(time), y(i)]),
          shape,
          size
        )
      }
    ]),
    ...bottomAxis(frame, logTicks(x, text * 3.5), timeTitle(report), text)
  ];
  return {
    width,
    height,
    build: 'lines',
    marks,
    legend: rows.map(({ role, words, points }) => ({
      role,
      label: `${words}: ${points.length} of ${report.points.length}`,
      bare: true as const
    })),
    order: 'across',
    readings: rows
      .flatMap(({ words, points }, i) => points.map((point) => ({ point, words, i })))
      .sort((a, b) => a.point.time - b.point.time)
      .map(({ point, words, i }) => ({
        x: x(point.time),
        y: y(i),
        words: () => `${sayPointTime(point, report)}: ${words}.`
      })),
    notes: []
  };
}
