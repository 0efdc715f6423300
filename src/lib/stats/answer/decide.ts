import type { Evidence } from '../flags/evidence';
import type { Verdict } from '../types';
import { rateLeftOut } from './rate-left-out';
import { restsOnSearch } from './rests-on-search';
import { unreachable } from './unreachable';

/** Fewer shots than this are never called compatible: the rule below fails for tiny N. */
const fewest = 50;

/**
 * With fewer shots than see the ceiling exceeded by half, nothing was tested that a reader would care about,
 * however low the variance happens to be. For counts of ordinary shape that is about fifty shots.
 */
const blind = 0.5;

/** What the verdict is decided from. */
export type Decided = Pick<Evidence, 'certificate' | 'tests' | 'options' | 'shots' | 'misread'> & {
  moments: Pick<Evidence['moments'], 'dispersion'>;
};

/** See answer. @param excess smallest excess that would have been seen; null for none */
export function decide(decided: Decided, excess: number | null): Verdict {
  const { certificate, tests, moments, options, shots, misread } = decided;
  if (restsOnSearch(decided)) return 'undecided';
  const extreme = tests.filter((test) => test.pAdjusted <= options.alpha);
  if (rateLeftOut(decided)) {
    // That shots or batches differ is no matter of how sites are misread.
    if (extreme.some(({ id }) => id === 'batches' || id === 'order')) return 'ruled-out';
    if (misread?.applies === false && misread.largest !== undefined) return 'undecided';
    if (extreme.length > 0 || (certificate && certificate.p <= options.alpha)) return 'undecided';
  }
  if (extreme.length > 0 || (certificate && certificate.p <= options.alpha)) return 'ruled-out';
  if (unreachable({ tests, options }).length > 0) return 'undecided';
  const { high } = moments.dispersion;
  const sighted = shots >= fewest && excess !== null && excess <= blind;
  return sighted && high !== null && high < 1 + options.tolerance ? 'compatible' : 'undecided';
}
