import { wrap } from '$lib/model/plain-text/wrap';
import type { SitesReport } from '$lib/stats/sites/sites-types';
import { formatCount, formatNumber } from '$lib/stats/words/format-number';
import { table } from '../shared/table';

/** Lines of a table in words. */
const most = 12;

/** A map of sites in words: the answer, why, the most telling pairs, correlation by distance, and the cautions. */
export function saySites(report: SitesReport): string {
  const pairs = [...report.pairs]
    .sort((a, b) => a.p - b.p)
    .slice(0, most)
    .map(({ first, second, distance, correlation, low, high, p, pHolm }) => [
      `${report.names[first]} and ${report.names[second]}`,
      formatCount(distance),
      formatNumber(correlation, 2),
      formatNumber(low, 2),
      formatNumber(high, 2),
      formatNumber(p, 2),
      formatNumber(pHolm, 2)
    ]);
  const distances = report.byDistance
    .slice(0, most)
    .map(({ distance, value, low, high }) => [
      formatCount(distance),
      formatNumber(value, 2),
      formatNumber(low, 2),
      formatNumber(high, 2)
    ]);
  return [
    wrap(report.statement),
    '',
    ...report.because.map((line) => wrap(line, '  – ')),
    '',
    'The most telling pairs, with 95\u202f% intervals one by one',
    table(['sites', 'distance', 'correlation', 'low', 'high', 'p', 'p among all'], pairs),
    '',
    'Mean correlation by distance',
    table(['distance', 'correlation', 'low', 'high'], distances),
    '',
    ...report.cautions.map((line) => wrap(line, '  – ')),
    ''
  ].join('\n');
}
