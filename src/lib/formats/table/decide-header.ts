import type { Guess } from '../types';
import { classifyName } from './classify-name';
import { normaliseName } from './normalise-name';
import { isNumberLike } from './role-draft';

/**
 * Decides whether the first row holds column names: it does when at least one of its cells is a
 * word and none is a number. A row of words and numbers is data.
 */
export function decideHeader(firstRow: string[], given?: boolean): Guess<boolean> {
  if (given !== undefined) return { value: given, from: 'given', why: 'as you said' };
  if (firstRow.some(isNumberLike)) {
    return { value: false, from: 'guessed', why: 'the first row holds a number' };
  }
  const words = firstRow.some((cell) => /\p{L}/u.test(cell) && !/^(nan|n\/?a|null|none|nil)$/i.test(cell));
  return words
    ? { value: true, from: 'guessed', why: 'the first row holds words only' }
    : { value: false, from: 'guessed', why: 'the first row holds no words' };
}

/**
 * Column names in the last comment above the data ("# count shots", as numerical programs write
 * them). Only where nothing else is likely: two columns or more, one or two known words for each
 * and no digits, so that a remark such as "# 500 shots, 12 sites" names nothing.
 */
export function namesInComment(comment: string | null, width: number): string[] | null {
  if (comment === null || width < 2 || /\d/.test(comment)) return null;
  for (const split of [/\t+/, /\s*;\s*/, /\s*,\s*/, /\s+/]) {
    const names = comment.split(split).map((name) => name.trim());
    const classes = names.map(classifyName);
    const short = names.every((name) => normaliseName(name).split(' ').length <= 2);
    const known = classes.every((found) => found !== 'unknown' && found !== 'remark');
    const counted = classes.some((found) => found === 'count' || found === 'symbol' || found === 'either');
    if (names.length === width && short && known && counted) return names;
  }
  return null;
}
