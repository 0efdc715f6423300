import { formatCount } from '$lib/model/format-number';
import type { MappedPair, SitesReport } from '$lib/stats/sites/sites-types';
import { scaleLinear } from 'd3-scale';
import { bottomAxis, leftAxis } from './axis-marks';
import { frameOf } from './frame-of';
import type { LegendEntry, Mark, Picture, Point, Role, Size } from './picture';
import { pointPath, type Shape } from './point-path';
import { roomyTicks } from './roomy-ticks';
import { siteMapKinds, type DrawnPairs, type PairKind } from './site-map-kinds';
import { sitePairWords } from './site-pair-words';
import { tickTexts } from './tick-texts';

const LOOKS: Record<PairKind, { role: Role; shape: Shape; label: string }> = {
  above: { role: 'observed', shape: 'dot', label: 'not found; its own 95 % interval is above 0' },
  below: { role: 'law', shape: 'dot', label: 'not found; its own 95 % interval is below 0' },
  unread: {
    role: 'observed-unsure',
    shape: 'diamond',
    label: 'correlated, but not to be read by itself: all sites move together'
  },
  fallen: { role: 'observed-fewer', shape: 'down', label: 'found: excited together less often' },
  risen: { role: 'observed-more', shape: 'up', label: 'found: excited together more often' }
};

/**
 * The pairs of a map over their place: across, the middle between the two sites; up, their distance. Neighbours lie along
 * the foot. Only pairs that say something by themselves are drawn, larger ones with the stronger correlation.
 */
export function siteMapPicture(map: SitesReport, { width, text }: Size): Picture {
  const height = Math.min(460, Math.max(280, width * 0.58));
  const frame = frameOf(width, height, {
    left: text * 3.2,
    right: text * 1.8,
    top: text * 2.2,
    bottom: text * 3.8
  });
  const sites = map.names.length;
  const furthest = map.geometry === 'ring' ? Math.floor(sites / 2) : sites - 1;
  const x = scaleLinear([0.5, sites + 0.5], [frame.left, frame.right]);
  const y = scaleLinear([0, furthest + 1], [frame.bottom, frame.top]);
  const drawn = siteMapKinds(map);
  const strongest = Math.max(...drawn.kinds.map(({ pair }) => Math.abs(pair.correlation ?? 0)), 1e-9);
  const at = (pair: MappedPair): Point => [x(middleOf(pair, sites)), y(pair.distance)];
  const size = ({ correlation }: MappedPair) => 3 + 4 * Math.sqrt(Math.abs(correlation ?? 0) / strongest);
  const of = (kind: PairKind): Mark[] => {
    const { role, shape } = LOOKS[kind];
    const more = kind === 'above' || kind === 'below' ? 0 : 5;
    const d = drawn.kinds
      .filter((one) => one.kind === kind)
      .map(({ pair }) => pointPath([at(pair)], shape, size(pair) + more))
      .join('');
    return d ? [{ kind: 'path', role, d }] : [];
  };
  const kinds = Object.keys(LOOKS) as PairKind[];
  const points = kinds.flatMap(of);
  const steps = y.ticks(5).filter((value) => Number.isInteger(value) && value >= 1);
  const texts = tickTexts(steps);
  return {
    width,
    height,
    build: 'field',
    marks: [
      ...leftAxis(
        frame,
        steps.map((value, i) => ({ at: y(value), text: texts[i] })),
        'distance, sites',
        text
      ),
      ...edge(map, [x, y]),
      ...points,
      ...bottomAxis(
        frame,
        roomyTicks(x, text, (value) => Number.isInteger(value) && value >= 1 && value <= sites),
        'middle of the two sites',
        text
      )
    ],
    legend: kinds.flatMap((kind): LegendEntry[] =>
      drawn.kinds.some((one) => one.kind === kind)
        ? [{ role: LOOKS[kind].role, label: LOOKS[kind].label, bare: true }]
        : []
    ),
    order: 'all-over',
    readings: drawn.kinds
      .map(({ pair }) => ({ x: at(pair)[0], y: at(pair)[1], words: () => sitePairWords(map, pair) }))
      .sort((a, b) => a.x - b.x || b.y - a.y),
    notes: notesOf(map, drawn)
  };
}

/** Along a chain the middle of a distant pair is far from the ends: no pair lies outside these lines. */
function edge(
  { names, geometry }: SitesReport,
  [x, y]: [(value: number) => number, (value: number) => number]
): Mark[] {
  if (geometry === 'ring') return [];
  const sites = names.length;
  const corners: Point[] = [[1, 0], [(sites + 1) / 2, sites - 1], [sites, 0]]; // prettier-ignore
  const d = corners.map(([at, up], i) => `${i ? 'L' : 'M'}${x(at).toFixed(2)},${y(up).toFixed(2)}`).join('');
  return [{ kind: 'path', role: 'level', d }];
}

/** Between the two sites, from 1; on a ring along the shorter way. */
function middleOf({ first, second, distance }: MappedPair, sites: number): number {
  const middle = (first + second) / 2 + 1;
  if (second - first === distance) return middle;
  const across = middle + sites / 2;
  return across >= sites + 0.5 ? across - sites : across;
}

function notesOf({ pairs }: SitesReport, { kinds, left, unknown }: DrawnPairs): string[] {
  const notes: string[] = [];
  const bare = kinds.filter(({ kind }) => kind === 'above' || kind === 'below').length;
  const shown = formatCount(pairs.length - unknown);
  if (bare > 0)
    notes.push(
      `Dots are no findings: of ${shown} uncorrelated pairs about ${formatCount(Math.round((pairs.length - unknown) / 20))} would have such an interval by chance alone.`
    );
  if (left > 0) notes.push(`${formatCount(left)} weaker pairs are not drawn: see the table.`);
  if (unknown > 0)
    notes.push(`${formatCount(unknown)} pairs have a site that never changes, and no correlation.`);
  return notes;
}
