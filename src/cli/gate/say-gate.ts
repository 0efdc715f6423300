import { wrap } from '$lib/model/plain-text/wrap';
import { formatNumber } from '$lib/stats/words/format-number';
import type { GateReport, KnownInterval } from '$lib/stats/versions/types';
import { table } from '../shared/table';

const say = (one: KnownInterval | null): string[] =>
  one ? [one.value, one.low, one.high].map((number) => formatNumber(number, 3)) : ['–', '–', '–'];

/** A gate in words: the outcome, why, its groups, and the cautions. */
export function sayGate(report: GateReport): string {
  const rows = report.groups.map(({ group, outcome, dispersion, referenceDispersion }) => [
    group,
    outcome,
    ...say(dispersion),
    ...say(referenceDispersion)
  ]);
  return [
    wrap(report.statement),
    '',
    ...report.because.map((line) => wrap(line, '  – ')),
    '',
    'Variance over ceiling with its 95\u202f% interval, and that of the reference',
    table(['group', 'outcome', 'value', 'low', 'high', 'reference', 'low', 'high'], rows),
    '',
    ...report.cautions.map((line) => wrap(line, '  – ')),
    ''
  ].join('\n');
}
