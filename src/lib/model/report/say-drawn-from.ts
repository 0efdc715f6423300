import type { Diagnosis } from '$lib/stats/types';

/**
 * What the resampled histograms of a document were drawn from: the sentence of its own account of the fit where that
 * names another law than the fitted one.
 */
export function sayDrawnFrom({ fit }: Pick<Diagnosis, 'fit'>): string {
  const own = fit.how.split(/(?<=\.) (?=[A-Z])/).find((sentence) => sentence.includes('the resamples'));
  const others = own
    ? `for the other tests from the law that the account of the fit names, each histogram fitted again. ${own}`
    : 'for the other tests from the fitted law, each histogram fitted again.';
  return `Resampled: histograms drawn from a law, and counted: for the variance from the most dispersed of the laws tested; ${others}`;
}
