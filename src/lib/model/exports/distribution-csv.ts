import type { Diagnosis } from '$lib/stats/types';
import { csvTable } from './csv-table';
import { csvUnit } from './csv-unit';

/**
 * The distribution as a CSV file, one row a count: shots, their share with its exact 95 % interval, and the share that
 * the best law expects. "or more" stands in the row of a lump, whose numbers are those of all counts from there on, "or fewer" in that
 * of an opening row.
 */
export function distributionCsv({ distribution, data }: Diagnosis): string {
  const unit = csvUnit(data.unit);
  return csvTable([
    ['unit', 'count', 'closing row', 'density', 'shots', 'share', 'share low', 'share high', 'best law'],
    ...distribution.map(({ count, lump, below, density, shots, observed, low, high, fitted }) => [
      unit,
      count,
      lump ? (below ? 'or fewer' : 'or more') : null,
      density,
      shots,
      observed,
      low,
      high,
      fitted
    ])
  ]);
}
