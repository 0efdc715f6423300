import { formatCount } from '$lib/model/format-number';
import type { MappedPair, SitesReport } from '$lib/stats/sites/sites-types';
import { pairLayout } from './pair-layout';
import type { LegendEntry, Mark, Picture, Role, Size } from './picture';
import { pointPath, type Shape } from './point-path';
import { siteMapKinds, type DrawnPairs, type PairKind } from './site-map-kinds';
import { sitePairWords } from './site-pair-words';

const LOOKS: Record<PairKind, { role: Role; shape: Shape; label: string }> = {
  above: { role: 'observed', shape: 'dot', label: 'not found; its own 95 % interval is above 0' },
  below: { role: 'law', shape: 'dot', label: 'not found; its own 95 % interval is below 0' },
  unread: {
    role: 'observed-unsure',
    shape: 'diamond',
    label: 'correlated, but not to be read by itself: all sites move together, or apart'
  },
  fallen: { role: 'observed-fewer', shape: 'down', label: 'found: excited together less often' },
  risen: { role: 'observed-more', shape: 'up', label: 'found: excited together more often' }
};

/**
 * The pairs of a map over their place: across, the middle between the two sites; up, their distance. Neighbours lie along
 * the foot. Only pairs that say something by themselves are drawn, larger ones with the stronger correlation.
 */
export function siteMapPicture(map: SitesReport, { width, text }: Size): Picture {
  const { height, at, back, front } = pairLayout(map, { width, text });
  const drawn = siteMapKinds(map);
  const strongest = Math.max(...drawn.kinds.map(({ pair }) => Math.abs(pair.correlation ?? 0)), 1e-9);
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
  return {
    width,
    height,
    build: 'field',
    marks: [...back, ...kinds.flatMap(of), ...front],
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
