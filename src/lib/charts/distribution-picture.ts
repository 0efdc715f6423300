import type { Diagnosis, DistributionPoint } from '$lib/stats/types';
import { scaleLinear } from 'd3-scale';
import { bottomAxis, leftAxis } from './axis-marks';
import { columnOf } from './column-of';
import { countTicks } from './count-ticks';
import { distributionWords } from './distribution-words';
import { frameOf } from './frame-of';
import { groupCounts } from './group-counts';
import { isShown } from './is-shown';
import { linePath } from './line-path';
import { lumpMarks, lumpMiddle, lumpSpan } from './lump-marks';
import { observedMarks } from './observed-marks';
import type { Mark, Picture, Point, Size } from './picture';
import { residualMarks } from './residual-marks';
import { shownSpan } from './shown-span';
import { standing } from './standing';
import { thinnedMarks, thinnedNote } from './thinned-marks';
import { tickTexts } from './tick-texts';

/** Room of one mark, picture units. */
const LEAST = 5;

/** Counts against the best independent-trial law, and below them how far each lies from it. */
export function distributionPicture(diagnosis: Diagnosis, { width, text }: Size): Picture {
  const { shots } = diagnosis.data;
  const [from, to] = shownSpan(diagnosis.distribution, (point) => isShown(point, shots));
  const points = diagnosis.distribution.filter((point) => point.count >= from && point.count <= to);
  const lumps = points.filter(({ lump }) => lump);
  const opening = lumps.find(({ below }) => below);
  const closing = lumps.find(({ below }) => !below);
  const singles = points.filter(({ lump }) => !lump);
  const highest = Math.max(
    ...points.map((point) => Math.max(point.fitted, point.shots > 0 ? point.high : 0))
  );

  const mainHeight = Math.min(380, Math.max(210, width * 0.46));
  const residualHeight = 104;
  const left = text * 4.4;
  const main = frameOf(width, mainHeight, { left, right: text * 1.8, top: text * 2.2, bottom: 0 });
  const below = { ...main, top: main.bottom + text * 3.4, bottom: main.bottom + text * 3.4 + residualHeight };
  const height = below.bottom + text * 3.8;
  const x = scaleLinear(
    [(opening ? lumpSpan(opening)[0] : from) - 0.6, (closing ? lumpSpan(closing)[1] : to) + 0.6],
    [main.left, main.right]
  );
  const y = scaleLinear([0, highest * 1.04 || 1], [main.bottom, main.top]);
  const place = (point: DistributionPoint) => x(point.lump ? lumpMiddle(point) : point.count);

  const groups = groupCounts(singles, x(1) - x(0), LEAST);
  const together = groups[0]?.length ?? 1;
  const shares = y.ticks(5);
  const texts = tickTexts(shares, 100, '\u2009%');
  const marks: Mark[] = [
    ...leftAxis(
      main,
      shares.map((value, i) => ({ at: y(value), text: texts[i] })),
      'share of shots',
      text
    ),
    { kind: 'path', role: 'axis', d: `M${main.left},${main.bottom}H${main.right}` },
    ...drawnCounts(groups, x, y),
    ...lumpMarks(lumps, x, y),
    {
      kind: 'path',
      role: 'fitted',
      d: linePath(
        singles.map((p): Point => [x(p.count), y(p.fitted)]),
        main
      )
    },
    ...residualMarks(groups, lumps, place, below, text),
    ...bottomAxis(below, countTicks(x, text, lumps), countTitle(diagnosis), text)
  ];
  return {
    width,
    height,
    build: 'field-and-strip',
    marks,
    legend: [
      { role: 'observed', label: 'seen, with its 95 % interval' },
      ...(lumps.length > 0
        ? [{ role: 'range' as const, label: 'a row that lumps counts: bar, interval and law of all of them' }]
        : []),
      { role: 'fitted', label: 'best independent-trial law' },
      ...legendOfStanding(points)
    ],
    order: 'across',
    readings: points.map((p) => ({
      x: place(p),
      y: y(p.observed),
      words: () => distributionWords(p, shots)
    })),
    notes: together > 1 ? [thinnedNote(together)] : []
  };
}

const countTitle = ({ data }: Diagnosis): string =>
  data.unit === 'pair' ? 'pairs of defects in one shot' : 'defects in one shot';

function legendOfStanding(points: DistributionPoint[]): Picture['legend'] {
  const has = (kind: 'more' | 'fewer') => points.some((point) => standing(point) === kind);
  return [
    ...(has('more') ? [{ role: 'observed-more' as const, label: 'seen more often than the law says' }] : []),
    ...(has('fewer') ? [{ role: 'observed-fewer' as const, label: 'seen less often' }] : [])
  ];
}

type Place = (value: number) => number;

function drawnCounts(groups: DistributionPoint[][], x: Place, y: Place): Mark[] {
  if (groups.length === 0) return [];
  if (groups[0].length === 1) {
    const seen = groups.flat().map((point) => ({
      at: [x(point.count), y(point.observed)] as Point,
      interval: { x: x(point.count), from: y(point.low), to: y(point.high) },
      standing: standing(point)
    }));
    return observedMarks(seen, 6);
  }
  return thinnedMarks(
    groups.map((group) =>
      columnOf(
        x((group[0].count + group[group.length - 1].count) / 2),
        group.map((point) => ({
          low: y(point.low),
          high: y(point.high),
          value: y(point.observed),
          standing: standing(point)
        }))
      )
    )
  );
}
