import { VERDICTS } from '$lib/model/labels';
import type { SweepReport } from '$lib/stats/sweep/types';
import { sayInWindow } from './say-in-window';
import type { Table } from './table';
import { timeTitle } from './time-title';

/** The answer of each dataset along the time. */
export const answersTable = (report: SweepReport): Table => ({
  columns: [
    { title: 'dataset', kind: 'text' },
    { title: timeTitle(report), kind: 'number' },
    { title: 'shots', kind: 'whole' },
    { title: 'answer', kind: 'text' },
    { title: 'in the window', kind: 'text' }
  ],
  rows: report.points.map(({ label, time, shots, dataset, inWindow, cumulants }) => [
    label,
    time,
    shots,
    dataset?.verdict ? VERDICTS[dataset.verdict] : 'not diagnosed',
    sayInWindow({ inWindow, cumulants })
  ])
});
