import { wrap } from '$lib/model/plain-text/wrap';
import { sayChance } from '$lib/stats/sweep/say-chance';
import type { SweepReport } from '$lib/stats/sweep/types';
import { formatCount, formatNumber } from '$lib/stats/words/format-number';
import { table } from '../shared/table';

/** A sweep in words: the answer, why, the points, the exponent as the window moves, and the cautions. */
export function saySweep(report: SweepReport): string {
  const unit = report.timeUnit === '' ? '' : `, ${report.timeUnit}`;
  const time = `${report.axis === 'quench-time' ? 'quench' : 'hold'} time${unit}`;
  const error = ({ value, high }: { value: number; high: number }) =>
    `${formatNumber(value, 4)} ± ${formatNumber(high - value, 2)}`;
  const points = report.points.map(({ time, shots, cumulants, inWindow }) => [
    `${formatNumber(time, 4)}${!inWindow ? ' (outside)' : cumulants ? '' : ' (left out)'}`,
    formatCount(shots),
    ...(cumulants ?? []).map(error),
    ...(cumulants ? [] : ['–', '–', '–'])
  ]);
  const windows = report.windows.map(({ from, to, exponent, commonP, lawP }) => [
    `${formatNumber(from, 4)} to ${formatNumber(to, 4)}`,
    error(exponent),
    sayChance(commonP),
    sayChance(lawP)
  ]);
  return [
    wrap(report.statement),
    '',
    ...report.because.map((line) => wrap(line, '  – ')),
    '',
    'Cumulants with half their 95\u202f% intervals',
    table([time, 'shots', 'κ₁', 'κ₂', 'κ₃'], points),
    '',
    ...(windows.length > 0
      ? ['One exponent, by window', table([time, 'exponent', 'p one for all', 'p power laws'], windows), '']
      : []),
    ...report.cautions.map((line) => wrap(line, '  – ')),
    ''
  ].join('\n');
}
