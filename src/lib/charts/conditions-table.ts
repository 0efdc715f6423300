import type { Condition } from '$lib/stats/cumulants-only/condition';
import type { Table } from './table';

const NAMES = ['mean', 'variance', 'third cumulant', 'fourth cumulant'];

/** The inequalities of independent trials, and where printed cumulants stand to them. */
export const conditionsTable = (conditions: Condition[]): Table => ({
  columns: [
    { title: 'inequality', kind: 'text' },
    { title: 'bound', kind: 'number' },
    { title: 'printed', kind: 'number' },
    { title: 'inside by, in errors', kind: 'number' },
    { title: 'standing', kind: 'text' }
  ],
  rows: conditions.map(({ order, side, limit, value, slack, error, standing }) => [
    `${NAMES[order - 1]} ${side === 'floor' ? 'at least' : 'at most'}`,
    standing === 'moot' ? null : limit,
    value,
    standing === 'moot' ? null : slack / error,
    standing === 'moot' ? 'nothing to compare' : standing === 'broken' ? 'broken' : 'kept'
  ])
});
