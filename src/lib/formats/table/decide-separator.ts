import type { Guess, Separator } from '../types';
import { joinSpaced } from './join-spaced';
import { separators } from './separators';

/** Fields of a line, quotes respected. */
function fieldsIn(line: string, separator: string): number {
  let fields = 1;
  let quoted = false;
  for (const character of line) {
    if (character === '"') quoted = !quoted;
    else if (character === separator && !quoted) fields += 1;
  }
  return fields;
}

/** Most frequent number of fields, and the share of lines that have it. */
function usualFields(counts: number[]): { fields: number; share: number } {
  const tally = new Map<number, number>();
  for (const count of counts) tally.set(count, (tally.get(count) ?? 0) + 1);
  let fields = 1;
  let lines = 0;
  for (const [count, times] of tally) {
    if (times > lines || (times === lines && count > fields)) [fields, lines] = [count, times];
  }
  return { fields, share: lines / counts.length };
}

/**
 * Decides what separates the cells: the mark that gives the same number of columns, two or more,
 * on the most of the first lines, and divides more than half of them; ties go to tabs, semicolons, commas, spaces in this order.
 * No such mark means one column.
 *
 * @param lines first lines of the file that are neither blank nor comments.
 */
export function decideSeparator(lines: string[], given?: Separator): Guess<Separator> {
  if (given) return { value: given, from: 'given', why: 'as you said' };
  const directive = /^sep=(.)$/.exec(lines[0] ?? '');
  if (directive) {
    const named = separators.find(({ character }) => character === directive[1]);
    if (named) return { value: named.id, from: 'stated', why: 'the file says so in its first line' };
  }
  let best: Guess<Separator> = { value: 'none', from: 'guessed', why: 'each line holds one cell' };
  let bestShare = 0;
  for (const { id, character, words } of separators) {
    const counts = lines.map((line) =>
      id === 'spaces' ? fieldsIn(joinSpaced(line), '\t') : fieldsIn(line.trim(), character)
    );
    const { fields, share } = usualFields(counts);
    if (fields < 2 || share <= bestShare) continue;
    if (counts.filter((count) => count > 1).length * 2 <= counts.length) continue;
    // "985", "1 000": spaces that stand in some lines only, and always before three digits, group.
    if (id === 'spaces' && share < 1 && lines.every((line) => /^\d{1,3}( \d{3})*$/.test(line))) continue;
    const lead = share === 1 ? 'each of the first lines' : `${Math.round(share * 100)} % of the first lines`;
    best = { value: id, from: 'guessed', why: `${words} divide ${lead} into ${fields} cells` };
    bestShare = share;
  }
  return best;
}
