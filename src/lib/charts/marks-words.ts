import { formatNumber } from '$lib/model/format-number';
import type { TimelineMark } from '$lib/model/team/devices/timeline';
import type { Hindrance, Mark } from '$lib/stats/versions/types';

export const MARKS: Record<Mark, string> = {
  reference: 'reference',
  risen: 'risen',
  differs: 'differs otherwise',
  'no-difference-seen': 'no difference seen',
  'cannot-tell': 'cannot tell',
  unmarked: 'not compared'
};

export const HINDRANCES: Record<Hindrance, string> = {
  'no-counts': 'no shots',
  'no-reference': 'the reference was not measured in this group',
  'not-diagnosed': 'not diagnosed yet',
  lumped: 'counts are lumped',
  cut: 'only some counts were kept',
  'misread-bonds': 'misread bonds change the ceiling',
  'ring-in-defects': 'bonds of a ring counted one by one come in twos',
  'above-tolerance': 'its own interval lies above the tolerance',
  'no-spread': 'all counts are equal',
  'odd-pairs': 'odd counts, or more than N',
  'trials-differ': 'the number of trials is known on one side only',
  'unit-differs': 'another unit than the reference',
  'geometry-differs': 'another geometry than the reference',
  'too-few-shots': 'too few shots'
};

/** What a cell says beyond its mark: by how much, or what stands in the way. */
export function markWords({ mark, factor, pAdjusted, hindrance }: TimelineMark): string {
  if (hindrance) return `${MARKS[mark]}: ${HINDRANCES[hindrance]}`;
  if (factor === null) return MARKS[mark];
  return `${MARKS[mark]}: variance over ceiling is ${formatNumber(factor, 3)} of the reference, adjusted p of a rise ${formatNumber(pAdjusted, 2)}`;
}
