import { formatCount, formatNumber } from '$lib/model/format-number';
import type { ChangedPair } from '$lib/stats/sites/compare-maps';
import type { MapsComparedReport } from '$lib/stats/sites/maps-compared';
import { pairLayout } from './pair-layout';
import type { LegendEntry, Mark, Picture, Role, Size } from './picture';
import { pointPath, type Shape } from './point-path';
import { sayDistance } from './site-pair-words';

type Kind = 'risen' | 'fallen' | 'unread' | 'above' | 'below';

const LOOKS: Record<Kind, { role: Role; shape: Shape; size: number; label: string }> = {
  above: {
    role: 'observed',
    shape: 'dot',
    size: 5,
    label: 'higher, but not found: p by itself at most 0.05'
  },
  below: { role: 'law', shape: 'dot', size: 6, label: 'lower, but not found: p by itself at most 0.05' },
  unread: {
    role: 'observed-unsure',
    shape: 'diamond',
    size: 10,
    label: 'changed, but not to be read by itself'
  },
  fallen: { role: 'observed-fewer', shape: 'down', size: 11, label: 'found: lower in the later map' },
  risen: { role: 'observed-more', shape: 'up', size: 11, label: 'found: higher in the later map' }
};

/** Pairs of one kind that are drawn at most. */
const MOST = 400;

/** Pairs that changed between two maps, over the place and distance of their sites. */
export function siteChangePicture(compared: MapsComparedReport, { width, text }: Size): Picture {
  const { alpha, common, pairs } = compared;
  const { height, at, back, front } = pairLayout(compared, { width, text });
  const kindOf = ({ p, pHolm, earlier, later }: ChangedPair): Kind | null => {
    if (earlier === null || later === null || p > 0.05) return null;
    if (pHolm > alpha) return later > earlier ? 'above' : 'below';
    if (common) return 'unread';
    return later > earlier ? 'risen' : 'fallen';
  };
  const kinds = Object.keys(LOOKS) as Kind[];
  const all = pairs.flatMap((pair) => {
    const kind = kindOf(pair);
    return kind ? [{ pair, kind }] : [];
  });
  const drawn = kinds.flatMap((kind) =>
    all
      .filter((one) => one.kind === kind)
      .sort((a, b) => a.pair.p - b.pair.p)
      .slice(0, MOST)
  );
  const of = (kind: Kind): Mark[] => {
    const { role, shape, size } = LOOKS[kind];
    const points = drawn.filter((one) => one.kind === kind).map(({ pair }) => at(pair));
    return points.length > 0 ? [{ kind: 'path', role, d: pointPath(points, shape, size) }] : [];
  };
  const bare = drawn.some(({ kind }) => kind === 'above' || kind === 'below');
  return {
    width,
    height,
    build: 'field',
    marks: [...back, ...kinds.flatMap(of), ...front],
    legend: kinds.flatMap((kind): LegendEntry[] =>
      drawn.some((one) => one.kind === kind)
        ? [{ role: LOOKS[kind].role, label: LOOKS[kind].label, bare: true }]
        : []
    ),
    order: 'all-over',
    readings: drawn
      .map(({ pair }) => ({ x: at(pair)[0], y: at(pair)[1], words: () => wordsOf(compared, pair) }))
      .sort((a, b) => a.x - b.x || b.y - a.y),
    notes: [
      ...(bare
        ? [
            `Dots are no findings: of ${formatCount(pairs.length)} pairs that did not change up to ${formatCount(Math.round(pairs.length / 20))} would have such a p by chance alone.`
          ]
        : []),
      ...(all.length > drawn.length
        ? [`${formatCount(all.length - drawn.length)} pairs are not drawn: see the table.`]
        : [])
    ]
  };
}

function wordsOf({ names, alpha }: MapsComparedReport, pair: ChangedPair): string {
  const { first, second, distance, earlier, later, pHolm } = pair;
  return `Sites ${names[first]} and ${names[second]}, ${sayDistance(distance)}: correlation ${formatNumber(earlier, 2)} before, ${formatNumber(later, 2)} after; ${pHolm <= alpha ? 'found' : 'not found'} among all pairs, p = ${formatNumber(pHolm, 2)}.`;
}
