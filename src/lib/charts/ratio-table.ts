import { RATIO_NAMES } from '$lib/model/team/sweeps/ratio-names';
import type { SteadyReport, SweepReport } from '$lib/stats/sweep/types';
import { ratioPoints } from './ratio-points';
import type { Table } from './table';
import { timeTitle } from './time-title';

/** One ratio of every dataset. */
export function ratioTable(report: SweepReport, id: SteadyReport['id']): Table {
  return {
    columns: [
      { title: 'dataset', kind: 'text' },
      { title: timeTitle(report), kind: 'number' },
      { title: RATIO_NAMES[id], kind: 'number' },
      { title: 'low', kind: 'number' },
      { title: 'high', kind: 'number' },
      { title: 'in the window', kind: 'text' }
    ],
    rows: ratioPoints(report, id).map(({ point, one }) => [
      point.label,
      point.time,
      one.value,
      one.low,
      one.high,
      point.inWindow ? 'yes' : 'no'
    ])
  };
}
