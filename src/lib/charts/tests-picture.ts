import type { Diagnosis, TestId, TestResult } from '$lib/stats/types';
import { scaleLog } from 'd3-scale';
import { bottomAxis } from './axis-marks';
import { formatNumber } from '$lib/model/format-number';
import { frameOf } from './frame-of';
import { sayHowOften } from '$lib/model/say-p';
import type { Mark, Picture, Size, Tick } from './picture';
import { pointPath } from './point-path';
import { powerTick } from './power-tick';

/** Tests as lines of a scale: how surprising each is by itself, and when all are allowed for. */
export function testsPicture(
  diagnosis: Diagnosis,
  { width, text }: Size,
  names: Record<TestId, string>
): Picture {
  const { tests, engine } = diagnosis;
  const row = text * 2.1;
  const longest = Math.max(0, ...tests.map(({ id }) => names[id].length));
  const frame = frameOf(width, text * 2.6 + row * tests.length + text * 3.6, {
    left: Math.min(width * 0.45, longest * text * 0.54 + text),
    // Half of the last label, such as 0.001 or 10 with a raised number.
    right: text * 1.9,
    top: text * 2.6,
    bottom: text * 3.6
  });
  const least = Math.min(
    engine.alpha,
    ...tests.flatMap(({ p, smallestP }) => [p, smallestP].filter((v) => v > 0))
  );
  const deepest = Math.max(-300, Math.floor(Math.log10(least) - 0.05));
  const x = scaleLog([1, 10 ** deepest], [frame.left + 4, frame.right]);
  const at = (p: number): number => Math.min(frame.right, x(Math.max(p, 10 ** deepest)));
  const middle = (i: number): number => frame.top + row * (i + 0.5);

  const marks: Mark[] = [
    {
      kind: 'path',
      role: 'grid',
      d: tests.map((_, i) => `M${frame.left},${middle(i)}H${frame.right}`).join('')
    },
    { kind: 'path', role: 'level', d: `M${at(engine.alpha).toFixed(2)},${frame.top - 4}V${frame.bottom}` },
    levelLabel(`level ${engine.alpha}`, at(engine.alpha), frame.right, text),
    ...tests.map(({ id }, i): Mark => ({
      kind: 'text',
      x: 0,
      y: middle(i) + text * 0.35,
      text: names[id],
      anchor: 'start',
      ink: 'ink',
      face: 'text',
      size: text
    })),
    ...tests.flatMap((test, i) => testMarks(test, engine.alpha, at, middle(i))),
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
    marks,
    legend: [
      { role: 'observed', label: 'p, all tests allowed for' },
      { role: 'interval', label: 'from p of the test by itself' },
      { role: 'smallest', label: 'smallest p it could show' }
    ],
    order: 'down',
    readings: tests.map((test, i) => ({ x: at(test.pAdjusted), y: middle(i), words: wordsOf(test, names) })),
    notes: []
  };
}

function testMarks(test: TestResult, alpha: number, at: (p: number) => number, y: number): Mark[] {
  const shown = test.pAdjusted <= alpha;
  const [from, to, limit] = [at(test.p), at(test.pAdjusted), at(test.smallestP)].map((v) => v.toFixed(2));
  return [
    { kind: 'path', role: shown ? 'interval-more' : 'interval', d: `M${from},${y}H${to}` },
    { kind: 'path', role: 'smallest', d: `M${limit},${y - 6}V${y + 6}` },
    {
      kind: 'path',
      role: shown ? 'observed-more' : 'observed',
      d: pointPath([[at(test.pAdjusted), y]], shown ? 'up' : 'dot', shown ? 10 : 7)
    }
  ];
}

function levelLabel(label: string, at: number, right: number, text: number): Mark {
  const half = label.length * text * 0.27;
  const x = Math.min(right - half, at);
  return {
    kind: 'text',
    x,
    y: text * 1.4,
    text: label,
    anchor: 'middle',
    ink: 'faint',
    face: 'text',
    size: text
  };
}

function decades(deepest: number, x: (p: number) => number, room: number, text: number): Tick[] {
  const step = Math.max(1, Math.ceil((-deepest * text * 4) / room));
  const ticks: Tick[] = [];
  for (let exponent = 0; exponent >= deepest; exponent -= step)
    ticks.push({ at: x(10 ** exponent), ...powerTick(exponent) });
  return ticks;
}

const wordsOf = (test: TestResult, names: Record<TestId, string>): string =>
  `${names[test.id]}: by itself such a result ${sayHowOften(test.p, test.smallestP)} if defects formed independently ` +
  `(p = ${formatNumber(test.p, 2)}); with all tests allowed for, p = ${formatNumber(test.pAdjusted, 2)}.`;
