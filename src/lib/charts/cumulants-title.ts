import type { CumulantsPlace } from './cumulants-place';

const TITLES: Record<CumulantsPlace['standing'], string> = {
  inside: 'The cumulants lie where independent trials can reach',
  near: 'The cumulants lie at the edge of what independent trials can reach, within their intervals',
  outside: 'The third cumulant lies where no independent trials reach',
  more: 'The cumulants lie beyond what any independent trials can reach'
};

/** The finding of the cumulants together, as a title. */
export const cumulantsTitle = ({ standing }: CumulantsPlace): string => TITLES[standing];
