import type { CumulantsPlace } from './cumulants-place';
import { namedLaws } from './named-laws';
import { regionEdges } from './region-edges';
import type { Table } from './table';

/** The points of the cumulants chart, and its edges in twentieths of the way. */
export function regionTable(place: CumulantsPlace): Table {
  const { fano, third, law } = place;
  return {
    columns: [
      { title: 'point', kind: 'text' },
      { title: 'κ₂/κ₁', kind: 'number' },
      { title: 'low', kind: 'number' },
      { title: 'high', kind: 'number' },
      { title: 'κ₃/κ₁', kind: 'number' },
      { title: 'lower limit', kind: 'number' },
      { title: 'upper limit', kind: 'number' }
    ],
    rows: [
      ['seen, 95 % interval', fano.value, fano.low, fano.high, third.value, third.low, third.high],
      [law.name ?? 'best law', law.fano, null, null, law.third, null, null],
      ...namedLaws(place.share).map(({ name, at }) => [name, at[0], null, null, at[1], null, null]),
      ...regionEdges(place.share, 20).map(([ratio, low, high]) => [
        'region',
        ratio,
        null,
        null,
        null,
        low,
        high
      ])
    ]
  };
}
