import type { Sort } from '$lib/model/team/datasets/dataset-query';

/** Columns of the table in their order; `amount` ones are aligned as figures, and begin with the largest when sorted. */
export const COLUMNS: { sort: Sort; label: string; amount?: true }[] = [
  { sort: 'name', label: 'Name' },
  { sort: 'verdict', label: 'Last answer' },
  { sort: 'device', label: 'Device' },
  { sort: 'firmware', label: 'Firmware' },
  { sort: 'group', label: 'Group' },
  { sort: 'quench', label: 'Quench', amount: true },
  { sort: 'geometry', label: 'Counted on' },
  { sort: 'unit', label: 'Unit' },
  { sort: 'trials', label: 'N', amount: true },
  { sort: 'shots', label: 'Shots', amount: true },
  { sort: 'mean', label: 'Mean', amount: true },
  { sort: 'largest', label: 'Largest', amount: true },
  { sort: 'measured', label: 'Measured' },
  { sort: 'created', label: 'Saved' },
  { sort: 'by', label: 'By' },
  { sort: 'reports', label: 'Reports', amount: true }
];
