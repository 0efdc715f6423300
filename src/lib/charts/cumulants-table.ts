import type { Diagnosis, Interval } from '$lib/stats/types';
import type { Table } from './table';

const row = (name: string, { value, low, high }: Interval) => [name, value, low, high];

/** The cumulants with their intervals. */
export const cumulantsTable = ({ moments }: Diagnosis): Table => ({
  columns: [
    { title: 'cumulant', kind: 'text' },
    { title: 'value', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' }
  ],
  rows: [
    row('κ₁, mean', moments.mean),
    row('κ₂, variance', moments.variance),
    row('κ₃', moments.third),
    row('κ₄', moments.fourth),
    row('κ₂/κ₁, Fano factor', moments.fano)
  ]
});
