import type { Diagnosis } from '$lib/stats/types';

import { writeKept } from '../read-kept';

/** The files that a recomputation reads. */
export interface RecomputedFrom {
  /** Path of the counts, as the command is to name it. */
  counts: string;
  format: 'counts' | 'shots';
  /** Path of the law that was given to compare with; null for none. */
  supplied: string | null;
}

/**
 * The command that computes a document again: every option is named, the defaults too, since they may differ in a
 * later version. Paths must need no quotes.
 */
export function recomputeCommand(
  { data, engine }: Pick<Diagnosis, 'data' | 'engine'>,
  { counts, format, supplied }: RecomputedFrom
): string {
  const options: [string, string | number][] = [
    ['format', format],
    ['trials', data.trials ?? 'unknown'],
    ['unit', data.unit],
    ['geometry', data.geometry],
    ['misread', data.misread ?? 'unknown'],
    ...(data.misreadUncertainty
      ? [['misread-uncertainty', data.misreadUncertainty] as [string, number]]
      : []),
    ...(data.kept ? [['kept', writeKept(data.kept)] as [string, string]] : []),
    ['alpha', engine.alpha],
    ['tolerance', engine.tolerance],
    ['resamples', engine.resamples],
    ['seed', engine.seed],
    ...(supplied === null ? [] : [['supplied', supplied] as [string, string]])
  ];
  const said = options.map(([name, value]) => `--${name} ${value}`).join(' ');
  return `npm run --silent diagnose -- ${counts} ${said} --json --quiet`;
}
