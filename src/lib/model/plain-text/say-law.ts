import type { Diagnosis } from '$lib/stats/types';
import { formatCount, formatNumber } from '../format-number';
import { REFERENCES } from '../labels';
import { sayInterval } from '../say-interval';
import { alignTable } from './align-table';
import { wrap } from './wrap';

/** Levels named one by one; a law of more is summed up. */
const levelsNamed = 6;

/** The best independent-trial law, how far the data are from it, and the reference laws beside it. */
export function sayLaw({ fit }: Diagnosis): string {
  const named = fit.levels.slice(0, levelsNamed).map(({ p, trials }) => {
    return `${formatCount(trials)} ${trials === 1 ? 'trial' : 'trials'} with p = ${formatNumber(p)}`;
  });
  if (fit.levels.length > levelsNamed) named.push(`${fit.levels.length - levelsNamed} further levels`);
  if (fit.poissonPart > 0) named.push(`rare events with mean ${formatNumber(fit.poissonPart)}`);
  const notice =
    fit.shotsToNotice === null
      ? ''
      : ` About ${formatCount(fit.shotsToNotice)} ${fit.shotsToNotice === 1 ? 'shot makes' : 'shots make'} the difference noticeable.`;
  const lines = [
    'Best independent-trial law',
    wrap(`${named.join(', ')}.`, '  '),
    wrap(
      `Divergence ${formatNumber(fit.divergence)} nats a shot (floor ${formatNumber(fit.floor)}; corrected for bias ${sayInterval(fit.divergenceInterval, 3)}); G² = ${formatNumber(fit.gSquared)}.${notice}`,
      '  '
    ),
    wrap(fit.how, '  ')
  ];
  if (fit.references.length > 0) {
    lines.push(
      alignTable([
        {
          title: 'law',
          numeric: false,
          cells: ['best law', ...fit.references.map(({ id }) => REFERENCES[id])]
        },
        {
          title: 'log-likelihood',
          numeric: true,
          cells: [fit.logLikelihood, ...fit.references.map((law) => law.logLikelihood)].map((value) =>
            formatNumber(value, 7)
          )
        },
        {
          title: 'divergence',
          numeric: true,
          cells: [fit.divergence, ...fit.references.map((law) => law.divergence)].map((value) =>
            formatNumber(value)
          )
        },
        {
          title: 'AIC',
          numeric: true,
          cells: ['–', ...fit.references.map((law) => formatNumber(law.aic, 7))]
        }
      ])
    );
  }
  return lines.join('\n');
}
