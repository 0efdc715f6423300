import { VERDICTS } from '$lib/model/labels';
import type { SweepReport } from '$lib/stats/sweep/types';
import { dispersed } from './sweep-dispersion-picture';
import type { Table } from './table';
import { timeTitle } from './time-title';

/** Variance over ceiling and answer of each dataset that was diagnosed. */
export function sweepDispersionTable(report: SweepReport): Table {
  return {
    columns: [
      { title: 'dataset', kind: 'text' },
      { title: timeTitle(report), kind: 'number' },
      { title: 'variance over ceiling', kind: 'number' },
      { title: 'low', kind: 'number' },
      { title: 'high', kind: 'number' },
      { title: 'answer', kind: 'text' }
    ],
    rows: dispersed(report).map(({ point, one }) => [
      point.label,
      point.time,
      one.value,
      one.low,
      one.high,
      point.dataset?.verdict ? VERDICTS[point.dataset.verdict] : 'not diagnosed'
    ])
  };
}
