import { tally } from './tally';

/** Header and rows of a two-column histogram file of these counts. */
export function histogramRows(shots: Iterable<number>): string[] {
  return ['count,shots', ...tally(shots).map((row) => row.join(','))];
}
