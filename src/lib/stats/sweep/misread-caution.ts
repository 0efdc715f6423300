import type { SweptPoint } from './types';

/** Datasets named one by one, before the rest is only counted. */
const NAMED = 3;

/**
 * What misreads that are stated do to a sweep, which is made of the counts as they were read: nothing where none are
 * stated. A site read wrongly changes the count by one, or by 0 or 2 where kinks are counted, since it flips both of
 * its bonds.
 */
export function misreadCaution(points: Pick<SweptPoint, 'label' | 'misread'>[]): string[] {
  const read = points.filter(({ misread }) => (misread ?? 0) > 0);
  if (read.length === 0) return [];
  const names = read.slice(0, NAMED).map(({ label }) => `“${label}”`);
  const rest = read.length - names.length;
  const all = [...names, ...(rest > 0 ? [`${rest} ${rest === 1 ? 'other' : 'others'}`] : [])];
  const last = all.pop();
  return [
    `Misreads are stated for ${all.length > 0 ? `${all.join(', ')} and ` : ''}${last}, and are not taken out here: the cumulants are those of the counts as read. They add a background, which weighs most where defects are few; on bonds a site read wrongly flips both of its bonds, and so adds or takes kinks in pairs.`
  ];
}
