import { KNOWN_LAWS, RATIO_NAMES } from '$lib/model/team/sweeps/ratio-names';
import type { SweepReport } from '$lib/stats/sweep/types';
import type { Table } from './table';

/** Each ratio over the window, and a line for each known law beside it. */
export const steadyTable = ({ steady }: Pick<SweepReport, 'steady'>): Table => ({
  columns: [
    { title: 'ratio', kind: 'text' },
    { title: 'value', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' },
    { title: 'p of one value', kind: 'number' },
    { title: 'law', kind: 'text' },
    { title: 'value of the law', kind: 'number' },
    { title: 'error of the law', kind: 'number' },
    { title: 'standing', kind: 'text' }
  ],
  rows: steady.flatMap(({ id, steady: { value, low, high }, p, references }) => {
    const own = [RATIO_NAMES[id], value, low, high, p];
    if (references.length === 0) return [[...own, null, null, null, null]];
    return references.map((law) => [
      ...own,
      KNOWN_LAWS[law.id] ?? law.id,
      law.value,
      law.error > 0 ? law.error : null,
      law.inside ? 'inside' : 'outside'
    ]);
  })
});
