import type { Diagnosis } from '$lib/stats/types';
import { formatCount } from '../format-number';

/** What the same result again needs, as pairs of what and value. */
export function engineFacts({ engine, data, format }: Diagnosis): [string, string][] {
  return [
    ['Counts', data.digest],
    ['Engine', `Severalty ${engine.version}, document ${format}`],
    ['Seed', String(engine.seed)],
    ['Resampled histograms', `at most ${formatCount(engine.resamples)}`],
    ['Level of the answer', String(engine.alpha)],
    ['Excess that matters', String(engine.tolerance)]
  ];
}
