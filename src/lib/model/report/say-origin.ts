import type { TestResult } from '$lib/stats/types';
import { formatCount } from '../format-number';
import { SOURCES } from '../labels';

/** Where the p-value of a test comes from: "999 resampled, ended early", or "exact". */
export function sayOrigin({ source, resamples, stoppedEarly }: TestResult): string {
  return source === 'resampled' || source === 'permuted'
    ? `${formatCount(resamples)} ${SOURCES[source]}${stoppedEarly ? ', ended early' : ''}`
    : SOURCES[source];
}
