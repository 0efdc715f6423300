import { VERDICTS } from '$lib/model/labels';
import type { SweepReport } from '$lib/stats/sweep/types';
import { sayInWindow } from './say-in-window';
import type { Table } from './table';
import { timeTitle } from './time-title';

/** The points of a sweep, cumulants and ratios with their 95 % intervals. */
export function sweepTable(report: SweepReport): Table {
  const { points } = report;
  const ofInterval = (name: string) =>
    [name, `${name}, low`, `${name}, high`].map((title) => ({ title, kind: 'number' as const }));
  return {
    columns: [
      { title: 'dataset', kind: 'text' },
      { title: timeTitle(report), kind: 'number' },
      { title: 'shots', kind: 'whole' },
      { title: 'in the window', kind: 'text' },
      ...['κ₁', 'κ₂', 'κ₃', 'κ₂/κ₁', 'κ₃/κ₁'].flatMap(ofInterval),
      { title: 'answer', kind: 'text' }
    ],
    rows: points.map(({ label, time, shots, inWindow, cumulants, ratios, dataset }) => [
      label,
      time,
      shots,
      sayInWindow({ inWindow, cumulants }),
      ...[...(cumulants ?? [null, null, null]), ...(ratios ?? [null, null])].flatMap((one) =>
        one ? [one.value, one.low, one.high] : [null, null, null]
      ),
      dataset?.verdict ? VERDICTS[dataset.verdict] : 'not diagnosed'
    ])
  };
}
