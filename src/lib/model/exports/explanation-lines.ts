import type { Explanations } from '$lib/stats/explanations/types';
import { sayFit } from '../report/say-fit';
import type { CsvValue } from './csv-table';

/**
 * The explanations of a document as lines `part,item,count,value,low,high` of the table of all numbers; none where no
 * story was told. The order is the document's, best first.
 *
 * @param alpha level at which a story is rejected by its own fit
 */
export function explanationLines(explanations: Explanations | undefined, alpha: number): CsvValue[][] {
  if (!explanations) return [];
  const { ranked, tied, tieWithin, separate, shotsToLead, pairs } = explanations;
  const lines: CsvValue[][] = [];
  const one = (part: string, item: string, value: CsvValue, low: CsvValue = null, high: CsvValue = null) =>
    lines.push([part, item, null, value, low, high]);
  for (const story of ranked) {
    const part = `explanation ${story.id}`;
    for (const key of ['logLikelihood', 'parameters', 'aic', 'behind', 'weight', 'base', 'gSquared'] as const)
      one(part, key, story[key]);
    const { parameter, second, goodness } = story;
    if (parameter) {
      one(part, parameter.symbol, parameter.value, parameter.low, parameter.high);
      one(part, 'atBound', parameter.atBound);
    }
    if (second) one(part, second.symbol, second.value);
    for (const key of ['p', 'smallestP', 'resamples'] as const)
      one(part, `fit ${key}`, goodness?.[key] ?? null);
    one(part, 'own fit', goodness === null ? null : sayFit(story, alpha) || 'not rejected');
    one(part, 'tied', tied.includes(story.id) ? 'yes' : 'no');
  }
  one('explanations', 'tieWithin', tieWithin);
  for (const { between, shots } of separate)
    one('explanations', `shots to separate ${between[0]} and ${between[1]}`, shots);
  one('explanations', 'shots for the first to lead all', shotsToLead);
  if (pairs) {
    one('pairs', 'covariance', pairs.covariance);
    one('pairs', 'correlation', pairs.correlation, pairs.correlationLow);
  }
  return lines;
}
