import { formatNumber } from '$lib/model/format-number';
import { EXPLANATIONS } from '$lib/model/labels';
import { sayFit } from '$lib/model/report/say-fit';
import { sayOwnNumber } from '$lib/model/report/say-own-number';
import { sayWeight } from '$lib/model/report/say-weight';
import type { Explanation, Explanations } from '$lib/stats/explanations/types';
import { scaleSymlog } from 'd3-scale';
import { bottomAxis } from './axis-marks';
import { frameOf } from './frame-of';
import type { Mark, Picture, Size, Tick } from './picture';
import { pointPath } from './point-path';

/** Explanations as lines of a scale: how far each lies behind the best, and the band within which none can be told from it. */
export function explanationsPicture(
  explanations: Explanations,
  { width, text }: Size,
  alpha: number
): Picture {
  const { ranked, tieWithin } = explanations;
  const row = text * 2.1;
  const longest = Math.max(0, ...ranked.map(({ id }) => EXPLANATIONS[id].length));
  const frame = frameOf(width, text * 1.4 + row * ranked.length + text * 3.6, {
    left: Math.min(width * 0.5, longest * text * 0.52 + text),
    right: text * 2.6,
    top: text * 1.4,
    bottom: text * 3.6
  });
  const furthest = Math.max(10, ...ranked.map(({ behind }) => behind));
  const x = scaleSymlog([0, furthest], [frame.left + 8, frame.right]).constant(1);
  const middle = (i: number): number => frame.top + row * (i + 0.5);
  const tie = x(tieWithin);
  const marks: Mark[] = [
    {
      kind: 'path',
      role: 'grid',
      d: ranked.map((_, i) => `M${frame.left},${middle(i)}H${frame.right}`).join('')
    },
    { kind: 'path', role: 'limit', d: `M${tie.toFixed(2)},${frame.top}V${frame.bottom}` },
    ...ranked.map(({ id }, i): Mark => ({
      kind: 'text',
      x: 0,
      y: middle(i) + text * 0.35,
      text: EXPLANATIONS[id],
      anchor: 'start',
      ink: 'ink',
      face: 'text',
      size: text
    })),
    ...ranked.map(({ behind }, i): Mark => {
      const near = behind < tieWithin;
      return {
        kind: 'path',
        role: near ? 'observed-unsure' : 'observed',
        d: pointPath([[x(behind), middle(i)]], near ? 'diamond' : 'dot', near ? 10 : 7)
      };
    }),
    ...bottomAxis(frame, ticksOf(furthest, x, text), 'AIC behind the best', text)
  ];
  return {
    width,
    height: frame.bottom + text * 3.6,
    marks,
    legend: [
      { role: 'observed-unsure', label: 'cannot be told from the best' },
      { role: 'observed', label: 'described worse' },
      { role: 'limit', label: `AIC ${tieWithin} behind` }
    ],
    order: 'down',
    build: 'lines',
    readings: ranked.map((one, i) => ({ x: x(one.behind), y: middle(i), words: () => wordsOf(one, alpha) })),
    notes: []
  };
}

function ticksOf(furthest: number, x: (value: number) => number, text: number): Tick[] {
  const ticks: Tick[] = [];
  for (const value of [0, 2, 10, 100, 1000, 1e4, 1e5, 1e6, 1e7]) {
    if (value > furthest) break;
    const label = formatNumber(value, 1);
    const before = ticks.at(-1);
    const room = before === undefined ? Infinity : x(value) - before.at;
    if (room > text * (1 + 0.3 * (label.length + (before?.text.length ?? 0))))
      ticks.push({ at: x(value), text: label });
  }
  return ticks;
}

const wordsOf = (one: Explanation, alpha: number): string => {
  const own = sayOwnNumber(one);
  const fit = sayFit(one, alpha);
  const place =
    one.behind === 0 ? 'the best of the list' : `AIC ${formatNumber(one.behind, 3)} behind the best`;
  return `${EXPLANATIONS[one.id]}: ${place}, weight ${sayWeight(one.weight)}${fit === '' ? '' : `; ${fit}`}${own === '' ? '' : `; ${own}`}.`;
};
