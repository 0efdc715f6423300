import type { Diagnosis } from '$lib/stats/types';
import { formatNumber } from '../format-number';

/** How far the best law lies from the counts, and whether any law comes closer. */
export function sayDistance({ fit }: Diagnosis): string {
  const closer = fit.certified
    ? 'No independent-trial law comes closer: the fit meets the floor.'
    : `No independent-trial law comes closer than ${formatNumber(fit.floor, 3)}.`;
  return `The best law lies ${formatNumber(fit.divergence, 3)} nats a shot from the counts. ${closer}`;
}
