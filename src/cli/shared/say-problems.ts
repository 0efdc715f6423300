import type { Problem } from '$lib/formats/types';
import { inputName } from './input-name';

/**
 * Problems as lines `file:line:column: what was wrong what to do`, the form that editors jump to;
 * a problem of the whole file has no place. Closes with the number of problems not listed.
 */
export function sayProblems(file: string, problems: Problem[], more: number): string[] {
  const name = inputName(file);
  const lines = problems.map(({ line, column, message, fix }) => {
    const place = line === null ? name : `${name}:${line}:${column ?? 1}`;
    return `${place}: ${message} ${fix}`;
  });
  return more > 0 ? [...lines, `${name}: ${more} more ${more === 1 ? 'problem' : 'problems'}.`] : lines;
}
