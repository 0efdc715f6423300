import { answersTable } from '$lib/charts/answers-table';
import { sweepTable } from '$lib/charts/sweep-table';
import { sweepReport } from '$lib/stats/sweep/sweep-report';
import { expect, it } from 'vitest';

it('a dataset without errors is told as left out of the window, in both tables', () => {
  const whole = [9, 30, 40, 16, 5].map((shots, n): [number, number] => [n, shots]);
  const report = sweepReport(
    [
      { label: 'a', time: 1, counts: whole },
      { label: 'b', time: 2, counts: [[1, 30]] },
      { label: 'c', time: 3, counts: whole },
      { label: 'd', time: 4, counts: whole },
      { label: 'e', time: 5, counts: [[1, 30]] }
    ],
    {
      ...{ axis: 'quench-time', timeUnit: 'µs', unit: 'defect', transition: null, alpha: 0.05 },
      window: { from: 1, to: 3 }
    }
  );
  for (const { columns, rows } of [sweepTable(report), answersTable(report)]) {
    const at = columns.findIndex(({ title }) => title === 'in the window');
    expect(rows.map((row) => row[at])).toEqual(['yes', 'left out', 'yes', 'no', 'no']);
  }
});
