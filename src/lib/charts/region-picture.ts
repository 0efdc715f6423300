import { capital } from '$lib/model/capital';
import { scaleLinear } from 'd3-scale';
import { bottomAxis, leftAxis } from './axis-marks';
import { crossPath } from './cross-path';
import type { CumulantsPlace } from './cumulants-place';
import { frameOf } from './frame-of';
import { hatchEdge } from './hatch-edge';
import { linePath } from './line-path';
import { namedLabels } from './named-labels';
import { namedLaws } from './named-laws';
import type { Frame, Mark, Picture, Point, Role, Size } from './picture';
import { pointPath, type Shape } from './point-path';
import { regionEdges } from './region-edges';
import { regionSpan } from './region-span';
import { lawWords, regionWords } from './region-words';
import { roomyTicks } from './roomy-ticks';
import { scaledTexts } from './scaled-texts';

const LOOK: Record<CumulantsPlace['standing'], { point: Role; interval: Role; shape: Shape }> = {
  inside: { point: 'observed', interval: 'interval', shape: 'dot' },
  near: { point: 'observed-unsure', interval: 'interval-unsure', shape: 'diamond' },
  outside: { point: 'observed-more', interval: 'interval-more', shape: 'up' },
  more: { point: 'observed-more', interval: 'interval-more', shape: 'up' }
};

/** The plane κ2/κ1, κ3/κ1: the region that independent trials can reach, and where the counts and the best law lie. */
export function regionPicture(place: CumulantsPlace, { width, text }: Size): Picture {
  const height = Math.min(460, Math.max(280, width * 0.58));
  const frame = frameOf(width, height, {
    left: text * 4.4,
    right: text * 1.8,
    top: text * 2.2,
    bottom: text * 3.8
  });
  const span = regionSpan(place);
  const x = scaleLinear(span.x, [frame.left, frame.right]);
  const y = scaleLinear(span.y, [frame.bottom, frame.top]);
  const edges = regionEdges(place.share, 60);
  const upper = edges.map(([fano, , high]): Point => [x(fano), y(high)]);
  const lower = edges.map(([fano, low]): Point => [x(fano), y(low)]);
  const ys = y.ticks(6);
  const { texts, exponent } = scaledTexts(ys);
  const named = namedLaws(place.share);
  // Outside a region that the answer does not go by is no evidence, and has no colour.
  const { point, interval, shape } = LOOK[place.beyond ? 'inside' : place.standing];
  const seen: Point = [x(place.fano.value), y(place.third.value)];
  const law: Point = [x(place.law.fano), y(place.law.third)];
  const marks: Mark[] = [
    ...leftAxis(
      frame,
      ys.map((v, i) => ({ at: y(v), text: texts[i] })),
      'κ₃/κ₁, third cumulant',
      text,
      exponent
    ),
    { kind: 'path', role: 'hatch', d: hatchEdge(upper, 'above', frame) + hatchEdge(lower, 'below', frame) },
    { kind: 'path', role: 'bound', d: linePath(upper, frame) + linePath(lower, frame) },
    { kind: 'path', role: 'corner', d: named.map(({ at }) => crossPath(x(at[0]), y(at[1]))).join('') },
    { kind: 'path', role: interval, d: crossOf(place, x, y, frame) },
    { kind: 'path', role: point, d: pointPath([seen], shape, shape === 'dot' ? 7 : 10) },
    { kind: 'path', role: 'law', d: pointPath([law], 'dot', 9) },
    ...namedLabels(named, x, y, frame, text, [seen, law]),
    ...bottomAxis(frame, roomyTicks(x, text), 'κ₂/κ₁, variance over the mean', text)
  ];
  return {
    width,
    height,
    build: 'field',
    marks,
    legend: [
      { role: point, label: 'seen, with its 95 % intervals' },
      { role: 'law', label: place.law.name ?? 'best law' },
      {
        role: 'bound',
        label: `no independent trials of this mean beyond this edge${place.beyond ? `, not allowing for ${place.beyond.what}` : ''}`
      },
      { role: 'corner', label: 'laws to compare with' }
    ],
    order: 'across',
    readings: [
      { x: seen[0], y: seen[1], words: () => regionWords(place) },
      {
        x: law[0],
        y: law[1],
        words: () => lawWords(capital(place.law.name ?? 'best law'), place.law.fano, place.law.third)
      },
      ...named.map(({ name, at }) => ({
        x: x(at[0]),
        y: y(at[1]),
        words: () => lawWords(name === 'Poisson' ? 'A Poisson law' : 'Equal trials of this mean', ...at)
      }))
    ].sort((a, b) => a.x - b.x),
    notes: place.beyond ? [place.beyond.why] : []
  };
}

type Place = (value: number) => number;

/** Both intervals as strokes through the point; an open end runs to the frame and carries an arrow head. */
function crossOf({ fano, third }: CumulantsPlace, x: Place, y: Place, frame: Frame): string {
  const held = (value: number, low: number, high: number) => Math.max(low, Math.min(high, value));
  const [atX, atY] = [x(fano.value), y(third.value)].map((value) => value.toFixed(2));
  const across = [fano.low, fano.high].map((value, i) =>
    value === null ? (i ? frame.right : frame.left) : held(x(value), frame.left, frame.right)
  );
  const up = [third.low, third.high].map((value, i) =>
    value === null ? (i ? frame.top : frame.bottom) : held(y(value), frame.top, frame.bottom)
  );
  const heads =
    (third.high === null ? head(x(fano.value), frame.top, 5) : '') +
    (third.low === null ? head(x(fano.value), frame.bottom, -5) : '');
  return (
    `M${across[0].toFixed(2)},${atY}H${across[1].toFixed(2)}` +
    `M${atX},${up[0].toFixed(2)}V${up[1].toFixed(2)}${heads}`
  );
}

const head = (x: number, y: number, back: number): string =>
  `M${(x - 3).toFixed(2)},${y + back}L${x.toFixed(2)},${y}L${(x + 3).toFixed(2)},${y + back}`;
