import type { Diagnosis } from '$lib/stats/types';
import { csvTable } from './csv-table';
import { csvUnit } from './csv-unit';

/**
 * The rate function as a CSV file, one row a count, in nats: divided by N where that is known, by 1 where it is not
 * (`divided by`). A count never seen has only a lower limit.
 */
export function rateCsv({ rate, data }: Diagnosis): string {
  const unit = csvUnit(data.unit);
  return csvTable([
    [
      'unit',
      'count',
      'density',
      'divided by',
      'seen rate',
      'rate low',
      'rate high',
      'best law',
      'limit',
      'Gaussian'
    ],
    ...rate.points.map(({ count, density, empirical, low, high, fitted, limit, gaussian }) => [
      unit,
      count,
      density,
      rate.scale,
      empirical,
      low,
      high,
      fitted,
      limit,
      gaussian
    ])
  ]);
}
