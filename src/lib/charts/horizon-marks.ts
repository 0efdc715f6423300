import type { Diagnosis, RatePoint } from '$lib/stats/types';
import { formatNumber } from '$lib/model/format-number';
import type { Frame, Mark } from './picture';
import { splitRaised } from './split-raised';
import { ruledShade } from './ruled-shade';

/** The shot horizon: its line, its name, and the ruled ground above it that these shots cannot show. */
export function horizonMarks(
  { rate }: Diagnosis,
  points: RatePoint[],
  at: (point: RatePoint) => number,
  y: (value: number) => number,
  frame: Frame,
  text: number
): Mark[] {
  const line = y(rate.horizon);
  // The curves leave the middle free, where the law is likely; the name goes there.
  const likely = points.filter((point) => (point.fitted ?? Infinity) < rate.horizon * 0.8).map(at);
  const middle = likely.length
    ? (Math.min(...likely) + Math.max(...likely)) / 2
    : (frame.left + frame.right) / 2;
  const [{ text: label, raised }] = splitRaised(`shot horizon ${formatNumber(rate.horizon, 3)}`);
  const half = (label.length + raised.length) * text * 0.28;
  const x = Math.min(frame.right - half, Math.max(frame.left + half, middle));
  return [
    { kind: 'path', role: 'shade', d: ruledShade(frame, frame.top, line) },
    { kind: 'path', role: 'horizon', d: `M${frame.left},${line.toFixed(2)}H${frame.right}` },
    {
      kind: 'text',
      x,
      y: line - text * 0.45,
      text: label,
      ...(raised ? { raised } : {}),
      anchor: 'middle',
      ink: 'faint',
      face: 'text',
      size: text,
      halo: true
    }
  ];
}
