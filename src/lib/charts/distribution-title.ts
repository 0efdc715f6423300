import type { Diagnosis } from '$lib/stats/types';
import { formatCount } from '$lib/model/format-number';
import { isShown } from './is-shown';
import { standing } from './standing';

/** The finding of the counts against the best law, as a title. */
export function distributionTitle({ distribution, data }: Diagnosis): string {
  const shown = distribution.filter((point) => isShown(point, data.shots));
  const off = shown.filter((point) => standing(point) !== 'within');
  const all = shown.length;
  if (!off.length)
    return all === 1
      ? 'The best independent-trial law agrees with the one count seen'
      : `The best independent-trial law agrees with all ${formatCount(all)} counts`;
  const which = off.length <= 4 ? `, not with ${listed(off.map((point) => formatCount(point.count)))}` : '';
  return `The best independent-trial law agrees with ${formatCount(all - off.length)} of ${formatCount(all)} counts${which}`;
}

const listed = (words: string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words[words.length - 1]}`;
