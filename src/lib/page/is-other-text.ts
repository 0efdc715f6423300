/**
 * Whether a text is another one rather than an edit: less than half of the shorter of the two is left at the
 * beginning and the end. An emptied text is another one.
 */
export function isOtherText(before: string, after: string): boolean {
  const shorter = Math.min(before.length, after.length);
  if (after.trim() === '') return true;
  let start = 0;
  while (start < shorter && before[start] === after[start]) start++;
  let end = 0;
  while (end < shorter - start && before[before.length - 1 - end] === after[after.length - 1 - end]) end++;
  return start + end < shorter / 2;
}
