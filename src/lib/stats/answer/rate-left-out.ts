import type { Evidence } from '../flags/evidence';

/**
 * Whether a misread rate was stated for counts of kinks and the tests could not allow for it: they then run without
 * misreads, though there are some, and what they rule out is not what was asked. Sites counted themselves stay independent
 * trials whatever the rate.
 */
export const rateLeftOut = ({ options, misread }: Pick<Evidence, 'options' | 'misread'>): boolean =>
  options.geometry !== 'sites' && !!options.misread && misread?.applies !== true;
