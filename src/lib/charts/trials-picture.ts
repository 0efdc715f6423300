import { formatCount, formatNumber } from '$lib/model/format-number';
import type { TrialsPart, TrialsPoint } from '$lib/stats/sensitivity/types';
import { scaleLinear, scaleLog } from 'd3-scale';
import { bottomAxis, leftAxis } from './axis-marks';
import { frameOf } from './frame-of';
import { hatchEdge } from './hatch-edge';
import { intervalPath } from './interval-path';
import { linePath } from './line-path';
import type { Mark, Picture, Point, Role, Size, Tick } from './picture';
import { pointPath, type Shape } from './point-path';
import { scaledTexts } from './scaled-texts';

const LOOK: Record<TrialsPoint['standing'], { point: Role; interval: Role; shape: Shape; label: string }> = {
  over: {
    point: 'observed-more',
    interval: 'interval-more',
    shape: 'up',
    label: 'over the ceiling of that N'
  },
  within: {
    point: 'observed',
    interval: 'interval',
    shape: 'dot',
    label: 'no excess that matters at that N'
  },
  unsure: {
    point: 'observed-unsure',
    interval: 'interval-unsure',
    shape: 'diamond',
    label: 'the variance alone cannot tell at that N'
  }
};

/** Variance over its ceiling as N runs from the largest count to unknown, with the critical N. */
export function trialsPicture({ points, critical }: TrialsPart, { width, text }: Size): Picture {
  const height = Math.min(360, Math.max(240, width * 0.42));
  const frame = frameOf(width, height, {
    left: text * 4.4,
    right: text * 2.4,
    top: text * 2.2,
    bottom: text * 3.8
  });
  const known = points.flatMap(({ trials }) => (trials === null ? [] : [trials]));
  const [first, last] = [known[0] ?? 1, known.at(-1) ?? 10];
  const end = frame.right - text * 3.4;
  const x = scaleLog([first, Math.max(last, first * 2)], [frame.left + 6, Math.max(frame.left + 20, end)]);
  const at = ({ trials }: TrialsPoint): number => (trials === null ? frame.right : x(trials));
  const values = points.map(({ dispersion }) => dispersion.value ?? 1);
  const top = Math.min(
    Math.max(1.2, ...points.map(({ dispersion }) => dispersion.high ?? 1)),
    2 * Math.max(...values, 1)
  );
  const y = scaleLinear([0, top * 1.05], [frame.bottom, frame.top]);
  const inside = (value: number): number => Math.max(frame.top, Math.min(frame.bottom, y(value)));
  const standings = (['over', 'within', 'unsure'] as const).filter((one) =>
    points.some(({ standing }) => standing === one)
  );
  const ticks = y.ticks(5);
  const { texts, exponent } = scaledTexts(ticks);
  const ceiling: Point[] = [
    [frame.left, y(1)],
    [frame.right, y(1)]
  ];
  const marked = critical !== null && critical >= first && critical <= last;
  const marks: Mark[] = [
    ...leftAxis(
      frame,
      ticks.map((value, i) => ({ at: y(value), text: texts[i] })),
      'variance over ceiling',
      text,
      exponent
    ),
    { kind: 'path', role: 'hatch', d: hatchEdge(ceiling, 'above', frame) },
    { kind: 'path', role: 'bound', d: linePath(ceiling, frame) },
    {
      kind: 'path',
      role: 'fitted',
      d: linePath(
        points.map((point): Point | null =>
          point.trials === null ? null : [at(point), y(point.dispersion.value!)]
        ),
        frame
      )
    },
    ...(marked
      ? [
          {
            kind: 'path' as const,
            role: 'horizon' as const,
            d: `M${x(critical).toFixed(2)},${frame.bottom}V${frame.top}`
          }
        ]
      : []),
    ...standings.flatMap((standing): Mark[] => {
      const these = points.filter((point) => point.standing === standing);
      const look = LOOK[standing];
      const strokes = these.flatMap((point) =>
        point.dispersion.low === null || point.dispersion.high === null
          ? []
          : [{ x: at(point), from: inside(point.dispersion.low), to: inside(point.dispersion.high) }]
      );
      return [
        ...(strokes.length > 0
          ? [{ kind: 'path' as const, role: look.interval, d: intervalPath(strokes) }]
          : []),
        {
          kind: 'path',
          role: look.point,
          d: pointPath(
            these.map((point): Point => [at(point), inside(point.dispersion.value!)]),
            look.shape,
            look.shape === 'dot' ? 6 : 9
          )
        }
      ];
    }),
    ...bottomAxis(frame, ticksOf(first, last, x, frame.right, text), 'number of trials, N', text)
  ];
  return {
    width,
    height,
    build: 'low-field',
    marks,
    legend: [
      ...standings.map((standing) => ({ role: LOOK[standing].point, label: LOOK[standing].label })),
      { role: 'bound', label: 'no independent trials beyond this edge' },
      ...(marked ? [{ role: 'horizon' as const, label: 'critical N: ceiling and variance are equal' }] : [])
    ],
    order: 'across',
    readings: points.map((point) => ({
      x: at(point),
      y: inside(point.dispersion.value!),
      words: () => wordsOf(point)
    })),
    notes: []
  };
}

/** Ends and powers of ten that have room, and "unknown" at the right. */
function ticksOf(first: number, last: number, x: (n: number) => number, right: number, text: number): Tick[] {
  const room = (label: string) => label.length * 0.32 * text;
  const ticks: (Tick & { half: number })[] = [{ at: right, text: '?', half: room('?') }];
  const add = (n: number) => {
    const label = formatNumber(n, 1).replace(/\.0+$/, '');
    const one = { at: x(n), text: n < 1e6 ? formatCount(n) : label };
    const half = room(one.text);
    if (ticks.every((other) => Math.abs(other.at - one.at) > half + other.half + 0.5 * text))
      ticks.push({ ...one, half });
  };
  add(first);
  add(last);
  for (let power = 10; power < last; power *= 10) if (power > first) add(power);
  return ticks.map(({ at, text: label }) => ({ at, text: label })).sort((a, b) => a.at - b.at);
}

const wordsOf = ({ trials, dispersion, standing }: TrialsPoint): string =>
  `N ${trials === null ? 'unknown' : formatCount(trials)}: variance ${formatNumber(dispersion.value)} times the ceiling (95\u202f%: ${formatNumber(dispersion.low)} to ${formatNumber(dispersion.high)}), ${LOOK[standing].label.replace(' at that N', '').replace(' of that N', '')}.`;
