import type { Diagnosis, TestId } from '$lib/stats/types';
import { scaleLog } from 'd3-scale';
import { bottomAxis } from './axis-marks';
import { flagRows, testRows, type ForestRow } from './forest-rows';
import { frameOf } from './frame-of';
import type { LegendEntry, Mark, Picture, Role, Size, TextMark, Tick } from './picture';
import { pointPath, type Shape } from './point-path';
import { powerTick } from './power-tick';

const LOOKS: Record<ForestRow['kind'], { point: Role; interval: Role; shape: Shape; size: number }> = {
  within: { point: 'observed', interval: 'interval', shape: 'dot', size: 7 },
  more: { point: 'observed-more', interval: 'interval-more', shape: 'up', size: 10 },
  fewer: { point: 'observed-fewer', interval: 'interval-fewer', shape: 'down', size: 10 },
  unsure: { point: 'observed-unsure', interval: 'interval-unsure', shape: 'diamond', size: 10 }
};

/** Tests and the flags they raise as lines of one scale: how surprising each is alone, and when all are allowed for. */
export function testsPicture(
  diagnosis: Diagnosis,
  { width, text }: Size,
  names: Record<TestId, string>
): Picture {
  const { alpha } = diagnosis.engine;
  const [tests, flags] = [testRows(diagnosis, names), flagRows(diagnosis, names)];
  const rows = [...tests, ...flags];
  const row = text * 2.1;
  const apart = flags.length ? row : 0;
  const longest = Math.max(0, ...rows.map(({ label }) => label.length));
  const top = text * 2.6;
  const frame = {
    ...frameOf(width, 0, {
      left: Math.min(width * 0.5, longest * text * 0.54 + text),
      // Half of the last label, such as 0.001 or 10 with a raised number.
      right: text * 1.9,
      top,
      bottom: 0
    }),
    bottom: top + Math.max(row * rows.length + apart, 40)
  };
  const least = Math.min(
    alpha,
    ...rows.flatMap(({ at, from, smallest }) => [at, from, smallest].map((v) => v || 1))
  );
  const deepest = Math.max(-300, Math.floor(Math.log10(least) - 0.05));
  const x = scaleLog([1, 10 ** deepest], [frame.left + 4, frame.right]);
  const at = (p: number): number => Math.min(frame.right, x(Math.max(p, 10 ** deepest)));
  const middle = (i: number): number => top + row * (i + 0.5) + (i < tests.length ? 0 : apart);
  const label = (words: string, y: number, ink: TextMark['ink'], x = 0): Mark => {
    const place = { x, y: y + text * 0.35, anchor: 'start' } as const;
    return { kind: 'text', ...place, text: words, ink, face: 'text', size: text };
  };

  const lines = rows.map((_, i) => `M${frame.left},${middle(i).toFixed(2)}H${frame.right}`).join('');
  const marks: Mark[] = [
    { kind: 'path', role: 'grid', d: lines },
    { kind: 'path', role: 'level', d: `M${at(alpha).toFixed(2)},${top - 4}V${frame.bottom}` },
    levelLabel(`level ${alpha}`, at(alpha), frame.right, text),
    ...rows.map((one, i) => label(one.label, middle(i), 'ink')),
    ...(flags.length ? [label('what they point to', middle(tests.length) - row, 'faint')] : []),
    ...rows.flatMap((one, i): Mark[] =>
      one.at === null
        ? [
            ...rowMarks(one, () => frame.left + 8, middle(i)),
            label(one.instead, middle(i), 'faint', frame.left + 20)
          ]
        : rowMarks(one, at, middle(i))
    ),
    ...bottomAxis(
      frame,
      decades(deepest, x, frame.right - frame.left, text),
      'p; more surprising to the right',
      text
    )
  ];
  return {
    width,
    height: frame.bottom + text * 3.6,
    build: 'lines',
    marks,
    legend: legendOf(rows, marks),
    order: 'down',
    readings: rows.map((one, i) => ({
      x: one.at === null ? frame.left + 8 : at(one.at),
      y: middle(i),
      words: one.words
    })),
    notes: []
  };
}

function rowMarks(row: ForestRow, at: (p: number) => number, y: number): Mark[] {
  const look = LOOKS[row.kind];
  const [from, to] = [at(row.from ?? 1), at(row.at ?? 1)];
  const marks: Mark[] = [{ kind: 'path', role: look.point, d: pointPath([[to, y]], look.shape, look.size) }];
  if (row.smallest !== null)
    marks.unshift({ kind: 'path', role: 'smallest', d: `M${at(row.smallest).toFixed(2)},${y - 6}V${y + 6}` });
  if (from !== to)
    marks.unshift({ kind: 'path', role: look.interval, d: `M${from.toFixed(2)},${y}H${to.toFixed(2)}` });
  return marks;
}

/** Entries of what is drawn: a point of these lines has no stroke of its own, and a stroke has a length. */
function legendOf(rows: ForestRow[], marks: Mark[]): LegendEntry[] {
  const labels: [ForestRow['kind'], string][] = [
    ['more', 'speaks against independent trials'],
    ['unsure', 'hinted at: cannot tell yet'],
    ['fewer', 'more regular: a remark'],
    ['within', 'p, all tests allowed for']
  ];
  const drawn = (role: Role) => marks.some((mark) => mark.kind === 'path' && mark.role === role);
  const strokes = Object.values(LOOKS).map(({ interval }) => interval);
  return [
    ...labels
      .filter(([kind]) => rows.some((row) => row.kind === kind))
      .map(([kind, label]): LegendEntry => ({ role: LOOKS[kind].point, label, bare: true })),
    ...(strokes.some(drawn)
      ? [
          {
            role: 'interval' as const,
            label: 'line: from a test’s own p to the p that allows for all; for a flag, over its tests'
          }
        ]
      : []),
    ...(drawn('smallest') ? [{ role: 'smallest' as const, label: 'smallest p it could show' }] : [])
  ];
}

function levelLabel(label: string, at: number, right: number, text: number): Mark {
  const half = label.length * text * 0.27;
  const place = { x: Math.min(right - half, at), y: text * 1.4 } as const;
  return { kind: 'text', ...place, text: label, anchor: 'middle', ink: 'faint', face: 'text', size: text };
}

function decades(deepest: number, x: (p: number) => number, room: number, text: number): Tick[] {
  const step = Math.max(1, Math.ceil((-deepest * text * 4) / room));
  const ticks: Tick[] = [];
  for (let exponent = 0; exponent >= deepest; exponent -= step)
    ticks.push({ at: x(10 ** exponent), ...powerTick(exponent) });
  return ticks;
}
