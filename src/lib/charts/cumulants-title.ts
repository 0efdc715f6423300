import type { CumulantsPlace } from './cumulants-place';

const TITLES: Record<CumulantsPlace['standing'], string> = {
  inside: 'The cumulants lie where independent trials can reach',
  near: 'The cumulants lie at the edge of what independent trials can reach, within their intervals',
  outside: 'The third cumulant lies where no independent trials reach',
  more: 'The cumulants lie beyond what any independent trials can reach'
};

/** The finding of the cumulants together, as a title; with what the region leaves out of account, where the answer does not. */
export function cumulantsTitle({ standing, beyond }: CumulantsPlace): string {
  const title = TITLES[standing];
  return beyond ? `Not allowing for ${beyond.what}, ${title[0].toLowerCase()}${title.slice(1)}` : title;
}
