import { formatNumber } from '$lib/model/format-number';
import type { Interval } from '$lib/stats/types';
import type { CumulantsPlace } from './cumulants-place';

const WHERE: Record<CumulantsPlace['standing'], string> = {
  inside: 'Independent trials can have these cumulants.',
  near: 'The point lies outside the region of independent trials, its intervals reach into it.',
  outside: 'No independent trials have such cumulants, nor any within these intervals.',
  more: 'No independent trials have so large a variance for their mean.'
};

function where({ standing, beyond }: CumulantsPlace): string {
  const words = WHERE[standing];
  return beyond ? `Not allowing for ${beyond.what}: ${words[0].toLowerCase()}${words.slice(1)}` : words;
}

function ratio(name: string, { value, low, high }: Interval & { value: number }): string {
  const interval =
    low === null || high === null
      ? 'too few shots for an interval'
      : `95 % interval ${formatNumber(low, 3)} to ${formatNumber(high, 3)}`;
  return `${name} ${formatNumber(value, 3)} (${interval})`;
}

/** The counts' place in the plane of cumulants, read out. */
export const regionWords = (place: CumulantsPlace): string =>
  `Seen: ${ratio('κ₂/κ₁', place.fano)}, ${ratio('κ₃/κ₁', place.third)}. ${where(place)}`;

/** A law's place in the plane, read out. */
export const lawWords = (name: string, fano: number, third: number): string =>
  `${name}: κ₂/κ₁ ${formatNumber(fano, 3)}, κ₃/κ₁ ${formatNumber(third, 3)}.`;
