import { scaleLinear } from 'd3-scale';
import type { SitesReport } from '$lib/stats/sites/sites-types';
import { bottomAxis, leftAxis } from './axis-marks';
import { frameOf } from './frame-of';
import type { Mark, Point, Size } from './picture';
import { roomyTicks } from './roomy-ticks';
import { tickTexts } from './tick-texts';

type Sites = Pick<SitesReport, 'names' | 'geometry'>;

interface Placed {
  first: number;
  second: number;
  distance: number;
}

/** Where pairs of sites stand: across, the middle between the two; up, their distance, neighbours along the foot. */
export function pairLayout(
  map: Sites,
  { width, text }: Size
): { height: number; at: (pair: Placed) => Point; back: Mark[]; front: Mark[] } {
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
  const steps = y.ticks(5).filter((value) => Number.isInteger(value) && value >= 1);
  const texts = tickTexts(steps);
  const up = steps.map((value, i) => ({ at: y(value), text: texts[i] }));
  const across = roomyTicks(x, text, (value) => Number.isInteger(value) && value >= 1 && value <= sites);
  return {
    height,
    at: (pair) => [x(middleOf(pair, sites)), y(pair.distance)],
    back: [...leftAxis(frame, up, 'distance, sites', text), ...edge(map, [x, y])],
    front: bottomAxis(frame, across, 'middle of the two sites', text)
  };
}

/** Along a chain the middle of a distant pair is far from the ends: no pair lies outside these lines. */
function edge(
  { names, geometry }: Sites,
  [x, y]: [(value: number) => number, (value: number) => number]
): Mark[] {
  if (geometry === 'ring') return [];
  const sites = names.length;
  const corners: Point[] = [[1, 0], [(sites + 1) / 2, sites - 1], [sites, 0]]; // prettier-ignore
  const d = corners.map(([at, up], i) => `${i ? 'L' : 'M'}${x(at).toFixed(2)},${y(up).toFixed(2)}`).join('');
  return [{ kind: 'path', role: 'level', d }];
}

/** Between the two sites, from 1; on a ring along the shorter way. */
function middleOf({ first, second, distance }: Placed, sites: number): number {
  const middle = (first + second) / 2 + 1;
  if (second - first === distance) return middle;
  const across = middle + sites / 2;
  return across >= sites + 0.5 ? across - sites : across;
}
