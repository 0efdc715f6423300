import type { SweepReport } from '$lib/stats/sweep/types';
import { dispersed } from './sweep-dispersion-picture';

/** How many of the datasets are surely over the ceiling. */
export function sweepDispersionTitle(report: Pick<SweepReport, 'points'>): string {
  const seen = dispersed(report);
  const over = seen.filter(({ one }) => one.low !== null && one.low > 1).length;
  if (over === 0) return 'The variance is nowhere surely over its ceiling';
  return `The variance is over its ceiling in ${over} of ${seen.length} datasets`;
}
