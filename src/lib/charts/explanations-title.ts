import { EXPLANATIONS } from '$lib/model/labels';
import { rejected } from '$lib/stats/explanations/rejected';
import type { Explanations } from '$lib/stats/explanations/types';

/** The finding of the list as a title. */
export function explanationsTitle({ ranked, tied }: Explanations, alpha: number): string {
  if (ranked.length === 0) return 'No explanation could be fitted';
  const first = EXPLANATIONS[ranked[0].id];
  if (tied.length < 2)
    return `Of those told, ${first} is nearest to the counts${rejected(ranked[0], alpha) ? ', and does not fit them' : ''}`;
  return `${tied.length} explanations lie too close together to choose, ${first} first`;
}
