import type { SweepReport } from '$lib/stats/sweep/types';
import { scaleLog, type ScaleLogarithmic } from 'd3-scale';
import { frameOf } from './frame-of';
import type { Frame, Size } from './picture';
import { sweepSpan } from './sweep-span';

/** Where the chart of a sweep's cumulants lies: the picture draws in it, and what moves the window finds its times in it. */
export function sweepFrame(
  report: Pick<SweepReport, 'points'>,
  { width, text }: Size
): {
  height: number;
  frame: Frame;
  x: ScaleLogarithmic<number, number>;
  y: ScaleLogarithmic<number, number>;
} {
  const height = Math.min(460, Math.max(280, width * 0.58));
  const margin = { left: text * 4.4, right: text * 3.2, top: text * 2.2, bottom: text * 3.8 };
  const frame = frameOf(width, height, margin);
  const { times, values } = sweepSpan(report);
  return {
    height,
    frame,
    x: scaleLog(times, [frame.left, frame.right]),
    y: scaleLog(values, [frame.bottom, frame.top])
  };
}
