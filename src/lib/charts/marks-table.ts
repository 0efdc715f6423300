import type { DeviceTimeline } from '$lib/model/team/devices/timeline';
import { HINDRANCES, MARKS } from './marks-words';
import type { Table } from './table';

/** Every cell of groups and versions, a line each, those that rose first. */
export const marksTable = ({
  groups,
  versions,
  marks
}: Pick<DeviceTimeline, 'groups' | 'versions' | 'marks'>): Table => ({
  columns: [
    { title: 'group', kind: 'text' },
    { title: 'version', kind: 'text' },
    { title: 'mark', kind: 'text' },
    { title: 'factor over the reference', kind: 'number' },
    { title: 'p of a rise, all cells', kind: 'number' },
    { title: 'what stands in the way', kind: 'text' }
  ],
  rows: marks
    .flatMap((line, i) => line.flatMap((cell, j) => (cell ? [{ cell, i, j }] : [])))
    .sort((a, b) => Number(b.cell.mark === 'risen') - Number(a.cell.mark === 'risen'))
    .map(({ cell, i, j }) => [
      groups[i],
      versions[j].name,
      MARKS[cell.mark],
      cell.factor,
      cell.pAdjusted,
      cell.hindrance ? HINDRANCES[cell.hindrance] : null
    ])
});
