import type { Diagnosis, DistributionPoint } from '$lib/stats/types';
import { formatCount, formatNumber } from '../format-number';
import { countLabel } from '../count-label';
import { alignTable, type TextColumn } from './align-table';

/** Rows of the table; more counts are summed in steps. */
const rowsShown = 30;

/** Counts against the best law. Rows beyond what was seen and expected are left out. */
export function sayCounts({ distribution, data }: Diagnosis): string {
  const told = ({ shots, fitted }: DistributionPoint) => shots > 0 || fitted * data.shots >= 0.5;
  const first = distribution.findIndex(told);
  const last = distribution.findLastIndex(told);
  const rows = distribution.slice(Math.max(0, first), last + 1);
  const title = 'Counts against the best law';
  return rows.length <= rowsShown
    ? `${title}\n${alignTable(single(rows))}`
    : `${title}, several counts a row (--json has every count)\n${alignTable(summed(rows))}`;
}

function single(rows: DistributionPoint[]): TextColumn[] {
  const share = (value: number) => formatNumber(value, 3);
  return [
    {
      title: 'count',
      numeric: true,
      cells: rows.map(countLabel)
    },
    { title: 'shots', numeric: true, cells: rows.map(({ shots }) => formatCount(shots)) },
    { title: 'observed', numeric: true, cells: rows.map(({ observed }) => share(observed)) },
    { title: '95 % from', numeric: true, cells: rows.map(({ low }) => share(low)) },
    { title: 'to', numeric: true, cells: rows.map(({ high }) => share(high)) },
    { title: 'fitted', numeric: true, cells: rows.map(({ fitted }) => share(fitted)) }
  ];
}

/** Rows of equal step; shares add, their intervals do not and are left out. */
function summed(rows: DistributionPoint[]): TextColumn[] {
  const step = Math.ceil(rows.length / rowsShown);
  const groups: DistributionPoint[][] = [];
  for (let start = 0; start < rows.length; start += step) groups.push(rows.slice(start, start + step));
  const sum = (group: DistributionPoint[], of: (row: DistributionPoint) => number) =>
    group.reduce((total, row) => total + of(row), 0);
  const range = (group: DistributionPoint[]) => {
    const [from, to] = [group[0], group[group.length - 1]];
    if (from === to) return countLabel(from);
    if (to.lump && !to.below) return `${formatCount(from.below ? 0 : from.count)}+`;
    return `${formatCount(from.below ? 0 : from.count)}–${formatCount(to.count)}`;
  };
  return [
    { title: 'counts', numeric: true, cells: groups.map(range) },
    {
      title: 'shots',
      numeric: true,
      cells: groups.map((group) => formatCount(sum(group, (row) => row.shots)))
    },
    {
      title: 'observed',
      numeric: true,
      cells: groups.map((group) =>
        formatNumber(
          sum(group, (row) => row.observed),
          3
        )
      )
    },
    {
      title: 'fitted',
      numeric: true,
      cells: groups.map((group) =>
        formatNumber(
          sum(group, (row) => row.fitted),
          3
        )
      )
    }
  ];
}
