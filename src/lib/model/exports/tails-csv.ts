import type { Diagnosis } from '$lib/stats/types';
import { csvTable } from './csv-table';
import { csvUnit } from './csv-unit';

/**
 * Both tails as a CSV file, one row a tail: the shots with a count of at least (or at most) that, their share with its
 * exact 95 % interval, what the best law gives, and the bounds on it.
 */
export function tailsCsv({ tails, data }: Diagnosis): string {
  const unit = csvUnit(data.unit);
  return csvTable([
    [
      'unit',
      'tail',
      'count',
      'shots',
      'share',
      'share low',
      'share high',
      'best law',
      'Chernoff of the best law',
      'Chernoff of the mean alone',
      'Hoeffding'
    ],
    ...tails.points.map((point) => [
      unit,
      point.side === 'high' ? 'at least' : 'at most',
      point.count,
      point.shots,
      point.observed,
      point.low,
      point.high,
      point.fitted,
      point.chernoff,
      point.meanChernoff,
      point.hoeffding
    ])
  ]);
}
