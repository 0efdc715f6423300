import type { Explanations } from '$lib/stats/explanations/types';
import { formatNumber } from '../format-number';
import { EXPLANATIONS } from '../labels';
import { sayFit } from '../report/say-fit';
import { sayWeight } from '../report/say-weight';
import { sayOwnNumber } from '../report/say-own-number';
import { sayShotsInAll, sayShotsToLead } from '../report/say-shots-in-all';
import { alignTable } from './align-table';
import { wrap } from './wrap';

/** What else it could be: the finding, the list, what each of the first would mean, and what would tell them apart. */
export function sayExplanations(explanations: Explanations, alpha: number): string {
  const { ranked, tied, separate, shotsToLead, notRun, pairs, statement } = explanations;
  const lines = ['What else it could be', wrap(statement, '  ')];
  if (pairs) lines.push(wrap(pairs.statement, '  '));
  lines.push(
    alignTable([
      { title: 'explanation', numeric: false, cells: ranked.map(({ id }) => EXPLANATIONS[id]) },
      { title: 'AIC behind', numeric: true, cells: ranked.map(({ behind }) => formatNumber(behind, 3)) },
      { title: 'weight', numeric: true, cells: ranked.map(({ weight }) => sayWeight(weight)) },
      {
        title: 'p of its fit',
        numeric: true,
        cells: ranked.map(({ goodness }) => formatNumber(goodness?.p ?? null, 2))
      }
    ])
  );
  // As a column they would be wider than a terminal.
  for (const one of ranked) {
    const number = [sayFit(one, alpha), sayOwnNumber(one)].filter((words) => words !== '').join('; ');
    if (number) lines.push(wrap(`${EXPLANATIONS[one.id]}: ${number}`, '    '));
  }
  for (const one of ranked.filter(({ id }) => tied.includes(id)))
    lines.push(wrap(`${EXPLANATIONS[one.id]}: ${one.meaning}`, '  – '));
  for (const { between, measurement, shots } of separate) {
    const told = `To tell ${between.map((id) => EXPLANATIONS[id]).join(' from ')}: ${measurement}`;
    lines.push(wrap(`${told} ${sayShotsInAll(shots)}`.trim(), '  – '));
  }
  const lead = sayShotsToLead(EXPLANATIONS[ranked[0]?.id], shotsToLead);
  if (lead) lines.push(wrap(lead, '  – '));
  if (notRun.length > 0)
    lines.push(
      wrap(
        `Not told: ${notRun.map(({ id, reason }) => `${EXPLANATIONS[id]} (${reason.replace(/\.$/, '')})`).join('; ')}.`,
        '  '
      )
    );
  return lines.join('\n');
}
