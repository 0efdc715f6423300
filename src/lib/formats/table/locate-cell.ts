import type { Separator } from '../types';
import { separators } from './separators';

/**
 * Column, in characters from 1, where cell `cell` (from 0) of a line starts; null when the line
 * has no such cell (it may belong to a later line of a quoted cell).
 */
export function locateCell(line: string, separator: Separator, cell: number): number | null {
  const spaced = separator === 'spaces';
  const mark = separators.find(({ id }) => id === separator)?.character;
  let at = 0;
  let passed = 0;
  let quoted = false;
  const isMark = (character: string) => (spaced ? /[ \t]/.test(character) : character === mark);
  while (at < line.length && /[ \t]/.test(line[at]) && !(mark === '\t' && line[at] === '\t')) at += 1;
  while (passed < cell && at < line.length) {
    if (line[at] === '"') quoted = !quoted;
    if (!quoted && isMark(line[at])) {
      if (spaced) while (/[ \t]/.test(line[at + 1] ?? '')) at += 1;
      passed += 1;
    }
    at += 1;
  }
  if (passed < cell) return null;
  while (/[ \t]/.test(line[at] ?? '') && line[at] !== mark) at += 1;
  return at + 1;
}
