import type { Evidence } from '../flags/evidence';

/**
 * The largest misread rate that these counts of kinks allow, where the one that was stated is over it: the tests then run
 * without misreads, though there are some, and neither answer would be about these counts. Null otherwise, and for sites
 * counted themselves, which stay independent trials whatever the rate.
 */
export const rateRefuted = ({ options, misread }: Pick<Evidence, 'options' | 'misread'>): number | null =>
  options.geometry !== 'sites' && misread && !misread.applies ? (misread.largest ?? null) : null;
