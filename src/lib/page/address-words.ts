import type { ReadResult } from '$lib/formats/types';
import type { SettingProblems } from './read-settings';

/**
 * What to say of an address whose parts were read one by one, once they were tried together.
 * @returns '' when nothing is in the way
 */
export function addressWords(
  read: ReadResult | null,
  settings: SettingProblems,
  refusal: string,
  whole: boolean
): string {
  const cannot = 'This address could not be read: ';
  const [wrong] = Object.entries(settings).find(([, problem]) => problem) ?? [];
  if (wrong) return `${cannot}“${wrong === 'supplied' ? 'law' : wrong}” has a value that it cannot have.`;
  if (read && !read.ok)
    return `${cannot}its counts and trials do not go together. ${read.problems[0].message}`;
  if (refusal) return `${cannot}${refusal}`;
  return whole
    ? ''
    : 'This address does not end with its number of shots: it was written by hand or cut off. Look the counts over, then check them.';
}
