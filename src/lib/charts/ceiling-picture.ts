import type { Diagnosis } from '$lib/stats/types';
import { scaleLinear } from 'd3-scale';
import { bottomAxis } from './axis-marks';
import { ceilingStanding, ceilingWords } from './ceiling-words';
import { frameOf } from './frame-of';
import { hatchEdge } from './hatch-edge';
import type { Mark, Picture, Point, Role, Size } from './picture';
import { pointPath, type Shape } from './point-path';
import { tickTexts } from './tick-texts';

const LOOK: Record<ReturnType<typeof ceilingStanding>, { point: Role; interval: Role; shape: Shape }> = {
  more: { point: 'observed-more', interval: 'interval-more', shape: 'up' },
  fewer: { point: 'observed-fewer', interval: 'interval-fewer', shape: 'down' },
  within: { point: 'observed', interval: 'interval', shape: 'dot' },
  unsure: { point: 'observed-unsure', interval: 'interval-unsure', shape: 'diamond' }
};

/** Room between the ceiling and a label beside it, picture units. */
const GAP = 4;

/** Variance over the ceiling on one line, with the edge that independent trials cannot cross. */
export function ceilingPicture(diagnosis: Diagnosis, { width, text }: Size): Picture {
  const { value, low, high } = diagnosis.moments.dispersion;
  const tolerance = 1 + diagnosis.engine.tolerance;
  const height = text * 10;
  const frame = frameOf(width, height, {
    left: text * 1.9,
    right: text * 1.9,
    top: text * 3,
    bottom: text * 3.8
  });
  const far = Math.max(tolerance, value ?? 0, Math.min(high ?? 0, 3 * Math.max(tolerance, value ?? 0)));
  const near = Math.min(1 - 2 * diagnosis.engine.tolerance, value ?? 1, low ?? 1);
  const room = (far - near) * 0.08;
  const share = tickTexts([0, diagnosis.engine.tolerance], 100, '\u2009%')[1];
  const wordings = [`excess that matters, ${share}`, `that matters, ${share}`, `matters, ${share}`];
  // The shortest wording always fits between the ceiling and the edge of the picture: a wide interval to the
  // left would otherwise press the ceiling against the right edge.
  const needed = 2 * halfOf(wordings[2]) + 2 * GAP - (width - frame.right);
  const part = Math.min(0.6, Math.max(0, needed / (frame.right - frame.left)));
  const start = Math.max(0, near - room);
  const end = Math.max(far + room, (1 - part * start) / (1 - part));
  const x = scaleLinear([start, end], [frame.left, frame.right]);
  const y = (frame.top + frame.bottom) / 2;
  const look = LOOK[ceilingStanding(diagnosis)];
  const edge: Point[] = [
    [x(1), frame.bottom],
    [x(1), frame.top]
  ];
  const ticks = x.ticks(Math.max(3, Math.floor((frame.right - frame.left) / (text * 8))));
  const texts = tickTexts(ticks);
  const marks: Mark[] = [
    { kind: 'path', role: 'hatch', d: hatchEdge(edge, 'above', frame) },
    { kind: 'path', role: 'bound', d: `M${x(1).toFixed(2)},${frame.bottom}V${frame.top}` },
    { kind: 'path', role: 'level', d: `M${x(tolerance).toFixed(2)},${frame.bottom}V${frame.top}` },
    caption('ceiling', x(1), 1.1),
    caption(matters(width - x(1) - GAP), x(tolerance), 2.4, x(1) + GAP),
    ...bottomAxis(
      frame,
      ticks.map((v, i) => ({ at: x(v), text: texts[i] })),
      'variance over its ceiling',
      text
    )
  ];
  if (low !== null && high !== null) {
    const [from, to] = [Math.max(frame.left, x(low)), Math.min(frame.right, x(high))];
    marks.push({ kind: 'path', role: look.interval, d: `M${from.toFixed(2)},${y}H${to.toFixed(2)}` });
  }
  if (value !== null)
    marks.push({ kind: 'path', role: look.point, d: pointPath([[x(value), y]], look.shape, 9) });
  return {
    width,
    height,
    build: 'lines',
    marks,
    legend: [
      { role: look.point, label: 'variance over ceiling, with its 95 % interval' },
      { role: 'bound', label: 'no independent trials beyond this edge' }
    ],
    order: 'across',
    readings: value === null ? [] : [{ x: x(value), y, words: () => ceilingWords(diagnosis) }],
    notes: []
  };

  /** The longest wording of the excess that matters that fits to the right of the ceiling. */
  function matters(room: number): string {
    return wordings.find((words) => 2 * halfOf(words) <= room) ?? wordings[2];
  }

  function halfOf(label: string): number {
    return label.length * text * 0.27;
  }

  /** Over its line, right of `from`, and moved in where it would run off the picture. */
  function caption(label: string, at: number, line: number, from = 0): Mark {
    const half = halfOf(label);
    const middle = Math.min(width - half, Math.max(from + half, at));
    return {
      kind: 'text',
      x: middle,
      y: text * line,
      text: label,
      anchor: 'middle',
      ink: 'faint',
      face: 'text',
      size: text
    };
  }
}
