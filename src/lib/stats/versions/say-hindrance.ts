import type { Hindrance } from './types';

/** What stands in the way whatever the shots say; the others are said where their numbers are known. */
export type PlainHindrance = Exclude<Hindrance, 'too-few-shots' | 'above-tolerance'>;

const words: Record<PlainHindrance, string> = {
  'no-counts': 'has no counts',
  'no-reference': 'cannot be compared, since the reference is gone',
  'not-diagnosed':
    'is not diagnosed yet: its newest dataset of this group waits for its diagnosis, or nobody has asked for one',
  lumped: 'lumps counts, so that its variance is not known',
  cut: 'keeps a range of counts only, for which the ceiling used here does not hold',
  'misread-bonds': 'states misreads on bonds, for which the ceiling used here does not hold',
  'ring-in-defects':
    'counts the bonds of a ring one by one, where kinks come in twos; give pairs as its unit',
  'no-spread': 'has counts that do not vary',
  'odd-pairs': 'has counts that its unit or its number of trials does not allow',
  'trials-differ': 'has a known number of trials where the reference has none, or the other way round',
  'unit-differs': 'is counted in another unit than the reference',
  'geometry-differs': 'has another geometry than the reference'
};

/** Why a version cannot be judged, as a sentence. */
export function sayHindrance(hindrance: PlainHindrance, version: string): string {
  return `Version ${version} ${words[hindrance]}.`;
}
